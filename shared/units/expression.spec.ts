import { compile, evaluate, EXPRESSION_LENGTH, type Scope } from './expression';
import type { Dimension, Quantity } from './quantity';

const quantity = (value: number, length: number | null = null): Quantity => ({ value, length, angle: false });
const scope: Scope = new Map([
  ['W', quantity(2)],
  ['H', quantity(0.5)],
  ['in', quantity(7)],
  ['sqrt', quantity(3)],
  ['constructor', quantity(4)],
]);
const EMPTY: Scope = new Map();

function valueOf(
  expression: string | number,
  variables = EMPTY,
  unit: 'in' | 'mm' = 'in',
  wanted: Dimension = 'length',
) {
  const outcome = evaluate(expression, wanted, { unit, scope: variables });
  if (!outcome.ok) throw new Error(`${expression}: ${outcome.message}`);
  return outcome.value;
}

function refusal(expression: string, variables = EMPTY, wanted: Dimension = 'length') {
  const outcome = evaluate(expression, wanted, { unit: 'in', scope: variables });
  if (outcome.ok) throw new Error(`${expression} gave ${outcome.value}`);
  return { message: outcome.message, place: expression.slice(outcome.start, outcome.end) };
}

describe('An expression', () => {
  it('computes with the usual order, brackets and signs', () => {
    expect(valueOf('1 + 2 * 3')).toBe(7);
    expect(valueOf('(1 + 2) * 3')).toBe(9);
    expect(valueOf('8 / 2 / 2')).toBe(2);
    expect(valueOf('-(2 - 5)')).toBe(3);
    expect(valueOf('--2')).toBe(2);
    expect(valueOf('2 * -3')).toBe(-6);
    expect(valueOf(0.25)).toBe(0.25);
    expect(valueOf(' .5 ')).toBe(0.5);
    expect(valueOf('1.')).toBe(1);
    expect(valueOf('2e-3')).toBe(0.002);
  });

  it('takes the typographic signs', () => {
    expect(valueOf('3 × 2')).toBe(6);
    expect(valueOf('3 · 2')).toBe(6);
    expect(valueOf('3 ÷ 2')).toBe(1.5);
    expect(valueOf('3 − 2')).toBe(1);
    expect(valueOf('3 – 2')).toBe(1);
    expect(valueOf('1⁄8')).toBe(0.125);
    expect(valueOf('1 1∕8')).toBe(1.125);
  });

  it('binds a shop mixed number tighter than any sign', () => {
    expect(valueOf('1 1/8')).toBe(1.125);
    expect(valueOf('2 * 1 1/8')).toBe(2.25);
    expect(valueOf('9 / 1 1/8')).toBe(8);
    expect(valueOf('-1 1/8')).toBe(-1.125);
    expect(valueOf('1 1/8 + 2 3/4')).toBe(3.875);
    expect(valueOf('1 1/8 - 1/16')).toBe(1.0625);
    expect(valueOf('1 1/8 / 2')).toBe(0.5625);
    expect(valueOf('11/8')).toBe(1.375);
  });

  it('is no mixed number where the fraction is not proper or not in one piece', () => {
    for (const text of ['1 8/8', '1 9/8', '1 0/8', '1 1 /8', '1 1/ 8', '1 1.5/8', '1.5 1/8', '1 1 1/8', '1 1/0']) {
      expect(() => valueOf(text))
        .withContext(text)
        .toThrowError(/side by side/);
    }
  });

  it('refuses an integer, a tight dash and a proper fraction, and offers both readings', () => {
    const { message, place } = refusal('2-3/16');
    expect(message).toContain('"2 3/16" for 2.1875');
    expect(message).toContain('"2 - 3/16" for 1.8125');
    expect(place).toBe('2-3/16');
    expect(refusal('W*2-3/16', scope).place).toBe('2-3/16');
    expect(refusal('1 + 2–3/16').place).toBe('2–3/16');
    expect(refusal('2−3/16').place).toBe('2−3/16');
  });

  it('is a subtraction with a space, after a name, a decimal, a bracket, a fraction or before no proper fraction', () => {
    expect(valueOf('2 - 3/16')).toBe(1.8125);
    expect(valueOf('2 -3/16')).toBe(1.8125);
    expect(valueOf('2- 3/16')).toBe(1.8125);
    expect(valueOf('W-3/16', scope)).toBe(1.8125);
    expect(valueOf('2.0-3/16')).toBe(1.8125);
    expect(valueOf('(2)-3/16')).toBe(1.8125);
    expect(valueOf('1/2-3/16')).toBe(0.3125);
    expect(valueOf('2 1/2-3/16')).toBe(2.3125);
    expect(valueOf('2-17/16')).toBe(0.9375);
    expect(valueOf('2-3')).toBe(-1);
    expect(valueOf('2 in-3/16')).toBe(1.8125);
  });

  it('lets a variable win over a unit, a function and a member of every object', () => {
    expect(valueOf('in', scope)).toBe(7);
    expect(valueOf('sqrt + 1', scope)).toBe(4);
    expect(valueOf('constructor', scope)).toBe(4);
    expect(refusal('3 in', scope).message).toContain('side by side');
    expect(refusal('sqrt(4)', scope).message).toContain('Put a sign before the bracket');
    expect(valueOf('sqrt(4)')).toBe(2);
  });

  it('knows no name but its variables: not of objects, libraries or constants', () => {
    const names = [
      'toString',
      '__proto__',
      'hasOwnProperty',
      'pi',
      'e',
      'i',
      'Infinity',
      'NaN',
      'true',
      'null',
      'w',
      'kg',
    ];
    for (const name of [...names, 'constructor']) {
      expect(refusal(name).message).withContext(name).toContain('no variable has that name');
      expect(refusal(`1 + ${name}`).place)
        .withContext(name)
        .toBe(name);
    }
    for (const call of ['eval(1)', 'import(1)', 'toString()', 'pow(2, 3)']) {
      expect(refusal(call).message).withContext(call).toContain('There is no function');
    }
    for (const text of [
      'a = 1',
      '[1]',
      '1; 2',
      '2^3',
      '5!',
      '"a"',
      '50%',
      'a.b',
      '1:2',
      '½',
      '1 < 2',
      'f(x) = 1',
      '{}',
      '1\u0000',
    ]) {
      expect(() => valueOf(text, scope))
        .withContext(text)
        .toThrow();
    }
  });

  it('says what is wrong, and where', () => {
    expect(refusal('').message).toBe('Give a figure.');
    expect(refusal('   ').message).toBe('Give a figure.');
    expect(refusal('1 + ?').place).toBe('?');
    expect(refusal('1 + 😀').place).toBe('😀');
    expect(refusal('2 3')).toEqual({ message: '"2" and "3" stand side by side: put a sign between them.', place: '3' });
    expect(refusal('2 (3)')).toEqual({ message: 'Put a sign before the bracket: * to multiply.', place: '(' });
    expect(refusal('1 + 2)')).toEqual({ message: 'This bracket closes nothing.', place: ')' });
    expect(refusal('(1 + 2').message).toBe('A bracket is left open.');
    expect(refusal('1,5')).toEqual({
      message: 'Use a point for decimals; a comma only parts the figures of min and max.',
      place: ',',
    });
    expect(refusal('mm').message).toBe('The unit "mm" needs a figure before it.');
    expect(refusal('2 furlongs').message).toBe('"furlongs" is not a unit and not a sign.');
    expect(refusal('W mm', scope).message).toBe(
      'A unit stands behind a figure or a bracket, once: "mm" can\'t stand here.',
    );
    expect(refusal('2 mm mm').place).toBe('mm');
    for (const text of ['1 +', '* 2', '1 + * 2', '()', '2**3', 'min(1,)', '(1, 2)', '1 //2']) {
      expect(refusal(text).message).withContext(text).toContain('not complete');
    }
  });

  it('divides by no zero and gives no infinite figure', () => {
    for (const text of ['1/0', '0/0', '1/(2 - 2)', '1/0 in', '5 / sin(180)']) {
      expect(refusal(text).message).withContext(text).toBe('This divides by zero.');
    }
    for (const text of ['1e999', '9'.repeat(400), '1e200 * 1e200', '-1e999']) {
      expect(refusal(text).message).withContext(text.slice(0, 20)).toBe('This gives no finite figure.');
    }
    expect(refusal('1e999 - 1e999').message).toBe('This gives no finite figure.');
  });

  it('reads 500 characters and refuses 501', () => {
    const long = `1${' '.repeat(EXPRESSION_LENGTH - 1)}`;
    expect(valueOf(long)).toBe(1);
    expect(refusal(`${long} `).message).toBe('An expression has 500 characters at most.');
    expect(valueOf(`${'-'.repeat(498)} 1`)).toBe(1);
  });

  it('goes 50 brackets deep and refuses the 51st', () => {
    const nested = (depth: number): string => `${'('.repeat(depth)}1${')'.repeat(depth)}`;
    expect(valueOf(nested(50))).toBe(1);
    const outcome = evaluate(nested(51), 'length', { unit: 'in', scope: EMPTY });
    expect(outcome).toEqual({ ok: false, message: 'Brackets go 50 deep at most.', start: 50, end: 51 });
    expect(valueOf(`${nested(50)} + ${nested(50)}`)).toBe(2);
    expect(() => valueOf(`${'sqrt('.repeat(51)}1${')'.repeat(51)}`)).toThrowError(/50 deep/);
  });

  it('names the variables that it uses, each once', () => {
    const compiled = compile('W + H * W - sqrt(4)', 'in', (name) => name === 'W' || name === 'H');
    expect(compiled.ok && compiled.value.variables).toEqual(['W', 'H']);
  });
});
