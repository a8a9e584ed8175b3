import type { Curve } from '../geometry/curve';
import { direction } from '../geometry/direction';
import { halfTangent } from '../layout/setback';
import { isReturnBend } from '../geometry/tolerance';
import type { FaceElement, Faces, XY } from '../result';
import type { Sector, Solid } from './solid';

/**
 * The upper face (up on leg 0, face A) and the lower one (face B), exact lines and arcs from leg 0 to the last leg.
 * An arc of radius 0 is left out.
 */
export function facesOf(solids: readonly Solid[], thickness: number): Faces {
  const upper: FaceElement[] = [];
  const lower: FaceElement[] = [];
  for (const solid of solids) {
    const [top, bottom] = sides(solid, thickness);
    add(upper, top);
    add(lower, bottom);
  }
  return { upper, lower };
}

/** Both faces of one solid: [upper, lower]. */
export function sides(solid: Solid, thickness: number): readonly [Curve, Curve] {
  if (solid.kind === 'sector') {
    const { centre, from, sweep } = solid;
    const arc = (radius: number): Curve => ({ kind: 'arc', centre, radius, from, sweep });
    return sweep > 0 ? [arc(solid.inner), arc(solid.outer)] : [arc(solid.outer), arc(solid.inner)];
  }
  const { x, y } = direction(solid.heading);
  const [sx, sy] = solid.start;
  const line = (height: number): Curve => {
    const from: XY = [sx - y * height, sy + x * height];
    return { kind: 'segment', from, to: [from[0] + x * solid.length, from[1] + y * solid.length] };
  };
  return [line(thickness), line(0)];
}

/**
 * The mold point of a bend: where its two outside faces, extended, meet; null at 180°.
 *
 * @source FAA-H-8083-31 ch. 4, terms of layout ("mold point")
 */
export function moldPoint(sector: Sector): { x: number; y: number } | null {
  const angle = Math.abs(sector.sweep);
  if (isReturnBend(angle)) return null;
  const { x, y } = direction(sector.heading);
  const thickness = sector.outer - sector.inner;
  const height = sector.sweep > 0 ? 0 : thickness;
  const back = sector.outer * halfTangent(angle);
  return { x: sector.start[0] - y * height + x * back, y: sector.start[1] + x * height + y * back };
}

function add(face: FaceElement[], curve: Curve): void {
  if (curve.kind === 'segment') {
    if (curve.from[0] !== curve.to[0] || curve.from[1] !== curve.to[1]) face.push({ line: [curve.from, curve.to] });
  } else if (curve.radius > 0) {
    const { centre, radius, from, sweep } = curve;
    face.push({ arc: { centre, radius, from, sweep } });
  }
}
