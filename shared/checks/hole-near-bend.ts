import { fallsShort } from '../geometry/tolerance';
import { type Check, shown } from './check';

/** A hole so near a bend that it would be pulled oval. One finding a hole or row. Common practice, no source. */
export const holeNearBend: Check = ({ figures, layout, holes, rules }) => {
  const least = rules.limits.holeToBend * figures.thickness;
  const { unit } = figures;
  const nearest = new Map<number, number>();
  for (const { hole, station, diameter } of holes) {
    if (station === null) continue;
    for (const { tangentStart, tangentEnd } of layout.bends) {
      if (tangentStart === null || tangentEnd === null) continue;
      const outside = Math.max(tangentStart - station, station - tangentEnd);
      const gap = outside - diameter / 2;
      if (fallsShort(gap, least) && gap < (nearest.get(hole) ?? Infinity)) nearest.set(hole, gap);
    }
  }
  return [...nearest].map(([hole, gap]) => ({
    level: 'caution',
    code: 'hole-near-bend',
    at: `holes/${hole}`,
    message:
      gap < 0
        ? 'This hole runs into a bend: drill it after bending, or move it.'
        : `The edge of this hole is ${shown(gap)} ${unit} from a bend tangent line; ${shown(least)} ${unit} (${shown(rules.limits.holeToBend)} T) keeps it round. Move it, or drill it after bending.`,
    source: 'common practice, no source',
  }));
};
