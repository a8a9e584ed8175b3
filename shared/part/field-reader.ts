/** Reads one expression field after another and collects what is wrong, so that a document is refused once, with everything. */
import type { FieldError } from '../result';
import { evaluate, type Scope } from '../units/expression';
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

  constructor(
    private readonly unit: Unit,
    private readonly scope: Scope,
  ) {}

  length(expression: Expression, path: string, limits: Limits): number {
    const most = limits.most ?? convertLength(LARGEST_LENGTH_IN, 'in', this.unit);
    return this.read(expression, 'length', path, { ...limits, most }, ` ${this.unit}`);
  }

  angle(expression: Expression, path: string, limits: Limits): number {
    return this.read(expression, 'angle', path, limits, '°');
  }

  number(expression: Expression, path: string, limits: Limits): number {
    return this.read(expression, 'number', path, limits, '');
  }

  fail(path: string, message: string): void {
    this.errors.push({ path, message });
  }

  /** NaN where the field is broken; the caller stops before it is used. */
  private read(expression: Expression, wanted: Dimension, path: string, limits: Limits, unit: string): number {
    const outcome = evaluate(expression, wanted, { unit: this.unit, scope: this.scope });
    if (!outcome.ok) {
      this.fail(path, outcome.message);
      return NaN;
    }
    const { value } = outcome;
    const { above, least, most, says } = limits;
    const shown = `${Number(value.toPrecision(6))}${unit}`;
    if (above !== undefined && !(value > above))
      this.fail(path, `${says} must be above ${above}${unit}; this is ${shown}.`);
    else if (least !== undefined && !(value >= least))
      this.fail(path, `${says} can't be below ${least}${unit}; this is ${shown}.`);
    else if (most !== undefined && !(value <= most))
      this.fail(path, `${says} can't be above ${most}${unit}; this is ${shown}.`);
    else return value;
    return NaN;
  }
}
