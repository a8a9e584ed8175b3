import { direction } from '../geometry/direction';
import type { Solid } from '../formed/solid';
import type { Section } from '../result';
import { sectorProperties } from './sector';

/** Area, centroid and second moments about that centroid of one piece, axes parallel to the part's. */
interface Own {
  readonly area: number;
  readonly x: number;
  readonly y: number;
  readonly ix: number;
  readonly iy: number;
  readonly ixy: number;
}

/**
 * Section properties of the formed part, exactly: rectangles and annular sectors, no polygons.
 *
 * About the centroid, axes parallel to the frame of the formed shape (x along leg 0). `ixy = ∫xy dA`;
 * `tan 2θ = −2·Ixy/(Ix − Iy)`, θ in degrees from x to the axis about which I is i1 ≥ i2, −90 < θ ≤ 90, null when i1 = i2.
 *
 * @param solids the formed part, every flat > 0 @param thickness T > 0
 * @returns area (unit²), centroid (unit), second moments (unit⁴), radii of gyration (unit)
 * @source statics: parallel-axis theorem; sector formulas in sector.ts
 */
export function sectionOf(solids: readonly Solid[], thickness: number): Section {
  const parts = solids.map((solid) => own(solid, thickness));
  let [area, sx, sy] = [0, 0, 0];
  for (const part of parts) {
    area += part.area;
    sx += part.area * part.x;
    sy += part.area * part.y;
  }
  const centroid = { x: sx / area, y: sy / area };
  let [ix, iy, ixy] = [0, 0, 0];
  for (const part of parts) {
    const dx = part.x - centroid.x;
    const dy = part.y - centroid.y;
    ix += part.ix + part.area * dy * dy;
    iy += part.iy + part.area * dx * dx;
    ixy += part.ixy + part.area * dx * dy;
  }
  const principal = principalOf(ix, iy, ixy);
  const radii = { r1: Math.sqrt(principal.i1 / area), r2: Math.sqrt(Math.max(0, principal.i2) / area) };
  return { area, centroid, ix, iy, ixy, principal, radii };
}

/** Relative difference of i1 and i2 below which no axis is the principal one. */
const EQUAL = 1e-12;

/** Degrees: directions this near −90° are 90°. */
const CUT = 1e-9;

function principalOf(ix: number, iy: number, ixy: number): Section['principal'] {
  const mean = (ix + iy) / 2;
  const half = (ix - iy) / 2;
  const spread = Math.hypot(half, ixy);
  // What the lean adds to the greater moment and takes from the lesser; mean ∓ spread would lose the digits of a slender i2.
  const lean = ixy === 0 ? 0 : ixy * (ixy / (spread + Math.abs(half)));
  const [i1, i2] = [Math.max(ix, iy) + lean, Math.min(ix, iy) - lean];
  if (spread <= EQUAL * mean) return { i1, i2, angle: null };
  const angle = (Math.atan2(-ixy, half) * 90) / Math.PI;
  // An axis along y is 90°, whichever side of the cut rounding puts it.
  return { i1, i2, angle: angle <= CUT - 90 ? 90 : angle };
}

function own(solid: Solid, thickness: number): Own {
  if (solid.kind === 'bar') {
    const { x, y } = direction(solid.heading);
    const { length, start } = solid;
    const area = length * thickness;
    const half = { along: length / 2, up: thickness / 2 };
    return {
      area,
      x: start[0] + x * half.along - y * half.up,
      y: start[1] + y * half.along + x * half.up,
      ...turned((length * thickness ** 3) / 12, (thickness * length ** 3) / 12, x, y),
    };
  }
  const middle = direction(solid.from + solid.sweep / 2);
  const sector = sectorProperties(solid.inner, solid.outer, Math.abs(solid.sweep));
  return {
    area: sector.area,
    x: solid.centre[0] + middle.x * sector.centroid,
    y: solid.centre[1] + middle.y * sector.centroid,
    ...turned(sector.alongAxis, sector.acrossAxis, middle.x, middle.y),
  };
}

/** Second moments of a symmetric piece (about its own axis, and square to it) in axes turned back by the axis (x, y). */
function turned(alongAxis: number, acrossAxis: number, x: number, y: number): Pick<Own, 'ix' | 'iy' | 'ixy'> {
  return {
    ix: alongAxis * x * x + acrossAxis * y * y,
    iy: alongAxis * y * y + acrossAxis * x * x,
    ixy: (acrossAxis - alongAxis) * x * y,
  };
}
