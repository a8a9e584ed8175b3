import { exceeds } from '../geometry/tolerance';
import { type Check, shown } from './check';

/** A nose chosen for a bend that is not the one that springs back to its radius. Common practice, no source. */
export const noseRadiusMismatch: Check = ({ figures, layout, rules }) =>
  layout.bends.flatMap((bend, i) => {
    const tool = bend.springback?.toolRadius;
    const chosen = figures.noses.has(bend.chain);
    // A joggle's two bends are formed alike: one finding is enough.
    if (tool === undefined || !chosen || (bend.joggle !== null && layout.bends[i - 1]?.joggle === bend.joggle))
      return [];
    if (!exceeds(Math.abs(bend.noseRadius - tool), rules.limits.noseMismatch * tool)) return [];
    const { unit } = figures;
    return [
      {
        level: 'caution',
        code: 'nose-radius-mismatch',
        at: `chain/${bend.chain}`,
        message: `The nose of ${shown(bend.noseRadius)} ${unit} differs from the ${shown(tool)} ${unit} that springs back to this radius by more than ${shown(rules.limits.noseMismatch * 100)} %. Build the nose up or choose another bar.`,
        source: 'common practice, no source',
      },
    ];
  });
