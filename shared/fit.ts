/** Holds a size of the part and lets one figure take it. */
import type { ChainEntry, Expression, PartDocument } from './part/document';
import type { Solved } from './result';
import { solve } from './solve';

/** The size that is held. */
export type Held =
  | { readonly figure: 'blank-length' }
  | { readonly figure: 'envelope-width' }
  | { readonly figure: 'envelope-height' }
  /** Outside height over a leg and the next one parallel to it. */
  | { readonly figure: 'height'; readonly leg: number };

/** The figure that gives way: a field of the chain (`leg`, `bend`, `radius`, `run` or `joggle`) or a variable. */
export type Giving =
  | { readonly chain: number; readonly field: 'leg' | 'bend' | 'radius' | 'run' | 'joggle' }
  | { readonly variable: string };

export type Fit =
  | {
      readonly ok: true;
      readonly document: PartDocument;
      /** What the giving figure came to. */
      readonly value: number;
      /** Held size as it came out, less the size wanted. */
      readonly residual: number;
      /** Whether one straight line gave it, without a search. */
      readonly exact: boolean;
    }
  | { readonly ok: false; readonly message: string };

/** Of the size wanted: a fit nearer than this is one. */
const CLOSE = 1e-12;
const FOUND = 1e-9;
const MOST_STEPS = 200;

/**
 * Exact where the size grows in a straight line with the figure (every leg into the blank length, say); else a bracketed root.
 *
 * @param document the part @param held which size @param size wanted, in the part's unit, > 0 @param giving what may change
 * @param shop the shop context
 * @returns the changed document, the figure and the residual; or why it can't be done
 * @source secant, then bisection inside a bracket found around the figure as it stands
 */
export function fitTo(document: PartDocument, held: Held, size: number, giving: Giving, shop?: unknown): Fit {
  if (!(size > 0) || !Number.isFinite(size)) return cannot('The size to hold must be above 0.');
  const start = figureOf(document, giving, shop);
  if (start === null) return cannot('There is no such figure in this part.');
  const miss = (figure: number): number | null => {
    const result = solve(given(document, giving, figure), shop);
    const found = result.ok ? sizeOf(result, held) : null;
    return found === null ? null : found - size;
  };
  const finish = (figure: number, exact: boolean): Fit | null => {
    const residual = miss(figure);
    if (residual === null || Math.abs(residual) > FOUND * size) return null;
    return { ok: true, document: given(document, giving, figure), value: figure, residual, exact };
  };
  const here = miss(start);
  if (here === null) return cannot('The part has no such size as it stands: mend its stops first.');
  const step = Math.max(Math.abs(start), size) * 1e-3;
  const ahead = miss(start + step);
  if (ahead !== null && ahead !== here) {
    const straight = start - (here * step) / (ahead - here);
    const residual = miss(straight);
    if (residual !== null && Math.abs(residual) <= CLOSE * size) return finish(straight, true)!;
  }
  const bracket = bracketed(miss, start, here, step);
  if (bracket === null)
    return cannot(
      "No figure for it gives that size: it stays on one side of it, or the part can't be made on the way.",
    );
  return finish(bisected(miss, bracket), false) ?? cannot('The size jumps past the one wanted: nothing gives it.');
}

const cannot = (message: string): Fit => ({ ok: false, message });

function sizeOf(solved: Solved, held: Held): number | null {
  const { formed } = solved;
  switch (held.figure) {
    case 'blank-length':
      return solved.developedLength;
    case 'envelope-width':
      return formed?.envelope?.width ?? null;
    case 'envelope-height':
      return formed?.envelope?.height ?? null;
    case 'height':
      return formed?.heights.find(({ legs }) => legs[0] === held.leg)?.height ?? null;
  }
}

/** The figure as it stands, from the result where it was an expression. */
function figureOf(document: PartDocument, giving: Giving, shop: unknown): number | null {
  if ('variable' in giving) {
    const { variables = {} } = document;
    if (!Object.hasOwn(variables, giving.variable)) return null;
    return numeric(variables[giving.variable]!) ?? 1;
  }
  const { chain, field } = giving;
  const entry = document.chain[chain] as Readonly<Record<string, unknown>> | undefined;
  if (entry === undefined || !Object.hasOwn(entry, field)) return null;
  const result = solve(document, shop);
  if (!result.ok) return null;
  const bend = result.bends.find((candidate) => candidate.chain === chain);
  const joggle = result.joggles.find((candidate) => candidate.chain === chain);
  const leg = result.legs.find((candidate) => candidate.chain === chain);
  const figures = {
    leg: leg?.dimension,
    bend: bend?.angle,
    radius: bend?.radius,
    run: joggle?.run,
    joggle: joggle?.offset,
  };
  return figures[field] ?? null;
}

const numeric = (expression: Expression): number | null => {
  const value = Number(expression);
  return Number.isFinite(value) ? value : null;
};

function given(document: PartDocument, giving: Giving, figure: number): PartDocument {
  if ('variable' in giving) return { ...document, variables: { ...document.variables, [giving.variable]: figure } };
  const chain = document.chain.map((entry, i) =>
    i === giving.chain ? ({ ...entry, [giving.field]: figure } as ChainEntry) : entry,
  );
  return { ...document, chain };
}

type Miss = (figure: number) => number | null;

/** Two figures between which the miss changes its sign, searched outward from where the part stands. */
function bracketed(miss: Miss, start: number, here: number, step: number): readonly [number, number] | null {
  if (here === 0) return [start, start];
  for (const sign of [1, -1]) {
    let last = start;
    for (let reach = step; reach < 1e6 * step; reach *= 1.5) {
      const figure = start + sign * reach;
      const found = miss(figure);
      if (found === null) break;
      if (Math.sign(found) !== Math.sign(here)) return [last, figure];
      last = figure;
    }
  }
  return null;
}

function bisected(miss: Miss, [from, to]: readonly [number, number]): number {
  let [low, high] = [from, to];
  const side = Math.sign(miss(low) ?? 0);
  if (side === 0) return low;
  for (let i = 0; i < MOST_STEPS; i += 1) {
    const middle = (low + high) / 2;
    if (middle === low || middle === high) break;
    const found = miss(middle);
    if (found === null || found === 0) return middle;
    if (Math.sign(found) === side) low = middle;
    else high = middle;
  }
  return high;
}
