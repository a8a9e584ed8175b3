import type { Curve } from '../geometry/curve';
import { ends } from '../geometry/curve';
import type { FaceElement, Faces, XY } from '../result';
import { extent } from './envelope';

export interface Outline {
  /** Closed SVG path: upper face out, far end, lower face back, near end. y runs up, as in the engine. */
  readonly path: string;
  /** [x, y, width, height] of the drawn section. */
  readonly box: readonly [number, number, number, number];
}

/** Digits that keep a drawing true far below what any screen or sheet can show. */
const DIGITS = 7;

/**
 * The outline of the formed section for a drawing.
 *
 * @param faces exact faces from the result @returns path and box, or null when there is nothing to draw
 * @example outlineOf({ upper: [], lower: [] }) // null
 */
export function outlineOf(faces: Faces): Outline | null {
  const upper = faces.upper.map(curveOf);
  const lower = faces.lower.map(curveOf);
  if (upper.length === 0 || lower.length === 0) return null;
  const back = [...lower].reverse().map(reversed);
  const steps = [...upper, ...back];
  const begin = ends(steps[0]!)[0];
  let at: XY = begin;
  const commands = [`M${pair(begin)}`];
  for (const curve of steps) {
    const [from, to] = ends(curve);
    if (pair(from) !== pair(at)) commands.push(`L${pair(from)}`);
    commands.push(curve.kind === 'segment' ? `L${pair(to)}` : arcCommand(curve.radius, curve.sweep, to));
    at = to;
  }
  const [x0, y0, x1, y1] = extent([...upper, ...lower]);
  return { path: `${commands.join('')}Z`, box: [short(x0), short(y0), short(x1 - x0), short(y1 - y0)] };
}

/** A face element as a curve of the geometry. */
export function curveOf(element: FaceElement): Curve {
  if ('line' in element) return { kind: 'segment', from: element.line[0], to: element.line[1] };
  return { kind: 'arc', ...element.arc };
}

function reversed(curve: Curve): Curve {
  if (curve.kind === 'segment') return { kind: 'segment', from: curve.to, to: curve.from };
  return { ...curve, from: curve.from + curve.sweep, sweep: -curve.sweep };
}

/** Sweeps reach 180° at most, so the large-arc flag is never needed; positive sweeps run counter-clockwise with y up. */
function arcCommand(radius: number, sweep: number, to: XY): string {
  return `A${short(radius)} ${short(radius)} 0 0 ${sweep > 0 ? 1 : 0} ${pair(to)}`;
}

const short = (value: number): number => Number(value.toPrecision(DIGITS)) + 0;
const pair = ([x, y]: XY): string => `${short(x)} ${short(y)}`;
