import type { Box } from './box';
import { Grid } from './grid';

const paper: Box = { left: 6, top: 6, right: 300, bottom: 200 };
const box = (left: number, top: number, right = left, bottom = top): Box => ({ left, top, right, bottom });

describe('a grid', () => {
  it('finds what touches a box, edges included, and nothing else', () => {
    const grid = new Grid<string>(paper);
    grid.add('a', box(50, 50, 60, 60));
    const at = (place: Box): boolean => grid.some(place, () => true);
    expect(at(box(60, 60, 70, 70))).toBeTrue();
    expect(at(box(60.1, 60, 70, 70))).toBeFalse();
    expect(at(box(40, 40, 50, 50))).toBeTrue();
    expect(at(box(0, 0, 300, 300))).toBeTrue();
  });

  it('looks at a thing once, over however many cells it lies', () => {
    const grid = new Grid<string>(paper);
    grid.add('wide', box(0, 20, 300, 180));
    expect(grid.count(box(0, 0, 300, 200), () => true)).toBe(1);
    expect(grid.count(box(0, 0, 300, 200), () => true)).toBe(1);
  });

  it('keeps what lies off the paper', () => {
    const grid = new Grid<string>(paper);
    grid.add('off', box(-90, 400, -80, 410));
    expect(grid.some(box(-85, 405), () => true)).toBeTrue();
    expect(grid.some(box(-70, 405), () => true)).toBeFalse();
  });

  it('finds the very same as looking at everything', () => {
    let seed = 7;
    const next = (): number => (seed = (seed * 16807) % 2147483647) / 2147483647;
    const some = (): Box => {
      const [x, y] = [next() * 360 - 30, next() * 260 - 30];
      return box(x, y, x + next() * 80, y + next() * 40);
    };
    const all = Array.from({ length: 200 }, some);
    const grid = new Grid<Box>(paper);
    for (const one of all) grid.add(one, one);
    for (let search = 0; search < 200; search++) {
      const wanted = some();
      const slow = all.filter(
        (one) =>
          one.left <= wanted.right && wanted.left <= one.right && one.top <= wanted.bottom && wanted.top <= one.bottom,
      );
      expect(grid.count(wanted, () => true)).toBe(slow.length);
    }
  });
});
