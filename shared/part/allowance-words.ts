/** Bend allowance methods in words, and on whose word each goes. */
import type { Allowance, AllowanceMethod } from './document';

export const METHOD_WORDS: Readonly<Record<AllowanceMethod, string>> = {
  handbook: 'handbook',
  'k-factor': 'K-factor',
  'din-6935': 'DIN 6935',
  'rule-90': '90° rule',
  shop: 'shop figure',
  measured: 'measured',
};

export const METHOD_SOURCES: Readonly<Record<AllowanceMethod, string>> = {
  handbook: 'FAA-H-8083-31 ch. 4',
  'k-factor': 'definition of K',
  'din-6935': 'DIN 6935',
  'rule-90': "Machinery's Handbook, bending allowances",
  shop: 'measured',
  measured: 'measured',
};

const RULE_90 = { soft: '0.55', medium: '0.64', hard: '0.71' } as const;

/**
 * How bend allowances were found, and on whose word.
 *
 * @example allowanceWords({ method: 'measured', allowance: 0.2 }) // 'Arc length 0.2 stated for the bend. Source: measured'
 */
export function allowanceWords(allowance: Allowance): string {
  return `${ruleOf(allowance)}. Source: ${METHOD_SOURCES[allowance.method]}`;
}

function ruleOf(allowance: Allowance): string {
  switch (allowance.method) {
    case 'k-factor':
      return `K-factor ${allowance.k} as given by the designer: BA = A in radians · (R + K·T)`;
    case 'handbook':
      return 'Handbook rule BA = (0.01743·R + 0.0078·T)·A, A in degrees';
    case 'din-6935':
      return 'K from R/T: half of 0.65 + 0.5·log10(R/T), 0.5 beyond R/T 5';
    case 'rule-90':
      return `90° rule, ${allowance.hardness} metal: ${RULE_90[allowance.hardness]}·T + 1.57·R, in proportion to A/90`;
    case 'shop':
      return `Shop figure, K ${allowance.k}, from the shop's own bend coupons`;
    case 'measured':
      return `Arc length ${allowance.allowance} stated for the bend`;
  }
}
