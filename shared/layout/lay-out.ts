/** The flat layout: setbacks, flats, allowances, and every station along the blank from the free end of leg 0. */
import { bendAllowance } from '../allowance/allowance';
import { isRounding } from '../geometry/tolerance';
import type { FigureLeg, Joint, PartFigures } from '../part/figures';
import type { Measure, Turn } from '../part/document';
import type { BendResult, JoggleResult, LegResult } from '../result';
import { gardiner } from '../springback/gardiner';
import { joggle, type JoggleShape } from './joggle';
import { setback } from './setback';

/** A piece of the blank, in order: what the formed shape and the section are built from. */
export type Piece =
  | { readonly kind: 'straight'; readonly length: number; readonly leg: number | null; readonly chain: number }
  | {
      readonly kind: 'arc';
      readonly angle: number;
      readonly radius: number;
      readonly turn: Turn;
      readonly bend: number;
      readonly chain: number;
    };

export interface Layout {
  readonly legs: readonly LegResult[];
  readonly bends: readonly BendResult[];
  readonly joggles: readonly JoggleResult[];
  /** Null when a leg is consumed or a joggle can't be made. */
  readonly developedLength: number | null;
  /** Null likewise. */
  readonly pieces: readonly Piece[] | null;
  /** Shortest run of each joggle that is too short, by its index; else null. */
  readonly shortestRuns: readonly (number | null)[];
}

/**
 * Flats = dimension − setbacks; developed length = Σ flats + Σ allowances.
 *
 * @param figures of the part @returns the layout; figures after a broken one are null
 * @source FAA-H-8083-31 ch. 4, flat layout; stations and sight lines: one radius (of the nose) from the tangent line
 */
export function layOut(figures: PartFigures): Layout {
  const { thickness, joints } = figures;
  const shapes = joints.map((joint) =>
    joint.kind === 'joggle' ? joggle(joint.depth, joint.run, joint.radius, thickness) : null,
  );
  const legs: LegResult[] = [];
  const bends: BendResult[] = [];
  const joggles: JoggleResult[] = [];
  const pieces: Piece[] = [];
  let station: number | null = 0;

  figures.legs.forEach((leg, i) => {
    const laid: LegResult = layLeg(leg, joints[i - 1], joints[i], thickness, station);
    legs.push(laid);
    pieces.push({ kind: 'straight', length: laid.flat, leg: i, chain: leg.chain });
    station = laid.end;
    const joint = joints[i];
    if (joint === undefined) return;
    if (joint.kind === 'bend') {
      station = addBend(joint, joint.angle, joint.turn, null, station);
      return;
    }
    const shape: JoggleShape = shapes[i]!;
    const head = { chain: joint.chain, offset: joint.depth, run: joint.run };
    if (!shape.ok) {
      joggles.push({ ...head, angle: null, straight: null, bends: null });
      station = null;
      return;
    }
    const index = joggles.length;
    const first = bends.length;
    station = addBend(joint, shape.angle, joint.turn, index, station);
    pieces.push({ kind: 'straight', length: shape.straight, leg: null, chain: joint.chain });
    station = station === null ? null : station + shape.straight;
    station = addBend(joint, shape.angle, joint.turn === 'up' ? 'down' : 'up', index, station);
    joggles.push({ ...head, angle: shape.angle, straight: shape.straight, bends: [first, first + 1] });
  });

  function addBend(joint: Joint, angle: number, turn: Turn, index: number | null, start: number | null): number | null {
    pieces.push({ kind: 'arc', angle, radius: joint.radius, turn, bend: bends.length, chain: joint.chain });
    const bend = layBend(joint, angle, turn, index, start, figures);
    bends.push(bend);
    return bend.tangentEnd;
  }

  return {
    legs,
    bends,
    joggles,
    developedLength: station,
    pieces: station === null ? null : pieces,
    shortestRuns: shapes.flatMap((shape) => (shape === null ? [] : [shape.ok ? null : shape.shortestRun])),
  };
}

function layLeg(
  leg: FigureLeg,
  before: Joint | undefined,
  after: Joint | undefined,
  thickness: number,
  start: number | null,
): LegResult {
  const measure: [Measure, Measure] = [
    before?.kind === 'joggle' ? 'flat' : leg.measure[0],
    after?.kind === 'joggle' ? 'flat' : leg.measure[1],
  ];
  const setbacks: [number, number] = [
    endSetback(measure[0], before, thickness),
    endSetback(measure[1], after, thickness),
  ];
  const rest = leg.dimension - setbacks[0] - setbacks[1];
  const flat = isRounding(rest, leg.dimension) ? 0 : rest;
  const whole = start !== null && flat > 0;
  return {
    name: leg.name,
    chain: leg.chain,
    dimension: leg.dimension,
    measure,
    setback: setbacks,
    flat,
    start,
    end: whole ? start + flat : null,
  };
}

/** A free end has no setback; what is measured to a mold point that is not there was refused before. */
function endSetback(measure: Measure, joint: Joint | undefined, thickness: number): number {
  if (joint?.kind !== 'bend') return 0;
  return setback(measure, joint.angle, joint.radius, thickness) ?? 0;
}

function layBend(
  joint: Joint,
  angle: number,
  turn: Turn,
  index: number | null,
  start: number | null,
  figures: PartFigures,
): BendResult {
  const { thickness, material } = figures;
  const { radius, noseRadius } = joint;
  const { allowance, kFactor } = bendAllowance(joint.allowance, angle, radius, thickness);
  const back = setback('mold-line', angle, radius, thickness);
  const end = start === null ? null : start + allowance;
  return {
    name: joint.name,
    chain: joint.chain,
    angle,
    turn,
    radius,
    method: joint.allowance.method,
    kFactor,
    allowance,
    setback: back,
    deduction: back === null ? null : 2 * back - allowance,
    tangentStart: start,
    centre: start === null ? null : start + allowance / 2,
    tangentEnd: end,
    noseRadius,
    sightLine:
      start === null || end === null ? null : { startUnderNose: start + noseRadius, endUnderNose: end - noseRadius },
    springback: gardiner(angle, radius, thickness, material),
    joggle: index,
  };
}
