import { legName } from '../part/words';
import type { Check } from './check';

/** Pairs that are named one by one; a part that is wound up in itself would have thousands. */
const NAMED = 12;

/** The formed part runs into itself. Source: geometry. */
export const legsCross: Check = ({ figures, crossings }) =>
  crossings.slice(0, NAMED).map(([a, b], i) => {
    const more =
      i === NAMED - 1 && crossings.length > NAMED ? ` There are ${crossings.length - NAMED} more such places.` : '';
    return {
      level: 'stop',
      code: 'legs-cross',
      at: `chain/${a} chain/${b}`,
      message: `${pieceName(figures, a)} and ${pieceName(figures, b)} run into each other in the formed part. Change a length or an angle between them.${more}`,
      source: 'geometry of the formed shape',
    };
  });

type Figures = Parameters<Check>[0]['figures'];

/** Leg names as in the ledger; bends by the order in which they stand, as on the blank. */
function pieceName(figures: Figures, chain: number): string {
  const leg = figures.legs.findIndex((candidate) => candidate.chain === chain);
  if (leg >= 0) return legName(figures.legs[leg]!.name, leg);
  const joint = figures.joints.findIndex((candidate) => candidate.chain === chain);
  if (figures.joints[joint]?.kind === 'joggle') return 'a joggle';
  const before = figures.joints.slice(0, joint);
  return `bend L${before.reduce((count, other) => count + (other.kind === 'joggle' ? 2 : 1), 1)}`;
}
