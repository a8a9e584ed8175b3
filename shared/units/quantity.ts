/** A value inside an expression, with the dimension that it carries. */

export interface Quantity {
  /** In the part's unit to the power `length`; degrees when `angle`. */
  readonly value: number;
  /** Power of length, or null for a bare figure (which may stand for a length, an angle or a plain number). */
  readonly length: number | null;
  readonly angle: boolean;
}

export type Dimension = 'length' | 'angle' | 'number';

/** Thrown inside this folder only, and caught at its door: what is wrong with an expression, in words. */
export class ExpressionProblem extends Error {}

export const bare = (value: number): Quantity => ({ value, length: null, angle: false });
export const lengthOf = (value: number): Quantity => ({ value, length: 1, angle: false });
export const angleOf = (value: number): Quantity => ({ value, length: null, angle: true });

/** a + b or a − b: a bare figure takes the dimension of the other. */
export function sum(a: Quantity, b: Quantity, sign: 1 | -1): Quantity {
  const dimension = shared([a, b]);
  return { ...dimension, value: a.value + sign * b.value };
}

export function product(a: Quantity, b: Quantity): Quantity {
  refuseMixed(a, b);
  const length = a.length === null && b.length === null ? null : (a.length ?? 0) + (b.length ?? 0);
  if (a.angle && b.angle) throw new ExpressionProblem('An angle times an angle has no meaning here.');
  return { value: a.value * b.value, length: length === 0 ? null : length, angle: a.angle || b.angle };
}

export function quotient(a: Quantity, b: Quantity): Quantity {
  refuseMixed(a, b);
  if (b.value === 0) throw new ExpressionProblem('This divides by zero.');
  if (b.angle && !a.angle) throw new ExpressionProblem('A figure divided by an angle has no meaning here.');
  const length = (a.length ?? 0) - (b.length ?? 0);
  return { value: a.value / b.value, length: length === 0 ? null : length, angle: a.angle && !b.angle };
}

/** The dimension that all of them can share. */
export function shared(values: readonly Quantity[]): { length: number | null; angle: boolean } {
  let length: number | null = null;
  let angle = false;
  for (const value of values) {
    if (value.length !== null) {
      if (length !== null && length !== value.length) throw new ExpressionProblem('This adds a length to an area.');
      length = value.length;
    }
    angle ||= value.angle;
  }
  if (angle && length !== null) throw new ExpressionProblem('This mixes an angle with a length.');
  return { length, angle };
}

/** The plain figure of a quantity where a length, an angle or a number is wanted. */
export function figureFor(wanted: Dimension, quantity: Quantity): number {
  const { value, length, angle } = quantity;
  if (!Number.isFinite(value)) throw new ExpressionProblem('This gives no finite figure.');
  const isLength = length === 1;
  const isBare = length === null && !angle;
  if (isBare || (wanted === 'length' && isLength) || (wanted === 'angle' && angle)) return value;
  const given = angle ? 'an angle' : isLength ? 'a length' : 'neither a length nor an angle';
  throw new ExpressionProblem(
    `This gives ${given}; ${wanted === 'number' ? 'a plain number' : `${an(wanted)}`} is wanted here.`,
  );
}

function an(wanted: 'length' | 'angle'): string {
  return wanted === 'length' ? 'a length' : 'an angle';
}

function refuseMixed(a: Quantity, b: Quantity): void {
  if ((a.angle && b.length !== null) || (b.angle && a.length !== null)) {
    throw new ExpressionProblem('This mixes an angle with a length.');
  }
}
