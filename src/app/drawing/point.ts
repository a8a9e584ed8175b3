/** Places on the drawing, in pixels with y down, unless a name says "model" (the part's unit, y up). */
export interface Point {
  readonly x: number;
  readonly y: number;
}

export interface Segment {
  readonly from: Point;
  readonly to: Point;
}

export const along = (from: Point, direction: Point, distance: number): Point => ({
  x: from.x + direction.x * distance,
  y: from.y + direction.y * distance,
});

export const middle = (a: Point, b: Point): Point => ({ x: (a.x + b.x) / 2, y: (a.y + b.y) / 2 });

export const distance = (a: Point, b: Point): number => Math.hypot(b.x - a.x, b.y - a.y);

/** Unit vector from one point to another; along x when they coincide. */
export function direction(from: Point, to: Point): Point {
  const length = distance(from, to);
  return length === 0 ? { x: 1, y: 0 } : { x: (to.x - from.x) / length, y: (to.y - from.y) / length };
}

const side = (a: Point, b: Point, p: Point): number => (b.x - a.x) * (p.y - a.y) - (b.y - a.y) * (p.x - a.x);

/** Whether two segments cross or overlap; a mere touch of ends on a line counts as crossing. */
export function cross(a: Segment, b: Segment): boolean {
  const d1 = side(b.from, b.to, a.from);
  const d2 = side(b.from, b.to, a.to);
  const d3 = side(a.from, a.to, b.from);
  const d4 = side(a.from, a.to, b.to);
  if (d1 * d2 > 0 || d3 * d4 > 0) return false;
  if (d1 !== 0 || d2 !== 0 || d3 !== 0 || d4 !== 0) return true;
  // All on one line: they overlap when their boxes do.
  const apart = (p: 'x' | 'y'): boolean =>
    Math.max(a.from[p], a.to[p]) < Math.min(b.from[p], b.to[p]) ||
    Math.max(b.from[p], b.to[p]) < Math.min(a.from[p], a.to[p]);
  return !apart('x') && !apart('y');
}
