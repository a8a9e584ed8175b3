/** Chooses the rule that a bend names and answers with its allowance and its K. */
import type { FigureAllowance } from '../part/figures';
import { din6935Factor } from './din-6935';
import { handbookAllowance } from './handbook';
import { impliedK, kFactorAllowance } from './k-factor';
import { rule90Allowance } from './rule-90';

export interface BendAllowance {
  /** Arc length of the neutral line, in the part's unit. */
  readonly allowance: number;
  /** Used, or implied by the allowance. */
  readonly kFactor: number;
}

/**
 * @param rule which method, with its parameters @param angle A in degrees, 0 < A ≤ 180
 * @param radius R ≥ 0 (R > 0 for din-6935) @param thickness T > 0
 * @returns allowance and K-factor
 * @source by method: see its own file
 * @example bendAllowance({ method: 'handbook', path: '' }, 90, 0.16, 0.04).allowance // 0.279072
 */
export function bendAllowance(rule: FigureAllowance, angle: number, radius: number, thickness: number): BendAllowance {
  const implied = (allowance: number): BendAllowance => ({
    allowance,
    kFactor: impliedK(allowance, angle, radius, thickness),
  });
  const used = (kFactor: number): BendAllowance => ({
    allowance: kFactorAllowance(angle, radius, thickness, kFactor),
    kFactor,
  });
  switch (rule.method) {
    case 'k-factor':
    case 'shop':
      return used(rule.k!);
    case 'din-6935':
      return used(din6935Factor(radius, thickness) / 2);
    case 'handbook':
      return implied(handbookAllowance(angle, radius, thickness));
    case 'rule-90':
      return implied(rule90Allowance(angle, radius, thickness, rule.hardness!));
    case 'measured':
      return implied(rule.length!);
  }
}
