import { placeWords } from '../part/finding-words';
import type { Check } from './check';

/** Pairs that are named one by one; a part that is wound up in itself would have thousands. */
const NAMED = 12;

/** The formed part runs into itself. Source: geometry. */
export const legsCross: Check = ({ layout, crossings }) =>
  crossings.slice(0, NAMED).map(([a, b], i) => {
    const at = `chain/${a} chain/${b}`;
    const left = crossings.length - NAMED;
    const more = i === NAMED - 1 && left > 0 ? ` There are ${left} more such places.` : '';
    return {
      level: 'stop',
      code: 'legs-cross',
      at,
      message: `${placeWords(layout, at)} run into each other in the formed part. Change a length or an angle between them.${more}`,
      source: 'geometry of the formed shape',
    };
  });
