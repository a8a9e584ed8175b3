/** The formed part as solid pieces: rectangles for straights, annular sectors for bends, in the frame of leg 0. */
import { direction } from '../geometry/direction';
import type { Piece } from '../layout/lay-out';
import type { XY } from '../result';

/** Leg 0 lies along +x with its lower face on y = 0; an up bend turns toward +y. */
export type Solid = Bar | Sector;

export interface Bar {
  readonly kind: 'bar';
  /** Where its lower face begins. */
  readonly start: XY;
  /** Degrees counter-clockwise from +x. */
  readonly heading: number;
  readonly length: number;
  /** Index of the leg, null for the straight of a joggle. */
  readonly leg: number | null;
  readonly chain: number;
}

export interface Sector {
  readonly kind: 'sector';
  readonly centre: XY;
  readonly inner: number;
  readonly outer: number;
  /** Degrees where the sector begins, seen from the centre; it sweeps as the sheet runs. */
  readonly from: number;
  /** Positive for an up bend. */
  readonly sweep: number;
  readonly bend: number;
  readonly chain: number;
  /** Heading of the sheet before the bend. */
  readonly heading: number;
  /** Where the lower face meets the start tangent line. */
  readonly start: XY;
}

/**
 * @param pieces straights and arcs in order along the sheet @param thickness T > 0
 * @returns the solids, in the same order
 * @source geometry
 */
export function formSolids(pieces: readonly Piece[], thickness: number): readonly Solid[] {
  const solids: Solid[] = [];
  let [x, y] = [0, 0];
  let heading = 0;
  for (const piece of pieces) {
    const along = direction(heading);
    const start: XY = [x, y];
    if (piece.kind === 'straight') {
      solids.push({ kind: 'bar', start, heading, length: piece.length, leg: piece.leg, chain: piece.chain });
      x += along.x * piece.length;
      y += along.y * piece.length;
      continue;
    }
    const up = piece.turn === 'up';
    // From the lower face to the centre: over the sheet and the radius for an up bend, down by the radius for a down bend.
    const reach = up ? piece.radius + thickness : -piece.radius;
    const centre: XY = [x - along.y * reach, y + along.x * reach];
    const sweep = up ? piece.angle : -piece.angle;
    solids.push({
      kind: 'sector',
      centre,
      inner: piece.radius,
      outer: piece.radius + thickness,
      from: up ? heading - 90 : heading + 90,
      sweep,
      bend: piece.bend,
      chain: piece.chain,
      heading,
      start,
    });
    heading += sweep;
    const after = direction(heading);
    x = centre[0] + after.y * reach;
    y = centre[1] - after.x * reach;
  }
  return solids;
}
