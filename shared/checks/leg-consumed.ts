import { legName } from '../part/words';
import { type Check, leastShown, shown } from './check';

/** The bends at a leg's ends take more than the leg: flat ≤ 0. Source: geometry. */
export const legConsumed: Check = ({ figures, layout }) =>
  layout.legs.flatMap((leg, i) => {
    if (leg.flat > 0) return [];
    const shortest = leg.setback[0] + leg.setback[1];
    const { unit } = figures;
    return [
      {
        level: 'stop',
        code: 'leg-consumed',
        at: `chain/${leg.chain}`,
        message:
          `${legName(leg.name, i)} is ${shown(leg.dimension)} ${unit}, but its bends take ${shown(shortest)} ${unit} of it: no flat is left. ` +
          `Make it longer than ${leastShown(shortest)} ${unit}, or the radius smaller.`,
        source: 'geometry: flat = dimension − setbacks',
      },
    ];
  });
