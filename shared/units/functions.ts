/** The functions that an expression may use; angles go in and come out in degrees. */
import { bare, ExpressionProblem, type Quantity, shared } from './quantity';

const DEGREE = Math.PI / 180;

type Apply = (values: readonly Quantity[]) => Quantity;

export const FUNCTIONS: ReadonlyMap<string, Apply> = new Map<string, Apply>([
  ['sqrt', one(squareRoot)],
  ['abs', one((a) => ({ ...a, value: Math.abs(a.value) }))],
  ['round', one((a) => ({ ...a, value: Math.round(a.value) }))],
  ['floor', one((a) => ({ ...a, value: Math.floor(a.value) }))],
  ['ceil', one((a) => ({ ...a, value: Math.ceil(a.value) }))],
  ['min', some(Math.min)],
  ['max', some(Math.max)],
  ['sin', one((a) => bare(sine(degrees(a))))],
  ['cos', one((a) => bare(sine(90 - degrees(a))))],
  ['tan', one(tangent)],
  ['asin', one((a) => arc(a, Math.asin))],
  ['acos', one((a) => arc(a, Math.acos))],
  ['atan', one((a) => arc(a, Math.atan))],
]);

function one(apply: (a: Quantity) => Quantity): Apply {
  return (values) => {
    const [value] = values;
    if (value === undefined || values.length !== 1) throw new ExpressionProblem('This function takes one figure.');
    return apply(value);
  };
}

function some(pick: (...values: number[]) => number): Apply {
  return (values) => {
    if (values.length === 0) throw new ExpressionProblem('This function takes one figure or more.');
    return { ...shared(values), value: pick(...values.map((quantity) => quantity.value)) };
  };
}

function squareRoot(a: Quantity): Quantity {
  if (a.value < 0) throw new ExpressionProblem('There is no square root of a figure below zero.');
  if (a.angle) throw new ExpressionProblem('There is no square root of an angle here.');
  return { value: Math.sqrt(a.value), length: a.length === null ? null : a.length / 2, angle: false };
}

function degrees(a: Quantity): number {
  if (a.length !== null) throw new ExpressionProblem('This function takes an angle, not a length.');
  return a.value;
}

/** Exact at the multiples of 90°, where shops use it most; elsewhere that of the machine. */
function sine(angle: number): number {
  const turn = ((angle % 360) + 360) % 360;
  if (turn % 180 === 0) return 0;
  if (turn === 90) return 1;
  if (turn === 270) return -1;
  return Math.sin(turn * DEGREE);
}

function tangent(a: Quantity): Quantity {
  const angle = degrees(a);
  if (Math.abs(angle % 180) === 90) throw new ExpressionProblem('There is no tangent of 90°.');
  return bare(angle % 180 === 0 ? 0 : Math.tan(angle * DEGREE));
}

function arc(a: Quantity, inverse: (ratio: number) => number): Quantity {
  if (a.length !== null || a.angle) throw new ExpressionProblem('This function takes a plain ratio.');
  const angle = inverse(a.value) / DEGREE;
  if (Number.isNaN(angle))
    throw new ExpressionProblem('There is no angle with that ratio: it must lie between -1 and 1.');
  return bare(angle);
}
