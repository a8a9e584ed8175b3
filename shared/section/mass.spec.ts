import { convertMass, formatMass } from './mass';

describe('A mass', () => {
  it('is converted by the pound as it is defined, and left alone in its own unit', () => {
    expect(convertMass(1, 'lb', 'kg')).toBe(0.45359237);
    expect(convertMass(0.45359237, 'kg', 'lb')).toBe(1);
    expect(convertMass(0.1, 'kg', 'kg')).toBe(0.1);
  });

  it('is read in three significant figures, however light or heavy', () => {
    expect(formatMass(0.0012144)).toBe('0.00121');
    expect(formatMass(0.00055084)).toBe('0.000551');
    expect(formatMass(0.331)).toBe('0.331');
    expect(formatMass(0.5)).toBe('0.500');
    expect(formatMass(12.344)).toBe('12.3');
    expect(formatMass(123.4)).toBe('123');
    expect(formatMass(1234)).toBe('1230');
  });

  it('keeps three figures where rounding adds one before the point', () => {
    expect(formatMass(9.994)).toBe('9.99');
    expect(formatMass(9.996)).toBe('10.0');
    expect(formatMass(0.09996)).toBe('0.100');
    expect(formatMass(999.6)).toBe('1000');
  });

  it('is 0 when it is nothing', () => {
    expect(formatMass(0)).toBe('0');
  });
});
