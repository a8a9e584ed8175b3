import { fallsShort } from '../geometry/tolerance';
import { type Check, shown } from './check';

/** A joggle that steps faster than shops like to form it. Common practice, no source. */
export const joggleRunSteep: Check = ({ figures, layout, rules }) =>
  layout.joggles.flatMap((joggle) => {
    const least = rules.limits.joggleRun * joggle.offset;
    if (joggle.bends === null || !fallsShort(joggle.run, least)) return [];
    const { unit } = figures;
    return [
      {
        level: 'caution',
        code: 'joggle-run-steep',
        at: `chain/${joggle.chain}`,
        message: `The run of this joggle is ${shown(joggle.run)} ${unit}, less than ${shown(rules.limits.joggleRun)} times its depth. A run of ${shown(least)} ${unit} or more forms easier.`,
        source: 'common practice, no source',
      },
    ];
  });
