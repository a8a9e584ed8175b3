import { cross } from './point';
import { planDimension } from './dimension';

const plan = (length: number, figure: 'between' | 'past-start' | 'past-end', upright = false) => {
  const to = upright ? { x: 100, y: 100 + length } : { x: 100 + length, y: 100 };
  const outward = upright ? { x: 1, y: 0 } : { x: 0, y: 1 };
  return planDimension({ x: 100, y: 100 }, to, outward, 30, '1.250', figure, {});
};

describe('a dimension', () => {
  it('breaks its line for the figure, and the figure stays clear of it', () => {
    const between = plan(200, 'between')!;
    const [text] = between.footprint.texts;
    const [left, right] = between.footprint.lines;
    expect(left!.to.x).toBeLessThan(text!.left);
    expect(right!.from.x).toBeGreaterThan(text!.right);
  });

  it('keeps the figure upright on an upright line, with a small gap', () => {
    const between = plan(60, 'between', true)!;
    expect(between.footprint.lines[0]!.to.y).toBeLessThan(between.footprint.texts[0]!.top);
    expect(between.footprint.texts[0]!.right - between.footprint.texts[0]!.left).toBeGreaterThan(30);
  });

  it('puts the figure past the end when it does not fit between, and only then', () => {
    expect(plan(30, 'between')).toBeNull();
    expect(plan(30, 'past-end')!.footprint.texts[0]!.left).toBeGreaterThan(130);
    expect(plan(30, 'past-start')!.footprint.texts[0]!.right).toBeLessThan(100);
    expect(plan(200, 'past-end')).toBeNull();
  });

  it('leaves a gap between what is measured and its extension lines', () => {
    for (const line of plan(200, 'between')!.footprint.thin) {
      expect(line.from.y).toBeGreaterThan(105);
      expect(line.to.y).toBeGreaterThan(130);
    }
  });
});

describe('crossing lines', () => {
  const line = (x1: number, y1: number, x2: number, y2: number) => ({ from: { x: x1, y: y1 }, to: { x: x2, y: y2 } });

  it('are told from lines that pass', () => {
    expect(cross(line(0, 0, 10, 10), line(0, 10, 10, 0))).toBeTrue();
    expect(cross(line(0, 0, 10, 10), line(20, 0, 20, 10))).toBeFalse();
    expect(cross(line(0, 0, 10, 0), line(5, 0, 5, 5))).toBeTrue();
  });

  it('on one line cross when they overlap', () => {
    expect(cross(line(0, 0, 10, 0), line(5, 0, 15, 0))).toBeTrue();
    expect(cross(line(0, 0, 4, 0), line(5, 0, 15, 0))).toBeFalse();
  });
});
