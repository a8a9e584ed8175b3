import { evaluate } from './expression';
import type { Dimension } from './quantity';

function answer(expression: string | number, wanted: Dimension = 'length', unit: 'in' | 'mm' = 'in'): number | string {
  const outcome = evaluate(expression, wanted, { unit, scope: new Map() });
  return outcome.ok ? outcome.value : outcome.message;
}

describe('Units in an expression', () => {
  it('convert into the unit of the part, to the last digit where the inch is exact', () => {
    expect(answer('25.4 mm')).toBe(1);
    expect(answer('1 in', 'length', 'mm')).toBe(25.4);
    expect(answer('2.54 cm')).toBe(1);
    expect(answer('0.0254 m')).toBe(1);
    expect(answer('1 ft')).toBeCloseTo(12, 13);
    expect(answer('1 inch + 2 inches')).toBe(3);
    expect(answer('3 mm', 'length', 'mm')).toBe(3);
  });

  it('belong to the whole fraction and the whole mixed number', () => {
    expect(answer('1/8 in', 'length', 'mm')).toBe(3.175);
    expect(answer('1 1/8 in', 'length', 'mm')).toBeCloseTo(28.575, 12);
    expect(answer('2 * 1/8 in', 'length', 'mm')).toBe(6.35);
    expect(answer('6 in / 1 1/8 in', 'number')).toBeCloseTo(16 / 3, 14);
    expect(answer('(1 + 2) in', 'length', 'mm')).toBeCloseTo(76.2, 12);
    expect(answer('max(1, 2) in', 'length', 'mm')).toBeCloseTo(50.8, 12);
  });

  it('are refused behind a fraction that is divided by: two readings', () => {
    const message = 'can be read two ways: put brackets around what belongs together.';
    expect(answer('12 in / 3/2 in', 'number')).toBe(`Divided by "3/2 in" ${message}`);
    expect(answer('12 in * 4 in / 2 / 3 in')).toBe(`Divided by "2 / 3 in" ${message}`);
    expect(answer('12 in / (3/2 in)', 'number')).toBe(8);
    expect(answer('(12 in / 3) / 2 in', 'number')).toBe(2);
    expect(answer('12 / 3/2')).toBe(2);
  });

  it('stand beside bare figures, which are in the unit of the part', () => {
    expect(answer('25.4 mm + 1')).toBe(2);
    expect(answer('1 + 1 in', 'length', 'mm')).toBe(26.4);
    expect(answer('max(1 in, 30 mm)')).toBeCloseTo(30 / 25.4, 14);
  });

  it('multiply, divide and root with their dimension', () => {
    expect(answer('2 in * 3')).toBe(6);
    expect(answer('4 in / 2 in')).toBe(2);
    expect(answer('4 in / 2 in', 'number')).toBe(2);
    expect(answer('sqrt(4 in * 1 in)')).toBe(2);
    expect(answer('2 in * 2 in / 1 in')).toBe(4);
  });

  it('are refused where they do not fit', () => {
    expect(answer('1 in * 1 in')).toBe('This gives neither a length nor an angle; a length is wanted here.');
    expect(answer('1 in + 1 in * 1 in')).toBe('This adds a length to an area.');
    expect(answer('1 in + 5 deg')).toBe('This mixes an angle with a length.');
    expect(answer('1 in * 5 deg')).toBe('This mixes an angle with a length.');
    expect(answer('5 deg / 1 in')).toBe('This mixes an angle with a length.');
    expect(answer('5 deg * 2 deg', 'angle')).toBe('An angle times an angle has no meaning here.');
    expect(answer('5 / (2 deg)', 'angle')).toBe('A figure divided by an angle has no meaning here.');
    expect(answer('90 deg')).toBe('This gives an angle; a length is wanted here.');
    expect(answer('2 in', 'angle')).toBe('This gives a length; an angle is wanted here.');
    expect(answer('2 in', 'number')).toBe('This gives a length; a plain number is wanted here.');
    expect(answer('sqrt(4 deg)')).toBe('There is no square root of an angle here.');
    expect(answer('sqrt(2 in)')).toContain('neither');
  });

  it('of angles: degrees, the sign and radians', () => {
    expect(answer('90 deg', 'angle')).toBe(90);
    expect(answer('22 1/2°', 'angle')).toBe(22.5);
    expect(answer(45, 'angle')).toBe(45);
    expect(answer('3.141592653589793 rad', 'angle')).toBe(180);
    expect(answer('180 - 45°', 'angle')).toBe(135);
    expect(answer('90° / 45°', 'number')).toBe(2);
  });
});

describe('Functions in an expression', () => {
  it('take and give degrees, exact at the quarter turns', () => {
    expect(answer('sin(30)')).toBeCloseTo(0.5, 15);
    expect(answer('sin(90)')).toBe(1);
    expect(answer('sin(180)')).toBe(0);
    expect(answer('sin(270)')).toBe(-1);
    expect(answer('sin(-90)')).toBe(-1);
    expect(answer('cos(90)')).toBe(0);
    expect(answer('cos(60 deg)')).toBeCloseTo(0.5, 15);
    expect(answer('tan(45)')).toBeCloseTo(1, 15);
    expect(answer('tan(180)')).toBe(0);
    expect(answer('atan(1)', 'angle')).toBe(45);
    expect(answer('asin(1)', 'angle')).toBe(90);
    expect(answer('acos(-1)', 'angle')).toBe(180);
  });

  it('refuse what has no answer', () => {
    expect(answer('tan(90)')).toBe('There is no tangent of 90°.');
    expect(answer('tan(-270)')).toBe('There is no tangent of 90°.');
    expect(answer('sqrt(0 - 1)')).toBe('There is no square root of a figure below zero.');
    expect(answer('sqrt(0)')).toBe(0);
    expect(answer('asin(1)')).toBe(90);
    expect(answer('asin(1.0000001)')).toContain('between -1 and 1');
    expect(answer('acos(0 - 1.0000001)')).toContain('between -1 and 1');
    expect(answer('sin(1 in)')).toBe('This function takes an angle, not a length.');
    expect(answer('atan(1 in)')).toBe('This function takes a plain ratio.');
    expect(answer('atan(1 in / 2 in)', 'angle')).toBeCloseTo(26.565, 3);
  });

  it('want their number of figures', () => {
    expect(answer('sqrt()')).toBe('This function takes one figure.');
    expect(answer('sqrt(1, 2)')).toBe('This function takes one figure.');
    expect(answer('min()')).toBe('This function takes one figure or more.');
    expect(answer('min(3)')).toBe(3);
    expect(answer('min(3, 1, 2)')).toBe(1);
    expect(answer('max(3, 1 1/8, 2)')).toBe(3);
  });

  it('round in the unit of the part', () => {
    expect(answer('round(2.5)')).toBe(3);
    expect(answer('floor(2.9)')).toBe(2);
    expect(answer('ceil(2.1)')).toBe(3);
    expect(answer('abs(1 - 3)')).toBe(2);
    expect(answer('round(25.4 mm)')).toBe(1);
  });
});
