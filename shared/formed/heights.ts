import { direction } from '../geometry/direction';
import { areParallel } from '../geometry/tolerance';
import type { Height } from '../result';
import type { Bar, Solid } from './solid';

/**
 * Outside-to-outside height of each leg and the next one along the chain that lies parallel to it: what a caliper reads.
 *
 * @param solids the formed part @param thickness T
 * @returns one entry a leg that has a parallel one after it
 * @source geometry
 */
export function heightsOf(solids: readonly Solid[], thickness: number): readonly Height[] {
  const bars = solids.filter((solid): solid is Bar => solid.kind === 'bar' && solid.leg !== null);
  return bars.flatMap((bar, i) => {
    const other = bars.slice(i + 1).find((next) => areParallel(bar.heading, next.heading));
    if (other === undefined) return [];
    const { x, y } = direction(bar.heading);
    // Offset of the other leg's two faces from this leg's lower face, square to this leg.
    const same = direction(other.heading).x * x + direction(other.heading).y * y > 0 ? 1 : -1;
    const low = (other.start[1] - bar.start[1]) * x - (other.start[0] - bar.start[0]) * y;
    const faces = [0, thickness, low, low + same * thickness];
    return [{ legs: [bar.leg!, other.leg!] as const, height: Math.max(...faces) - Math.min(...faces) }];
  });
}
