/** What every check is given, and how it answers. */
import type { Layout } from '../layout/lay-out';
import type { PartFigures } from '../part/figures';
import type { Finding, HoleResult } from '../result';
import type { ShopRules } from '../shop/context';
import { significant } from '../units/format';

export interface CheckInput {
  readonly figures: PartFigures;
  readonly layout: Layout;
  /** Pairs of chain indices where the formed part meets itself; empty when it could not be formed. */
  readonly crossings: readonly (readonly [number, number])[];
  readonly holes: readonly HoleResult[];
  readonly rules: ShopRules;
}

export type Check = (input: CheckInput) => readonly Finding[];

/** A least figure in a sentence: rounded up, so that typing it back satisfies the check. @example leastShown(0.165) // '0.165' */
export function leastShown(value: number): string {
  if (value === 0) return '0';
  const unit = 10 ** (Math.floor(Math.log10(Math.abs(value))) - 4);
  return shown(Math.ceil(value / unit - 1e-9) * unit);
}

/** Figures in sentences: enough digits to act on, no more. */
export const shown = (value: number): string => significant(value);
