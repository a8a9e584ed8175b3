import type { PartDocument } from '../../shared/part/document';
import type { Solved } from '../../shared/result';
import { solve } from '../../shared/solve';
import { bendName, materialWords, partAllowanceWords } from './part-words';

const DOCUMENT: PartDocument = {
  format: 'leafwright/1',
  unit: 'in',
  thickness: 0.04,
  allowance: { method: 'handbook' },
  chain: [
    { leg: 2, name: 'Foot' },
    { bend: 60, turn: 'up', radius: 0.125 },
    { leg: 2 },
    { bend: 90, turn: 'down', radius: 0.125, name: 'Heel', allowance: { method: 'k-factor', k: 0.4 } },
    { leg: 2 },
    { joggle: 0.04, run: 0.3, turn: 'up', radius: 0.06 },
    { leg: 2 },
  ],
};

function solved(): Solved {
  const result = solve(DOCUMENT);
  if (!result.ok) throw new Error(JSON.stringify(result.errors));
  return result;
}

describe('the words of a paper', () => {
  const result = solved();

  it('name a bend by its own name, by the legs beside it, or by its joggle', () => {
    expect(result.bends.map((bend) => bendName(bend, result))).toEqual([
      'Foot to Leg 2',
      'Heel',
      'joggle, first bend',
      'joggle, second bend',
    ]);
  });

  it('name the material, or say that nobody did', () => {
    expect(materialWords(undefined)).toBe('not stated');
    expect(materialWords('2024-T3')).toBe('2024-T3');
    expect(materialWords({ name: 'Shop stock' })).toBe('Shop stock');
  });

  it('say by which rule the allowances were found, and which lines go by another', () => {
    const words = partAllowanceWords(DOCUMENT, result);
    expect(words).toContain('L2 by K-factor.');
    expect(words).toContain('FAA-H-8083-31 ch. 4');
  });
});
