/** "L2" beside each bend of the formed part, where there is room. */
import { lineName } from '@shared/part/words';
import type { Footprint } from './clearance';
import type { Curve } from './formed-frames';
import { onCurve } from './formed-frames';
import { type TextMark, textBox } from './marks';
import type { Point } from './point';
import { along, direction } from './point';
import type { View } from './view';

/** The middle of a bend's outer face and the way out from there. */
export function apex(curve: Curve, view: View): { tip: Point; outward: Point } {
  const outer = curve.lower.radius > curve.upper.radius ? 'lower' : 'upper';
  const tip = view.place(onCurve(curve, outer, 0.5));
  const inner = view.place(onCurve(curve, outer === 'lower' ? 'upper' : 'lower', 0.5));
  return { tip, outward: direction(inner, tip) };
}

/** Inside the bend or outside it; null when neither has room. */
export function bendName(curve: Curve, view: View, cost: (footprint: Footprint) => number): TextMark | null {
  const { tip, outward } = apex(curve, view);
  const inner = { x: -outward.x, y: -outward.y };
  const { lower, upper } = curve;
  const depth = Math.min(lower.radius, upper.radius) * view.scale;
  const places = [
    along(tip, inner, Math.abs(lower.radius - upper.radius) * view.scale + Math.min(depth, 14) + 12),
    along(tip, outward, 22),
    along(tip, inner, 40),
  ];
  for (const at of places) {
    const text = lineName(curve.bend);
    const mark: TextMark = { kind: 'text', role: 'name', text, at, anchor: 'middle', pick: curve.chain };
    if (cost({ texts: [textBox(mark)], lines: [], thin: [] }) === 0) return mark;
  }
  return null;
}
