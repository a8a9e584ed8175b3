import { farthestMove, spread } from './spread';

describe('spread', () => {
  it('leaves labels where they are when they are far enough apart', () => {
    expect(spread([1, 5, 9], 4, 0, 10)).toEqual([1, 5, 9]);
  });

  it('moves neighbours apart about their middle', () => {
    expect(spread([5, 5], 2, 0, 10)).toEqual([4, 6]);
    expect(spread([5, 5.5, 6], 2, 0, 10)).toEqual([3.5, 5.5, 7.5]);
  });

  it('stays inside its range, exactly full included', () => {
    expect(spread([0, 0, 0], 2, 0, 10)).toEqual([0, 2, 4]);
    expect(spread([10, 10], 3, 0, 10)).toEqual([7, 10]);
    expect(spread([5, 5, 5], 5, 0, 10)).toEqual([0, 5, 10]);
  });

  it('gives null when the labels need more than the range', () => {
    expect(spread([5, 5, 5], 5.01, 0, 10)).toBeNull();
  });

  it('takes a gap of its own for each pair of neighbours', () => {
    expect(spread([0, 0, 0], [1, 3], 0, 10)).toEqual([0, 1, 4]);
  });

  it('keeps order and distance for crowded places of any kind', () => {
    const places = Array.from({ length: 60 }, (_, index) => 50 + Math.sin(index * 0.7) * 0.01 + index * 0.02);
    places.sort((a, b) => a - b);
    const put = spread(places, 1.5, 0, 100) ?? [];
    expect(put.length).toBe(60);
    put.slice(1).forEach((at, index) => expect(at - (put[index] ?? 0)).toBeGreaterThanOrEqual(1.5 - 1e-9));
    expect(farthestMove(places, put)).toBeLessThan(46);
  });
});
