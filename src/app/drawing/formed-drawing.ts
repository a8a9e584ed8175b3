/** The formed deck: true faces with the sheet's thickness, mold points, every leg dimensioned, every bend named. */
import type { Solved } from '@shared/result';
import { apex, bendName } from './bend-name';
import type { Box } from './box';
import { boxAround } from './box';
import { Clearance, type Footprint } from './clearance';
import type { Curve, Frames } from './formed-frames';
import { formedFrames } from './formed-frames';
import { bendPath, facePoints, outlinePath, outlineSegments, stretchPath } from './formed-outline';
import { type LeaderNote, leaderNote, runsInto } from './leader';
import { legDimensions } from './leg-dimensions';
import type { Drawing, Mark, Overlay, TextMark } from './marks';
import { NO_OVERLAY, textBox } from './marks';
import type { View } from './view';
import { fitView } from './view';

export interface FormedOptions {
  readonly width: number;
  readonly height: number;
  readonly figureOf: (length: number) => string;
  /** What is said of a bend when it is selected, the fullest way first. */
  readonly notesOf: (bend: number) => readonly LeaderNote[];
}

export interface FormedDrawing extends Drawing {
  /** Dimensions that found no room; the ledger has them. */
  readonly left: number;
  /** The note of a selected bend; nothing for an entry that has none. Laid out when it is asked for. */
  readonly noteOn: (chain: number | null) => Overlay;
}

/** Null when the part can't be drawn; the findings say why. */
export function formedDrawing(solved: Solved, options: FormedOptions): FormedDrawing | null {
  const frames = formedFrames(solved);
  if (!frames || options.width < 40 || options.height < 40) return null;
  const { width, height } = options;
  const view = viewOf(solved, frames, width, height);
  const paper: Box = { left: 6, top: 6, right: width - 6, bottom: height - 6 };
  const outline = outlineSegments(frames, view);
  const clearance = new Clearance(paper, outline);

  const metal = metalMarks(frames, view);
  const molds = moldMarks(solved, view, clearance);
  const dimensions = legDimensions(solved, frames, view, clearance, options.figureOf);
  // Names are known apart from the rest: they alone give way to the note of a bend where it has no other room.
  const taken = new Clearance(paper);
  const names = frames.curves.flatMap((curve) => {
    const mark = bendName(curve, view, (footprint) => clearance.cost(footprint) + taken.cost(footprint));
    if (!mark) return [];
    taken.add(alone(mark));
    return [{ curve, mark }];
  });
  return {
    width,
    height,
    marks: [...metal, ...molds, ...dimensions.marks, ...names.map(({ mark }) => mark)],
    left: dimensions.left,
    noteOn: (chain) => {
      const curve = chain === null ? undefined : frames.curves.find((one) => one.chain === chain);
      return curve ? noteOn(curve, names, view, options, clearance, new Clearance(paper)) : NO_OVERLAY;
    },
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

/** Bends and legs are seen when they are selected; the hits over them are what a pointer finds. */
function metalMarks(frames: Frames, view: View): Mark[] {
  const bends = frames.curves.map((curve) => ({ d: bendPath(curve, view), pick: curve.chain }));
  const legs = frames.stretches.map((stretch) => ({ d: stretchPath(stretch, view), pick: stretch.chain }));
  return [
    { kind: 'path', role: 'sheet', d: outlinePath(frames, view) },
    ...bends.map((one): Mark => ({ kind: 'path', role: 'bend', ...one })),
    ...legs.map((one): Mark => ({ kind: 'path', role: 'leg', ...one })),
    ...[...legs, ...bends].map((one): Mark => ({ kind: 'path', role: 'hit', ...one })),
  ];
}

const CROSS = 5;

function moldMarks(solved: Solved, view: View, clearance: Clearance): Mark[] {
  const points = (solved.formed?.moldPoints ?? []).flatMap((point) => (point ? [view.place(point)] : []));
  for (const { x, y } of points) clearance.addMark(boxAround({ x, y }, CROSS, CROSS));
  const crosses = points.map(({ x, y }) => `M${x - CROSS} ${y}h${2 * CROSS}M${x} ${y - CROSS}v${2 * CROSS}`);
  return crosses.length === 0 ? [] : [{ kind: 'path', role: 'mold', d: crosses.join('') }];
}

const alone = (mark: TextMark): Footprint => ({ texts: [textBox(mark)], lines: [], thin: [] });

interface Named {
  readonly curve: Curve;
  readonly mark: TextMark;
}

/** Where it covers no name but its own if that can be, else over a name or two, which are not shown meanwhile. */
function noteOn(
  curve: Curve,
  names: readonly Named[],
  view: View,
  options: FormedOptions,
  clearance: Clearance,
  taken: Clearance,
): Overlay {
  const { tip, outward } = apex(curve, view);
  const own = names.filter((name) => name.curve === curve).map(({ mark }) => mark);
  const others = names.filter((name) => name.curve !== curve).map(({ mark }) => mark);
  for (const mark of others) taken.add(alone(mark));
  const overNames = (footprint: Footprint): number => clearance.cost(footprint);
  const besideNames = (footprint: Footprint): number => clearance.cost(footprint) + taken.cost(footprint);
  for (const cost of [besideNames, overNames]) {
    for (const note of options.notesOf(curve.bend)) {
      const plan = leaderNote(tip, outward, note, curve.chain, cost);
      if (!plan) continue;
      const covered = others.filter((mark) => runsInto(plan.footprint, textBox(mark)));
      return { marks: plan.marks, hides: [...own, ...covered] };
    }
  }
  return NO_OVERLAY;
}
