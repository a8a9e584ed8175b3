/**
 * Turns the tokens of an expression into a text of place names and signs for the parser:
 * figures, shop mixed numbers and figures with units each become one place `q0`, `q1`, …
 */
import { ANGLE_UNITS, LENGTH_UNITS } from './length';
import { angleOf, bare, lengthOf, type Quantity } from './quantity';
import { type FigureToken, type LexError, type Token } from './tokens';

/** What a place name stands for. */
export type Place = { readonly quantity: Quantity } | { readonly variable: string };

export interface Rewritten {
  readonly text: string;
  readonly places: ReadonlyMap<string, Place>;
  /** Names of variables in use, each once. */
  readonly variables: readonly string[];
}

export interface Names {
  /** Millimetres in the part's own unit. */
  readonly unit: number;
  readonly isVariable: (name: string) => boolean;
  readonly isFunction: (name: string) => boolean;
}

const BRACKETS_DEEP = 50;

/**
 * @param tokens of the whole expression @param source its text (for messages)
 * @returns the parser's text, or what is wrong and where
 */
export function rewrite(
  tokens: readonly Token[],
  source: string,
  names: Names,
): { value: Rewritten } | { error: LexError } {
  const out: string[] = [];
  const places = new Map<string, Place>();
  const variables = new Set<string>();
  /** Index in `out` where each open bracket's group begins (with its function name). */
  const open: number[] = [];
  let afterOperand = false;

  const fail = (token: Token, message: string): { error: LexError } => ({
    error: { message, start: token.start, end: token.end },
  });
  const place = (value: Place): string => {
    const name = `q${places.size}`;
    places.set(name, value);
    return name;
  };

  for (let i = 0; i < tokens.length;) {
    const token = tokens[i]!;
    if (token.kind === 'sign') {
      if (token.sign === '(') {
        if (afterOperand) return fail(token, 'Put a sign before the bracket: * to multiply.');
        if (open.length === BRACKETS_DEEP) return fail(token, `Brackets go ${BRACKETS_DEEP} deep at most.`);
        const called = i > 0 && tokens[i - 1]!.kind === 'name';
        open.push(called ? out.length - 1 : out.length);
        out.push('(');
      } else if (token.sign === ')') {
        const start = open.pop();
        if (start === undefined) return fail(token, 'This bracket closes nothing.');
        out.push(')');
        const unit = unitAt(tokens[i + 1], names);
        if (unit !== null) {
          out.splice(start, 0, '(');
          out.push('*', place({ quantity: unit(1) }), ')');
          i += 1;
        }
      } else if (token.sign === ',' && open.length === 0) {
        return fail(token, 'Use a point for decimals; a comma only parts the figures of min and max.');
      } else {
        out.push(token.sign);
      }
      afterOperand = token.sign === ')';
      i += 1;
      continue;
    }
    if (afterOperand) return fail(token, sideBySide(token, tokens, i, source, names));
    if (token.kind === 'name') {
      const bracket = tokens[i + 1];
      const called = bracket?.kind === 'sign' && bracket.sign === '(';
      if (names.isVariable(token.name)) {
        variables.add(token.name);
        out.push(place({ variable: token.name }));
        afterOperand = true;
      } else if (called && names.isFunction(token.name)) {
        out.push(token.name);
      } else {
        return fail(token, unknownName(token.name, called));
      }
      i += 1;
      continue;
    }
    const figure = figureAt(tokens, i);
    if ('ambiguous' in figure) {
      const { whole, over, under, end } = figure.ambiguous;
      const message =
        `"${source.slice(token.start, end)}" can be read two ways. Write "${whole} ${over}/${under}" for ` +
        `${whole + over / under}, or "${whole} - ${over}/${under}" for ${whole - over / under}.`;
      return { error: { message, start: token.start, end } };
    }
    let next = i + figure.count;
    // The unit behind a fraction belongs to the whole fraction: 1/8 in is an eighth of an inch.
    const fraction = figure.count === 1 ? fractionAt(tokens, i) : null;
    const fractionUnit = fraction === null ? null : unitAt(tokens[i + 3], names);
    const before = tokens[i - 1];
    if (fractionUnit !== null && before?.kind === 'sign' && before.sign === '/') {
      const end = tokens[i + 3]!.end;
      const message = `Divided by "${source.slice(token.start, end)}" can be read two ways: put brackets around what belongs together.`;
      return { error: { message, start: token.start, end } };
    }
    const unit = fractionUnit ?? unitAt(tokens[next], names);
    const value = fractionUnit === null ? figure.value : fraction!;
    if (fractionUnit !== null) next = i + 3;
    out.push(place({ quantity: unit === null ? bare(value) : unit(value) }));
    i = next + (unit === null ? 0 : 1);
    afterOperand = true;
  }
  if (open.length > 0) {
    const end = source.length;
    return { error: { message: 'A bracket is left open.', start: Math.max(0, end - 1), end } };
  }
  return { value: { text: out.join(' '), places, variables: [...variables] } };
}

type FigureAt =
  | { readonly count: number; readonly value: number }
  | { readonly ambiguous: { whole: number; over: number; under: number; end: number } };

/** A figure or mixed number at `i`; `1 1/8` is one figure, `1-1/8` can be read two ways. */
function figureAt(tokens: readonly Token[], i: number): FigureAt {
  const first = tokens[i] as FigureToken;
  if (first.integer) {
    const spaced = properFraction(tokens, i + 1);
    if (spaced !== null && spaced.start > first.end) {
      return { count: 4, value: first.value + spaced.over / spaced.under };
    }
    const dash = tokens[i + 1];
    const dashed = properFraction(tokens, i + 2);
    const before = tokens[i - 1];
    const underneath = before?.kind === 'sign' && before.sign === '/';
    if (dash?.kind === 'sign' && dash.sign === '-' && dashed !== null && !underneath) {
      const tight = dash.start === first.end && dashed.start === dash.end;
      if (tight) return { ambiguous: { whole: first.value, over: dashed.over, under: dashed.under, end: dashed.end } };
    }
  }
  return { count: 1, value: first.value };
}

/** `n/d` at `i`, whole numbers written together with n < d. */
function properFraction(
  tokens: readonly Token[],
  i: number,
): { over: number; under: number; start: number; end: number } | null {
  const [over, sign, under] = [tokens[i], tokens[i + 1], tokens[i + 2]];
  if (over?.kind !== 'figure' || under?.kind !== 'figure' || sign?.kind !== 'sign' || sign.sign !== '/') return null;
  if (!over.integer || !under.integer || over.end !== sign.start || sign.end !== under.start) return null;
  if (over.value >= under.value || over.value === 0) return null;
  return { over: over.value, under: under.value, start: over.start, end: under.end };
}

/** The value of `n/d` at `i` (whole numbers), or null. */
function fractionAt(tokens: readonly Token[], i: number): number | null {
  const [over, sign, under] = [tokens[i], tokens[i + 1], tokens[i + 2]];
  if (over?.kind !== 'figure' || under?.kind !== 'figure' || sign?.kind !== 'sign' || sign.sign !== '/') return null;
  return over.integer && under.integer && under.value !== 0 ? over.value / under.value : null;
}

/** A unit that no variable hides, as the way to make a quantity of a figure. */
function unitAt(token: Token | undefined, names: Names): ((value: number) => Quantity) | null {
  if (token?.kind !== 'name' || names.isVariable(token.name)) return null;
  const length = LENGTH_UNITS.get(token.name);
  if (length !== undefined) return (value) => lengthOf(convert(value, length, names.unit));
  const angle = ANGLE_UNITS.get(token.name);
  return angle === undefined ? null : (value) => angleOf(value * angle);
}

/** Divides last, so that 25.4 mm is exactly 1 in. */
function convert(value: number, from: number, to: number): number {
  return from === to ? value : (value * from) / to;
}

function unknownName(name: string, called: boolean): string {
  if (called) return `There is no function "${name}" here.`;
  if (LENGTH_UNITS.has(name) || ANGLE_UNITS.has(name)) return `The unit "${name}" needs a figure before it.`;
  return `"${name}" is not a figure, and no variable has that name.`;
}

function sideBySide(token: Token, tokens: readonly Token[], i: number, source: string, names: Names): string {
  const before = tokens[i - 1]!;
  if (token.kind === 'name' && unitAt(token, names) !== null) {
    return `A unit stands behind a figure or a bracket, once: "${token.name}" can't stand here.`;
  }
  if (token.kind === 'name' && !names.isVariable(token.name) && !names.isFunction(token.name)) {
    return `"${token.name}" is not a unit and not a sign.`;
  }
  return `"${source.slice(before.start, before.end)}" and "${source.slice(token.start, token.end)}" stand side by side: put a sign between them.`;
}
