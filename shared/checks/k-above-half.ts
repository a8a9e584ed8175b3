import { exceeds } from '../geometry/tolerance';
import { type Check, shown } from './check';

/** Methods whose K a person answers for. */
const GIVEN = new Set(['k-factor', 'shop', 'measured']);

/** A neutral line nearer the outside than the inside. Once a part, at the first such bend. Source: definition of K. */
export const kAboveHalf: Check = ({ layout }) => {
  const bends = layout.bends.filter((bend) => GIVEN.has(bend.method) && exceeds(bend.kFactor, 0.5));
  const [first] = bends;
  if (first === undefined) return [];
  const largest = Math.max(...bends.map((bend) => bend.kFactor));
  return [
    {
      level: 'caution',
      code: 'k-above-half',
      at: `chain/${first.chain}`,
      message: `K is ${shown(largest)}, above 0.5: the neutral line would lie outside mid-thickness, which bending does not do. Check the figure or the coupon it came from.`,
      source: 'definition of the K-factor',
    },
  ];
};
