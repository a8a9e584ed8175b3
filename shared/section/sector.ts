export interface SectorProperties {
  readonly area: number;
  /** Distance of the centroid from the arc centre, on the axis of symmetry. */
  readonly centroid: number;
  /** Second moment about the axis of symmetry. */
  readonly alongAxis: number;
  /** Second moment about the line through the centroid square to that axis. */
  readonly acrossAxis: number;
}

/**
 * An annular sector. With θ in radians:
 * `A = θ/2·(Ro² − Ri²)`, `c = 4·sin(θ/2)·(Ro³ − Ri³) / (3θ·(Ro² − Ri²))`,
 * `I_axis = (Ro⁴ − Ri⁴)/8·(θ − sin θ)`, `I_centre = (Ro⁴ − Ri⁴)/8·(θ + sin θ)`, moved to the centroid by A·c².
 *
 * @param inner Ri ≥ 0 @param outer Ro > Ri @param degrees 0 < θ ≤ 180
 * @source standard geometry (as in tables of area properties)
 * @example sectorProperties(0.16, 0.2, 90).area // 0.0113097…
 */
export function sectorProperties(inner: number, outer: number, degrees: number): SectorProperties {
  const theta = (degrees * Math.PI) / 180;
  const squares = outer ** 2 - inner ** 2;
  const fourths = (outer ** 4 - inner ** 4) / 8;
  const area = (theta / 2) * squares;
  const centroid = (4 * Math.sin(theta / 2) * (outer ** 3 - inner ** 3)) / (3 * theta * squares);
  return {
    area,
    centroid,
    alongAxis: fourths * (theta - Math.sin(theta)),
    acrossAxis: fourths * (theta + Math.sin(theta)) - area * centroid * centroid,
  };
}
