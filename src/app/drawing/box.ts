import type { Point, Segment } from './point';
import { cross } from './point';

/** An upright rectangle: what a text takes up, or the paper itself. */
export interface Box {
  readonly left: number;
  readonly top: number;
  readonly right: number;
  readonly bottom: number;
}

export const boxAround = (centre: Point, width: number, height: number): Box => ({
  left: centre.x - width / 2,
  top: centre.y - height / 2,
  right: centre.x + width / 2,
  bottom: centre.y + height / 2,
});

export const overlaps = (a: Box, b: Box): boolean =>
  a.left < b.right && b.left < a.right && a.top < b.bottom && b.top < a.bottom;

export const grown = (box: Box, by: number): Box => ({
  left: box.left - by,
  top: box.top - by,
  right: box.right + by,
  bottom: box.bottom + by,
});

export const contains = (outer: Box, inner: Box): boolean =>
  inner.left >= outer.left && inner.top >= outer.top && inner.right <= outer.right && inner.bottom <= outer.bottom;

const holds = (box: Box, p: Point): boolean => p.x > box.left && p.x < box.right && p.y > box.top && p.y < box.bottom;

/** Whether a line runs into a box, through it, or lies in it. */
export function hits(box: Box, segment: Segment): boolean {
  const { from, to } = segment;
  if (Math.max(from.x, to.x) < box.left || Math.min(from.x, to.x) > box.right) return false;
  if (Math.max(from.y, to.y) < box.top || Math.min(from.y, to.y) > box.bottom) return false;
  if (holds(box, from) || holds(box, to)) return true;
  const diagonals: Segment[] = [
    { from: { x: box.left, y: box.top }, to: { x: box.right, y: box.bottom } },
    { from: { x: box.right, y: box.top }, to: { x: box.left, y: box.bottom } },
  ];
  return diagonals.some((diagonal) => cross(diagonal, segment));
}

export function boundsOf(points: readonly Point[]): Box {
  const xs = points.map((p) => p.x);
  const ys = points.map((p) => p.y);
  return { left: Math.min(...xs), top: Math.min(...ys), right: Math.max(...xs), bottom: Math.max(...ys) };
}
