/** The formed deck: true faces with the sheet's thickness, mold points, every leg dimensioned, the selected bend noted. */
import type { Solved } from '@shared/result';
import type { Box } from './box';
import { boxAround } from './box';
import { Clearance } from './clearance';
import type { Curve, Frames } from './formed-frames';
import { formedFrames, onCurve } from './formed-frames';
import { bendPath, facePoints, outlinePath, outlineSegments, stretchPath } from './formed-outline';
import { leaderNote } from './leader';
import { legDimensions } from './leg-dimensions';
import type { Drawing, Mark, TextMark } from './marks';
import { textBox } from './marks';
import type { Point } from './point';
import { along, direction } from './point';
import type { View } from './view';
import { fitView } from './view';

export interface FormedOptions {
  readonly width: number;
  readonly height: number;
  /** Entry of the chain. */
  readonly selected: number | null;
  readonly figureOf: (length: number) => string;
  /** "L2 · face B up · 90°" and "BA 0.273 · SB 0.196". */
  readonly noteOf: (bend: number) => readonly [string, string];
}

export interface FormedDrawing extends Drawing {
  /** Dimensions that found no room; the ledger has them. */
  readonly left: number;
}

/** Null when the part can't be drawn; the findings say why. */
export function formedDrawing(solved: Solved, options: FormedOptions): FormedDrawing | null {
  const frames = formedFrames(solved);
  if (!frames || options.width < 40 || options.height < 40) return null;
  const { width, height, selected } = options;
  const view = viewOf(solved, frames, width, height);
  const paper: Box = { left: 6, top: 6, right: width - 6, bottom: height - 6 };
  const clearance = new Clearance(paper, outlineSegments(frames, view));

  const metal = metalMarks(frames, view, selected);
  const molds = moldMarks(solved, view, clearance);
  const dimensions = legDimensions(solved, frames, view, clearance, options.figureOf, selected);
  const curve = frames.curves.find((one) => one.chain === selected);
  const leader = curve ? leaderOf(curve, view, options, clearance) : [];
  const names = frames.curves.flatMap((one) => (one === curve ? [] : nameOf(one, view, clearance)));
  return {
    width,
    height,
    marks: [...metal, ...molds, ...dimensions.marks, ...names, ...leader],
    left: dimensions.left,
  };
}

/** The seat leg lies level; round the part there is room for two rows of dimensions. */
function viewOf(solved: Solved, frames: Frames, width: number, height: number): View {
  const seat = solved.formed?.envelope?.seat ?? 0;
  const level = frames.stretches.find((stretch) => stretch.leg === seat)?.heading ?? 0;
  const marginX = Math.min(110, Math.max(56, width * 0.13));
  const marginY = Math.min(84, Math.max(46, height * 0.2));
  const room = { left: marginX, right: width - marginX, top: marginY, bottom: height - marginY };
  return fitView([...facePoints(frames, 'lower'), ...facePoints(frames, 'upper')], level, room);
}

function metalMarks(frames: Frames, view: View, selected: number | null): Mark[] {
  const sheet: Mark = { kind: 'path', role: 'sheet', d: outlinePath(frames, view) };
  const bends = frames.curves.map((curve): Mark => {
    const common = { pick: curve.chain, selected: curve.chain === selected };
    return { kind: 'path', role: 'bend', d: bendPath(curve, view), ...common };
  });
  const picked = frames.stretches.flatMap((stretch, index): Mark[] =>
    stretch.chain === selected
      ? [{ kind: 'path', role: 'leg', d: stretchPath(frames, index, view), pick: stretch.chain, selected: true }]
      : [],
  );
  const hits = frames.stretches.map((stretch, index): Mark => {
    return { kind: 'path', role: 'hit', d: stretchPath(frames, index, view), pick: stretch.chain };
  });
  const bendHits = frames.curves.map((curve): Mark => {
    return { kind: 'path', role: 'hit', d: bendPath(curve, view), pick: curve.chain };
  });
  return [sheet, ...bends, ...picked, ...hits, ...bendHits];
}

const CROSS = 5;

function moldMarks(solved: Solved, view: View, clearance: Clearance): Mark[] {
  const points = (solved.formed?.moldPoints ?? []).flatMap((point) => (point ? [view.place(point)] : []));
  for (const { x, y } of points) clearance.addMark(boxAround({ x, y }, CROSS, CROSS));
  const crosses = points.map(({ x, y }) => `M${x - CROSS} ${y}h${2 * CROSS}M${x} ${y - CROSS}v${2 * CROSS}`);
  return crosses.length === 0 ? [] : [{ kind: 'path', role: 'mold', d: crosses.join('') }];
}

/** The middle of a bend's outer face and the way out from there. */
function apex(curve: Curve, view: View): { tip: Point; outward: Point } {
  const outer = curve.lowerRadius > curve.upperRadius ? 'lower' : 'upper';
  const tip = view.place(onCurve(curve, outer, 0.5));
  const inner = view.place(onCurve(curve, outer === 'lower' ? 'upper' : 'lower', 0.5));
  return { tip, outward: direction(inner, tip) };
}

function leaderOf(curve: Curve, view: View, options: FormedOptions, clearance: Clearance): readonly Mark[] {
  const { tip, outward } = apex(curve, view);
  const [upper, lower] = options.noteOf(curve.bend);
  return leaderNote(tip, outward, upper, lower, curve.chain, clearance);
}

/** "L2" inside the bend or outside it, where there is room. */
function nameOf(curve: Curve, view: View, clearance: Clearance): Mark[] {
  const { tip, outward } = apex(curve, view);
  const inner = { x: -outward.x, y: -outward.y };
  const depth = Math.min(curve.lowerRadius, curve.upperRadius) * view.scale;
  const places = [
    along(tip, inner, Math.abs(curve.lowerRadius - curve.upperRadius) * view.scale + Math.min(depth, 14) + 12),
    along(tip, outward, 22),
    along(tip, inner, 40),
  ];
  for (const place of places) {
    const mark: TextMark = {
      kind: 'text',
      role: 'name',
      text: `L${curve.bend + 1}`,
      at: place,
      anchor: 'middle',
      pick: curve.chain,
    };
    const footprint = { texts: [textBox(mark)], lines: [], thin: [] };
    if (clearance.cost(footprint) > 0) continue;
    clearance.add(footprint);
    return [mark];
  }
  return [];
}
