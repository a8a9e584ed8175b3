import { allowanceWords } from './allowance-words';

describe('a bend allowance in words', () => {
  it('says its rule, its figures and its source', () => {
    expect(allowanceWords({ method: 'handbook' })).toContain('Source: FAA-H-8083-31 ch. 4');
    expect(allowanceWords({ method: 'rule-90', hardness: 'hard' })).toContain('0.71·T + 1.57·R');
    expect(allowanceWords({ method: 'rule-90', hardness: 'soft' })).toContain("Source: Machinery's Handbook");
    expect(allowanceWords({ method: 'shop', k: 0.42 })).toContain('K 0.42');
    expect(allowanceWords({ method: 'din-6935' })).toMatch(/Source: DIN 6935$/);
    expect(allowanceWords({ method: 'measured', allowance: '1/4' })).toBe(
      'Arc length 1/4 stated for the bend. Source: measured',
    );
  });
});
