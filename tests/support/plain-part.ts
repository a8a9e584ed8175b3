import { solve } from '../../shared/solve';
import type { FieldError, Solved } from '../../shared/result';

/** A part document in inches, 0.040 thick, by the handbook's rule, unless `more` says otherwise. */
export function partOf(chain: readonly unknown[], more: Readonly<Record<string, unknown>> = {}): object {
  return { format: 'leafwright/1', unit: 'in', thickness: 0.04, allowance: { method: 'handbook' }, chain, ...more };
}

export const bendUp = (bend: unknown, radius: unknown): object => ({ bend, turn: 'up', radius });
export const bendDown = (bend: unknown, radius: unknown): object => ({ bend, turn: 'down', radius });

/** The figures of a document that is expected to be fine. */
export function figuresOf(document: unknown, shop?: unknown): Solved {
  const result = solve(document, shop);
  if (!result.ok) throw new Error(result.errors.map(({ path, message }) => `${path}: ${message}`).join('\n'));
  return result;
}

/** Why a document was refused; empty when it was not. */
export function refusalOf(document: unknown): readonly FieldError[] {
  const result = solve(document);
  return result.ok ? [] : result.errors;
}

/** Stops and cautions; notes, such as that no table was asked about the radius, are no defect of a plain part. */
export const codesOf = (solved: Solved): readonly string[] =>
  solved.findings.filter(({ level }) => level !== 'note').map(({ code }) => code);
