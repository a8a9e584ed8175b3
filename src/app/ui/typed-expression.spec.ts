import { isFraction, needsReading, typedExpression } from './typed-expression';

describe('a typed expression', () => {
  it('is a figure when it reads back the same', () => {
    expect(typedExpression('1.25')).toBe(1.25);
    expect(typedExpression(' 2 ')).toBe(2);
  });

  it('stays text when it does not', () => {
    for (const text of ['0.750', '1 3/16', 'W/2', 'abc', '', '1e3']) expect(typedExpression(text)).toBe(text);
  });

  it('takes the one comma of a plain figure for its point, and no other comma', () => {
    expect(typedExpression('0,75')).toBe(0.75);
    expect(typedExpression(' ,5')).toBe('.5');
    expect(typedExpression('0,750')).toBe('0.750');
    expect(typedExpression('-1,5')).toBe(-1.5);
    expect(typedExpression('0,125')).toBe(0.125);
    expect(typedExpression('1,2345')).toBe(1.2345);
    for (const text of [
      '1,200',
      '-12,500',
      '1,234,5',
      '1,234.5',
      '1.234,5',
      '1,',
      ',',
      '1, 5',
      '1,5 + 1',
      'max(1,5)',
      '1,5 mm',
    ]) {
      expect(typedExpression(text)).toBe(text);
    }
  });

  it('is told from a fraction that is read at sight', () => {
    expect(isFraction('5/32')).toBeTrue();
    expect(isFraction('1 3/16')).toBeTrue();
    expect(isFraction('W/2')).toBeFalse();
    expect(isFraction('1/8 + 1/8')).toBeFalse();
    expect(isFraction(0.5)).toBeFalse();
  });

  it('shows what it comes to unless that is plain', () => {
    expect(needsReading('1 3/16')).toBeTrue();
    expect(needsReading('W')).toBeTrue();
    expect(needsReading('0.750')).toBeFalse();
    expect(needsReading('')).toBeFalse();
    expect(needsReading(2)).toBeFalse();
  });
});
