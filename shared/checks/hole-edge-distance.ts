import { fallsShort } from '../geometry/tolerance';
import { type Check, shown } from './check';

/** A hole too near a free edge of the blank. One finding a hole or row, at its nearest. Source: AC 43.13-1B ch. 4, edge distance. */
export const holeEdgeDistance: Check = ({ figures, layout, holes, rules }) => {
  const { developedLength: length } = layout;
  const { width, unit } = figures;
  const nearest = new Map<number, { distance: number; least: number }>();
  for (const { hole, station, across, diameter } of holes) {
    if (station === null || length === null) continue;
    const distances = [station, length - station, ...(width === null ? [] : [across, width - across])];
    const distance = Math.min(...distances);
    const least = rules.limits.holeEdge * diameter;
    if (fallsShort(distance, least) && distance < (nearest.get(hole)?.distance ?? Infinity))
      nearest.set(hole, { distance, least });
  }
  return [...nearest].map(([hole, { distance, least }]) => ({
    level: 'caution',
    code: 'hole-edge-distance',
    at: `holes/${hole}`,
    message:
      distance < 0
        ? `The centre of this hole lies ${shown(-distance)} ${unit} off the blank.`
        : `The centre of this hole is ${shown(distance)} ${unit} from an edge of the blank; ${shown(least)} ${unit} (${shown(rules.limits.holeEdge)} diameters) is wanted.`,
    source: 'FAA AC 43.13-1B ch. 4: edge distance of two diameters',
  }));
};
