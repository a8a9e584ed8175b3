import { formatAngle, formatLength, missText, nearest64, nearest64Of } from './format';
import { convertLength } from './length';

describe('formatLength', () => {
  it('shows thousandths of an inch and hundredths of a millimetre', () => {
    expect(formatLength(0.8, 'in')).toBe('0.800');
    expect(formatLength(20.32, 'mm')).toBe('20.32');
    expect(formatLength(1, 'in', 1)).toBe('1.0');
    expect(formatLength(1.5, 'in', 0)).toBe('2');
  });

  it('rounds halves away from zero as they stand in decimal, and nothing below a half', () => {
    expect(formatLength(0.0625, 'in')).toBe('0.063');
    expect(formatLength(1.005, 'mm')).toBe('1.01');
    expect(formatLength(-0.0625, 'in')).toBe('-0.063');
    expect(formatLength(0.0624999, 'in')).toBe('0.062');
    expect(formatLength(2.6755, 'in')).toBe('2.676');
    for (let i = 0; i < 4000; i += 1) {
      const half = Number(`${i}.0005`);
      expect(formatLength(half, 'in')).withContext(String(half)).toBe(`${i}.001`);
    }
  });

  it('never shows a negative zero', () => {
    expect(formatLength(-0, 'in')).toBe('0.000');
    expect(formatLength(-0.0004, 'in')).toBe('0.000');
    expect(formatLength(-0.0005, 'in')).toBe('-0.001');
  });
});

describe('formatAngle', () => {
  it('shows two places at most and no trailing zeros', () => {
    expect(formatAngle(90)).toBe('90°');
    expect(formatAngle(22.5)).toBe('22.5°');
    expect(formatAngle(10.114)).toBe('10.11°');
    expect(formatAngle(10.115)).toBe('10.12°');
    expect(formatAngle(89.999)).toBe('90°');
    expect(formatAngle(-0.001)).toBe('0°');
    expect(formatAngle(-45)).toBe('-45°');
  });
});

describe('nearest64', () => {
  it('gives the nearest sixty-fourth in lowest terms, with its miss', () => {
    expect(nearest64(0.8)).toEqual({ text: '51/64', error: 51 / 64 - 0.8 });
    expect(nearest64(3.75).text).toBe('3 3/4');
    expect(nearest64(0.5).text).toBe('1/2');
    expect(nearest64(1).text).toBe('1');
    expect(nearest64(0)).toEqual({ text: '0', error: 0 });
    expect(nearest64(63.5 / 64).text).toBe('1');
  });

  it('takes a half away from zero', () => {
    expect(nearest64(1 / 128).text).toBe('1/64');
    expect(nearest64(0.99 / 128).text).toBe('0');
    expect(nearest64(-1 / 128).text).toBe('−1/64');
    expect(nearest64(-0.99 / 128).text).toBe('0');
    expect(nearest64(-0).text).toBe('0');
    expect(nearest64(-1.125).text).toBe('−1 1/8');
  });

  it('misses by 1/128 at most, and text and miss agree', () => {
    for (let i = -2000; i <= 2000; i += 1) {
      const length = i / 317;
      const { text, error } = nearest64(length);
      const [, minus, whole, over, under] = /^(−?)(?:(\d+)(?: |$))?(?:(\d+)\/(\d+))?$/.exec(text)!;
      const read =
        (minus === '' ? 1 : -1) * (Number(whole ?? 0) + (over === undefined ? 0 : Number(over) / Number(under)));
      if (Math.abs(error) > 1 / 128 + 1e-12 || Math.abs(read - length - error) > 1e-12) fail(`${length}: ${text}`);
    }
    expect(nearest64(1 / 3).error).toBeCloseTo(21 / 64 - 1 / 3, 15);
  });

  it('of a millimetre length goes by inches', () => {
    expect(nearest64Of(25.4, 'mm').text).toBe('1');
    expect(nearest64Of(0.5, 'in').text).toBe('1/2');
  });
});

describe('missText', () => {
  it('signs the miss by where the mark lies: before, on or beyond the true length', () => {
    expect(missText(nearest64(0.8).error)).toBe('−0.003');
    expect(missText(nearest64(0.79).error)).toBe('+0.007');
    expect(missText(nearest64(0.5).error)).toBe('±0.000');
  });

  it('has no sign for what rounds to nothing', () => {
    expect(missText(nearest64(0.5004).error)).toBe('±0.000');
    expect(missText(nearest64(0.5006).error)).toBe('−0.001');
    expect(missText(nearest64(0.4994).error)).toBe('+0.001');
  });
});

describe('convertLength', () => {
  it('is exact at the inch and leaves a length in its own unit alone', () => {
    expect(convertLength(1, 'in', 'mm')).toBe(25.4);
    expect(convertLength(25.4, 'mm', 'in')).toBe(1);
    expect(convertLength(0.1, 'in', 'in')).toBe(0.1);
    expect(convertLength(0.1, 'mm', 'mm')).toBe(0.1);
  });
});
