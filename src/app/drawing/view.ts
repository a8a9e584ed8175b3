import { direction } from '@shared/geometry/direction';
import type { Box } from './box';
import type { Point } from './point';

/** From the model (part's unit, y up) to the paper (pixels, y down). */
export interface View {
  readonly scale: number;
  readonly place: (model: Point) => Point;
}

/** Turns the model so that the heading `level` (degrees) lies along +x, and fits it into the room, centred. */
export function fitView(model: readonly Point[], level: number, room: Box): View {
  const { x: cos, y: sin } = direction(level);
  const turned = ({ x, y }: Point): Point => ({ x: x * cos + y * sin, y: y * cos - x * sin });
  const points = model.map(turned);
  const xs = points.map((p) => p.x);
  const ys = points.map((p) => p.y);
  const [left, right, bottom, top] = [Math.min(...xs), Math.max(...xs), Math.min(...ys), Math.max(...ys)];
  const width = Math.max(right - left, 1e-9);
  const height = Math.max(top - bottom, 1e-9);
  const scale = Math.min((room.right - room.left) / width, (room.bottom - room.top) / height);
  const centreX = (room.left + room.right) / 2;
  const centreY = (room.top + room.bottom) / 2;
  return {
    scale,
    place: (point) => {
      const { x, y } = turned(point);
      return { x: centreX + (x - (left + right) / 2) * scale, y: centreY - (y - (bottom + top) / 2) * scale };
    },
  };
}
