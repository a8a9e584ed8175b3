import { largestScale } from './scale';

describe('largestScale', () => {
  it('takes the largest standard scale at which a length still fits, up to the very end of the room', () => {
    expect(largestScale(20, 200).text).toBe('10:1');
    expect(largestScale(20.01, 200).text).toBe('5:1');
    expect(largestScale(100, 200).text).toBe('2:1');
    expect(largestScale(200, 200).text).toBe('1:1');
    expect(largestScale(200.01, 200).text).toBe('1:2');
    expect(largestScale(450, 200).text).toBe('1:2.5');
    expect(largestScale(1600, 200).text).toBe('1:8');
    expect(largestScale(1601, 200).text).toBe('1:10');
    expect(largestScale(4001, 200).text).toBe('1:25');
  });

  it('has a factor that its text says, and finds one for any length', () => {
    expect(largestScale(450, 200).factor).toBe(0.4);
    expect(largestScale(20, 200).factor).toBe(10);
    expect(largestScale(1e9, 200).factor * 1e9).toBeLessThanOrEqual(200);
  });
});
