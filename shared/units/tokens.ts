/** Cuts an expression into figures, names and signs, so that nothing else ever reaches the parser. */

export interface FigureToken {
  readonly kind: 'figure';
  readonly value: number;
  /** Written without point or exponent. */
  readonly integer: boolean;
  readonly start: number;
  readonly end: number;
}
export interface NameToken {
  readonly kind: 'name';
  readonly name: string;
  readonly start: number;
  readonly end: number;
}
export interface SignToken {
  readonly kind: 'sign';
  readonly sign: '+' | '-' | '*' | '/' | '(' | ')' | ',';
  readonly start: number;
  readonly end: number;
}
export type Token = FigureToken | NameToken | SignToken;

export interface LexError {
  readonly message: string;
  readonly start: number;
  readonly end: number;
}

const SIGNS: ReadonlyMap<string, SignToken['sign']> = new Map([
  ['+', '+'],
  ['-', '-'],
  ['−', '-'],
  ['–', '-'],
  ['—', '-'],
  ['*', '*'],
  ['×', '*'],
  ['·', '*'],
  ['⋅', '*'],
  ['/', '/'],
  ['÷', '/'],
  ['⁄', '/'],
  ['∕', '/'],
  ['(', '('],
  [')', ')'],
  [',', ','],
]);

const FIGURE = /(?:\d+\.?\d*|\.\d+)(?:[eE][+-]?\d+)?/y;
const NAME = /[\p{L}_°][\p{L}\p{N}_]*/uy;
const SPACE = /\s+/y;

/**
 * The tokens of an expression, in order, or the first character that has no business in one.
 *
 * @param text the expression as typed
 * @returns tokens with their places (UTF-16 offsets), or an error with its place
 * @example tokenize('W/2').tokens.length // 3
 */
export function tokenize(text: string): { tokens: Token[]; error: null } | { tokens: null; error: LexError } {
  const tokens: Token[] = [];
  let at = 0;
  while (at < text.length) {
    const space = match(SPACE, text, at);
    if (space !== null) {
      at += space.length;
      continue;
    }
    const figure = match(FIGURE, text, at);
    if (figure !== null) {
      const end = at + figure.length;
      tokens.push({ kind: 'figure', value: Number(figure), integer: /^\d+$/.test(figure), start: at, end });
      at = end;
      continue;
    }
    const name = match(NAME, text, at);
    if (name !== null) {
      tokens.push({ kind: 'name', name, start: at, end: at + name.length });
      at += name.length;
      continue;
    }
    const sign = SIGNS.get(text.charAt(at));
    if (sign === undefined) {
      const shown = String.fromCodePoint(text.codePointAt(at) ?? 0);
      return {
        tokens: null,
        error: { message: `"${shown}" can't be part of a figure.`, start: at, end: at + shown.length },
      };
    }
    tokens.push({ kind: 'sign', sign, start: at, end: at + 1 });
    at += 1;
  }
  return { tokens, error: null };
}

function match(pattern: RegExp, text: string, at: number): string | null {
  pattern.lastIndex = at;
  return pattern.exec(text)?.[0] ?? null;
}
