import { exceeds } from '../geometry/tolerance';
import { type Check, shown } from './check';

/** A measured allowance that is no line of the sheet: shorter than its inside face or longer than its outside. Source: geometry. */
export const allowanceBeyondSheet: Check = ({ figures, layout }) =>
  layout.bends.flatMap((bend) => {
    if (bend.method !== 'measured' || (bend.kFactor >= 0 && !exceeds(bend.kFactor, 1))) return [];
    const { unit } = figures;
    const where = bend.kFactor < 0 ? 'shorter than the inside face' : 'longer than the outside face';
    return [
      {
        level: 'caution',
        code: 'allowance-beyond-sheet',
        at: `chain/${bend.chain}`,
        message: `The allowance of ${shown(bend.allowance)} ${unit} stated for this bend is ${where} (K ${shown(bend.kFactor)}). Check what was measured, and its radius and angle.`,
        source: 'geometry: the neutral line lies within the sheet',
      },
    ];
  });
