import type { PartDocument } from '../../shared/part/document';
import type { Solved } from '../../shared/result';
import { solve } from '../../shared/solve';
import { allowanceWords, bendName, betweenLegs, faceUp, partAllowanceWords, placeWords } from './part-words';

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

  it('say which face is up and the angle between the legs', () => {
    const [first, second] = result.bends;
    expect(first && [faceUp(first), betweenLegs(first)]).toEqual(['face A up', '120° between legs']);
    expect(second && faceUp(second)).toBe('face B up');
  });

  it('say where a finding sits', () => {
    expect(placeWords('chain/1', result)).toBe('L1');
    expect(placeWords('chain/0 chain/3', result)).toBe('Foot and L2');
    expect(placeWords('chain/5', result)).toBe('L3, L4');
    expect(placeWords('holes/2', result)).toBe('hole 3');
    expect(placeWords('', result)).toBe('the part');
    expect(placeWords('chain/99', result)).toBe('chain/99');
  });

  it('say by which rule the allowances were found, and which lines go by another', () => {
    const words = partAllowanceWords(DOCUMENT, result);
    expect(words).toContain('L2 by K-factor.');
    expect(words).toContain('FAA-H-8083-31 ch. 4');
    expect(allowanceWords({ method: 'rule-90', hardness: 'hard' })).toContain('0.71·T + 1.57·R');
    expect(allowanceWords({ method: 'shop', k: 0.42 })).toContain('K 0.42');
  });
});
