import type { Piece } from '../layout/lay-out';
import type { BendResult, Solved } from '../result';
import { formSolids, type Solid } from './solid';

/**
 * The formed part as solid pieces, from its figures: what a drawing needs to know besides the faces, which leg or bend each
 * piece of them belongs to.
 *
 * @param solved result of the engine @returns bars and sectors in turn, or null when the part can't be formed
 * @example solidsOf({ formed: null, thickness: 0.04, legs: [], bends: [], joggles: [] }) // null
 */
export function solidsOf(
  solved: Pick<Solved, 'formed' | 'thickness' | 'legs' | 'bends' | 'joggles'>,
): readonly Solid[] | null {
  if (!solved.formed?.faces) return null;
  const pieces: Piece[] = [];
  let next = 0;
  for (const [leg, { flat, chain }] of solved.legs.entries()) {
    pieces.push({ kind: 'straight', length: flat, leg, chain });
    const bend = solved.bends[next];
    if (bend === undefined) continue;
    pieces.push(arcOf(bend, next));
    next += 1;
    if (bend.joggle === null) continue;
    const straight = solved.joggles[bend.joggle]?.straight ?? null;
    const back = solved.bends[next];
    if (straight === null || back === undefined) return null;
    pieces.push({ kind: 'straight', length: straight, leg: null, chain: bend.chain }, arcOf(back, next));
    next += 1;
  }
  return formSolids(pieces, solved.thickness);
}

const arcOf = ({ angle, radius, turn, chain }: BendResult, bend: number): Piece => ({
  kind: 'arc',
  angle,
  radius,
  turn,
  bend,
  chain,
});
