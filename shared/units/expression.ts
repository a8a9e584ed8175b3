/** Expressions: what a person may type where a figure is wanted. Arithmetic only; nothing here can call or assign. */
import { create, type FactoryFunctionMap, type MathNode, parseDependencies } from 'mathjs/number';
import type { Expression, Unit } from '../part/document';
import { FUNCTIONS } from './functions';
import { MM_PER_INCH } from './length';
import { bare, type Dimension, ExpressionProblem, figureFor, product, type Quantity, quotient, sum } from './quantity';
import { type Place, rewrite } from './rewrite';
import { type LexError, tokenize } from './tokens';

/** Longest expression that is read at all. */
export const EXPRESSION_LENGTH = 500;

const { parse } = create(parseDependencies as FactoryFunctionMap, {});

/** The values that names stand for; a variable wins over a unit or function of the same name. */
export type Scope = ReadonlyMap<string, Quantity>;

export interface Context {
  readonly unit: Unit;
  readonly scope: Scope;
}

export type Evaluated<T> = { readonly ok: true; readonly value: T } | ({ readonly ok: false } & LexError);

/** An expression that is known to be well formed, ready to be given its variables. */
export interface Compiled {
  readonly variables: readonly string[];
  readonly evaluate: (scope: Scope) => Evaluated<Quantity>;
}

/**
 * Reads an expression without computing it.
 *
 * @param expression a finite number or a text of at most 500 characters
 * @param unit the part's unit, in which bare figures are @param isVariable which names are variables
 * @returns the compiled expression, or what is wrong with its place in the text
 */
export function compile(
  expression: Expression,
  unit: Unit,
  isVariable: (name: string) => boolean,
): Evaluated<Compiled> {
  if (typeof expression === 'number') return done(constant(bare(expression)));
  const whole = { start: 0, end: expression.length };
  if (expression.length > EXPRESSION_LENGTH) {
    return { ok: false, message: `An expression has ${EXPRESSION_LENGTH} characters at most.`, ...whole };
  }
  if (/^\s*\d+(?:\.\d+)?\s*$/.test(expression)) return done(constant(bare(Number(expression))));
  const { tokens, error } = tokenize(expression);
  if (error !== null) return { ok: false, ...error };
  if (tokens.length === 0) return { ok: false, message: 'Give a figure.', ...whole };
  const names = {
    unit: unit === 'in' ? MM_PER_INCH : 1,
    isVariable,
    isFunction: (name: string) => FUNCTIONS.has(name),
  };
  const rewritten = rewrite(tokens, expression, names);
  if ('error' in rewritten) return { ok: false, ...rewritten.error };
  const { text, places, variables } = rewritten.value;
  let tree: MathNode;
  try {
    tree = parse(text);
  } catch {
    return { ok: false, message: 'This is not complete: a figure or a sign is missing.', ...whole };
  }
  const evaluate = (scope: Scope): Evaluated<Quantity> => {
    try {
      return { ok: true, value: walk(tree, places, scope) };
    } catch (problem) {
      if (problem instanceof ExpressionProblem) return { ok: false, message: problem.message, ...whole };
      throw problem;
    }
  };
  return done({ variables, evaluate });
}

/**
 * The figure of an expression.
 *
 * @param expression number or text @param wanted what the figure is to be: a bare figure serves as any of them
 * @param context the part's unit and its variables
 * @returns the value (length: in the part's unit; angle: degrees), or what is wrong and where
 * @example evaluate('1 1/8', 'length', { unit: 'in', scope: new Map() }) // { ok: true, value: 1.125 }
 */
export function evaluate(expression: Expression, wanted: Dimension, context: Context): Evaluated<number> {
  // A bare figure serves as any dimension; most fields of most documents are one.
  if (typeof expression === 'number' && Number.isFinite(expression)) return { ok: true, value: expression };
  const compiled = compile(expression, context.unit, (name) => context.scope.has(name));
  if (!compiled.ok) return compiled;
  return settle(compiled.value.evaluate(context.scope), wanted, expression);
}

/** A quantity as the plain figure that is wanted. */
export function settle(quantity: Evaluated<Quantity>, wanted: Dimension, expression: Expression): Evaluated<number> {
  if (!quantity.ok) return quantity;
  try {
    return { ok: true, value: figureFor(wanted, quantity.value) };
  } catch (problem) {
    if (!(problem instanceof ExpressionProblem)) throw problem;
    return { ok: false, message: problem.message, start: 0, end: String(expression).length };
  }
}

const done = <T>(value: T): Evaluated<T> => ({ ok: true, value });
const constant = (quantity: Quantity): Compiled => ({ variables: [], evaluate: () => done(quantity) });

/** The parser's nodes that this language has; its types leave them open. */
interface Node {
  readonly type: string;
  readonly fn?: string | { readonly name: string };
  readonly name?: string;
  readonly args?: readonly Node[];
  readonly content?: Node;
}

function walk(node: Node, places: ReadonlyMap<string, Place>, scope: Scope): Quantity {
  switch (node.type) {
    case 'ParenthesisNode':
      return walk(node.content!, places, scope);
    case 'SymbolNode':
      return resolve(node.name!, places, scope);
    case 'FunctionNode': {
      const apply = FUNCTIONS.get((node.fn as { name: string }).name);
      if (apply === undefined) throw new ExpressionProblem('There is no such function here.');
      return apply(node.args!.map((arg) => walk(arg, places, scope)));
    }
    case 'OperatorNode': {
      const [a, b] = node.args!.map((arg) => walk(arg, places, scope));
      return operate(node.fn as string, a!, b);
    }
    default:
      throw new ExpressionProblem('This is not complete: a figure or a sign is missing.');
  }
}

function operate(operator: string, a: Quantity, b: Quantity | undefined): Quantity {
  if (b === undefined) return operator === 'unaryMinus' ? { ...a, value: -a.value } : a;
  switch (operator) {
    case 'add':
      return sum(a, b, 1);
    case 'subtract':
      return sum(a, b, -1);
    case 'multiply':
      return product(a, b);
    default:
      return quotient(a, b);
  }
}

function resolve(name: string, places: ReadonlyMap<string, Place>, scope: Scope): Quantity {
  const place = places.get(name);
  if (place === undefined) throw new ExpressionProblem('This is not complete: a figure or a sign is missing.');
  if ('quantity' in place) return place.quantity;
  const quantity = scope.get(place.variable);
  if (quantity === undefined) throw new ExpressionProblem(`The variable "${place.variable}" has no value.`);
  return quantity;
}
