import { shorten, text, widthOf, wrap } from './lettering';

describe('lettering', () => {
  it('measures figures as tabular: every digit as wide as every other', () => {
    expect(widthOf('111.111', 3)).toBeCloseTo(widthOf('808.080', 3), 9);
  });

  it('gives the ink of a text wherever and whichever way it stands', () => {
    const level = text('1.250', 50, 20, { size: 4, align: 'centre' });
    expect(level.box.x + level.box.width / 2).toBeCloseTo(50, 9);
    expect(level.box.y).toBeLessThan(20 - 4 * 0.69);
    const upward = text('1.250', 50, 20, { size: 4, align: 'right', upward: true });
    expect(upward.box.y).toBeCloseTo(20, 9);
    expect(upward.box.height).toBeCloseTo(level.box.width, 9);
    expect(upward.box.x + upward.box.width).toBeGreaterThanOrEqual(50);
  });

  it('leaves a text that fits and cuts one that does not with an ellipsis', () => {
    const room = widthOf('Left flange', 3);
    expect(shorten('Left flange', room, 3)).toBe('Left flange');
    const cut = shorten('Left flange', room - 0.01, 3);
    expect(cut).toMatch(/^Left.*…$/u);
    expect(widthOf(cut, 3)).toBeLessThan(room);
  });

  it('wraps at spaces, cuts words longer than a line, and says … when lines are left over', () => {
    expect(wrap('', 20, 3)).toEqual([]);
    expect(wrap('one two', 200, 3)).toEqual(['one two']);
    for (const part of wrap('X'.repeat(100), 20, 3)) expect(widthOf(part, 3)).toBeLessThanOrEqual(20);
    const lines = wrap('the quick brown fox jumps over the lazy dog', 20, 3, 2);
    expect(lines.length).toBe(2);
    expect(lines[1]).toMatch(/…$/u);
  });
});
