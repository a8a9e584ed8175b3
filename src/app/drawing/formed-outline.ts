/** The metal itself: outline of the formed part and of each bend, as SVG paths, and as segments to keep clear of. */
import type { Curve, Face, Frames } from './formed-frames';
import { onCurve } from './formed-frames';
import { at } from './marks';
import type { Point, Segment } from './point';
import type { View } from './view';

function arcTo(curve: Curve, face: Face, backwards: boolean, view: View): string {
  const radius = curve[face].radius * view.scale;
  const to = at(view.place(onCurve(curve, face, backwards ? 0 : 1)));
  if (radius < 0.01) return `L${to}`;
  // A counter-clockwise turn of the model stays one on the paper: sweep flag 0.
  const sweep = (curve.sense === 1) === backwards ? 1 : 0;
  return `A${radius.toFixed(3)} ${radius.toFixed(3)} 0 0 ${sweep} ${to}`;
}

/** Closed outline of the whole part: out along the lower face, back along the upper one. */
export function outlinePath({ stretches, curves }: Frames, view: View): string {
  const out: string[] = [];
  stretches.forEach(({ lower: [start, end] }, index) => {
    out.push(`${index === 0 ? 'M' : 'L'}${at(view.place(start))}L${at(view.place(end))}`);
    const curve = curves[index];
    if (curve) out.push(arcTo(curve, 'lower', false, view));
  });
  for (let index = stretches.length - 1; index >= 0; index--) {
    const stretch = stretches[index];
    if (!stretch) continue;
    const [start, end] = stretch.upper;
    out.push(`L${at(view.place(end))}L${at(view.place(start))}`);
    const curve = curves[index - 1];
    if (curve) out.push(arcTo(curve, 'upper', true, view));
  }
  return `${out.join('')}Z`;
}

/** Closed outline of one bend. */
export function bendPath(curve: Curve, view: View): string {
  const start = at(view.place(onCurve(curve, 'lower', 0)));
  const across = at(view.place(onCurve(curve, 'upper', 1)));
  return `M${start}${arcTo(curve, 'lower', false, view)}L${across}${arcTo(curve, 'upper', true, view)}Z`;
}

/** Closed outline of one stretch. */
export function stretchPath({ lower: [a, b], upper: [d, c] }: Frames['stretches'][number], view: View): string {
  return `M${[a, b, c, d].map((point) => at(view.place(point))).join('L')}Z`;
}

const STEPS = 6;

/** Points of one face, in order; arcs by a few chords, enough to keep texts off them and to fit the view. */
export function facePoints({ stretches, curves }: Frames, face: Face): Point[] {
  return stretches.flatMap((stretch, index) => {
    const curve = curves[index];
    const arc = curve ? Array.from({ length: STEPS + 1 }, (_, step) => onCurve(curve, face, step / STEPS)) : [];
    return [...stretch[face], ...arc];
  });
}

/** Both faces on the paper, as segments. */
export function outlineSegments(frames: Frames, view: View): Segment[] {
  return (['lower', 'upper'] as const).flatMap((face) => {
    const points = facePoints(frames, face).map(view.place);
    return points.slice(1).map((to, index) => ({ from: points[index] ?? to, to }));
  });
}
