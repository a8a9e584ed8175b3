import type { Solved } from '../result';
import { solve } from '../solve';
import { placesOf, placeWords } from './finding-words';

function solved(): Solved {
  const result = solve({
    format: 'leafwright/1',
    unit: 'in',
    thickness: 0.04,
    allowance: { method: 'handbook' },
    chain: [
      { leg: 2, name: 'Foot' },
      { bend: 60, turn: 'up', radius: 0.125 },
      { leg: 2 },
      { bend: 90, turn: 'down', radius: 0.125 },
      { leg: 2 },
      { joggle: 0.04, run: 0.3, turn: 'up', radius: 0.06 },
      { leg: 2 },
    ],
  });
  if (!result.ok) throw new Error(JSON.stringify(result.errors));
  return result;
}

describe('where a finding sits', () => {
  const result = solved();

  it('is said by the names that people read', () => {
    expect(placeWords(result, 'chain/1')).toBe('L1');
    expect(placeWords(result, 'chain/2')).toBe('Leg 2');
    expect(placeWords(result, 'chain/0 chain/3')).toBe('Foot and L2');
    expect(placeWords(result, 'chain/5')).toBe('L3, L4');
    expect(placeWords(result, 'holes/2')).toBe('hole 3');
  });

  it('is nowhere for the part as a whole, and a path where there is no name', () => {
    expect(placeWords(result, '')).toBe('');
    expect(placeWords(result, 'chain/99')).toBe('chain/99');
  });

  it('is known by the entries of the chain as well', () => {
    expect(placesOf('chain/1 chain/3')).toEqual([1, 3]);
    expect(placesOf('holes/2')).toEqual([]);
    expect(placesOf('')).toEqual([]);
  });

  it('begins as the message does, so that it need not be said twice', () => {
    const consumed = solve({
      format: 'leafwright/1',
      unit: 'in',
      thickness: 0.04,
      allowance: { method: 'handbook' },
      chain: [{ leg: 0.1 }, { bend: 90, turn: 'up', radius: 0.16 }, { leg: 2 }],
    }) as Solved;
    const finding = consumed.findings.find(({ code }) => code === 'leg-consumed')!;
    expect(finding.message.startsWith(`${placeWords(consumed, finding.at)} is `)).toBeTrue();
  });
});
