import { direction } from '../geometry/direction';
import type { FaceElement, Faces, Solved, XY } from '../result';

/**
 * The exact faces turned so that the seat leg lies level, as the envelope is measured and as people draw the part.
 *
 * @param solved result of the engine @returns faces about the same origin, or null when there is nothing to draw
 * @example seated({ formed: null, legs: [], bends: [] }) // null
 */
export function seated(solved: Pick<Solved, 'formed' | 'legs' | 'bends'>): Faces | null {
  const faces = solved.formed?.faces ?? null;
  const seat = solved.formed?.envelope?.seat;
  const leg = seat === undefined ? undefined : solved.legs[seat];
  if (faces === null || leg === undefined) return faces;
  // A joggle's two bends take each other back, so that only the bends before the leg count.
  const heading = solved.bends
    .filter((bend) => bend.chain < leg.chain)
    .reduce((sum, bend) => sum + (bend.turn === 'up' ? bend.angle : -bend.angle), 0);
  return heading === 0 ? faces : { upper: faces.upper.map(turned(-heading)), lower: faces.lower.map(turned(-heading)) };
}

function turned(degrees: number): (element: FaceElement) => FaceElement {
  const { x: cos, y: sin } = direction(degrees);
  const point = ([x, y]: XY): XY => [x * cos - y * sin, x * sin + y * cos];
  return (element) =>
    'line' in element
      ? { line: [point(element.line[0]), point(element.line[1])] }
      : { arc: { ...element.arc, centre: point(element.arc.centre), from: element.arc.from + degrees } };
}
