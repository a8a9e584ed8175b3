/** Reads one expression field after another and collects what is wrong, so that a document is refused once, with everything. */
import type { FieldError } from '../result';
import { type Context, evaluate, type Scope } from '../units/expression';
import { significant } from '../units/format';
import { convertLength } from '../units/length';
import type { Dimension } from '../units/quantity';
import type { Expression, Unit } from './document';

/** Longest length that is taken to be meant, in inches: past it somebody slipped a key. */
export const LARGEST_LENGTH_IN = 1e6;

export interface Limits {
  readonly above?: number;
  readonly least?: number;
  readonly most?: number;
  /** What it is, for the message: "The thickness". */
  readonly says: string;
}

export class FieldReader {
  readonly errors: FieldError[] = [];

  private readonly context: Context;

  constructor(
    private readonly unit: Unit,
    scope: Scope,
  ) {
    this.context = { unit, scope };
  }

  length(expression: Expression, path: string, limits: Limits): number {
    const most = limits.most ?? convertLength(LARGEST_LENGTH_IN, 'in', this.unit);
    return this.read(expression, 'length', path, limits, most, ` ${this.unit}`);
  }

  angle(expression: Expression, path: string, limits: Limits): number {
    return this.read(expression, 'angle', path, limits, limits.most, '°');
  }

  number(expression: Expression, path: string, limits: Limits): number {
    return this.read(expression, 'number', path, limits, limits.most, '');
  }

  fail(path: string, message: string): void {
    this.errors.push({ path, message });
  }

  /** NaN where the field is broken; the caller stops before it is used. */
  private read(
    expression: Expression,
    wanted: Dimension,
    path: string,
    { above, least, says }: Limits,
    most: number | undefined,
    unit: string,
  ): number {
    const outcome = evaluate(expression, wanted, this.context);
    if (!outcome.ok) {
      this.fail(path, outcome.message);
      return NaN;
    }
    const { value } = outcome;
    const broken =
      above !== undefined && !(value > above)
        ? `must be above ${above}`
        : least !== undefined && !(value >= least)
          ? `can't be below ${least}`
          : most !== undefined && !(value <= most)
            ? `can't be above ${most}`
            : null;
    if (broken === null) return value;
    this.fail(path, `${says} ${broken}${unit}; this is ${significant(value, 6)}${unit}.`);
    return NaN;
  }
}
