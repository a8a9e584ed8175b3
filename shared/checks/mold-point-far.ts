import { exceeds } from '../geometry/tolerance';
import { legName } from '../part/words';
import { type Check, shown } from './check';

/** A closed bend whose mold point lies off the shorter of its legs: nobody can measure to it. Source: geometry. */
export const moldPointFar: Check = ({ figures, layout }) =>
  layout.bends.flatMap((bend) => {
    if (bend.joggle !== null || bend.setback === null || bend.angle <= 90) return [];
    const i = layout.legs.findIndex((leg) => leg.chain === bend.chain - 1);
    const [before, after] = [layout.legs[i]!, layout.legs[i + 1]!];
    const shorter = before.dimension <= after.dimension ? i : i + 1;
    const leg = layout.legs[shorter]!;
    if (!exceeds(bend.setback, leg.dimension)) return [];
    const { unit } = figures;
    return [
      {
        level: 'note',
        code: 'mold-point-far',
        at: `chain/${bend.chain}`,
        message: `The mold point of this closed bend lies ${shown(bend.setback)} ${unit} from the tangent line, past ${legName(leg.name, shorter)} (${shown(leg.dimension)} ${unit}). Measure its legs by calipers ("outside-edge") there.`,
        source: 'geometry of the mold point',
      },
    ];
  });
