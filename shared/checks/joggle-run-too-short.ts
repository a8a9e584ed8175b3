import { type Check, leastShown, shown } from './check';

/** A joggle whose two bends don't fit into its run. Source: geometry. */
export const joggleRunTooShort: Check = ({ figures, layout }) =>
  layout.joggles.flatMap((joggle, i) => {
    const shortest = layout.shortestRuns[i];
    if (shortest === null || shortest === undefined) return [];
    const { unit } = figures;
    return [
      {
        level: 'stop',
        code: 'joggle-run-too-short',
        at: `chain/${joggle.chain}`,
        message:
          `A joggle ${shown(joggle.offset)} ${unit} deep can't be made over a run of ${shown(joggle.run)} ${unit} with this radius. ` +
          `The shortest run is ${leastShown(shortest)} ${unit}; a smaller radius shortens it.`,
        source: 'geometry: two arcs and their common tangent',
      },
    ];
  });
