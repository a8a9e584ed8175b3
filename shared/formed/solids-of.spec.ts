import type { ChainEntry } from '../part/document';
import type { Solved } from '../result';
import { solve } from '../solve';
import { facesOf } from './faces';
import { solidsOf } from './solids-of';

const bend = (angle: number, turn: 'up' | 'down', radius = 0.125): ChainEntry => ({ bend: angle, turn, radius });

function solved(chain: readonly ChainEntry[]): Solved {
  const result = solve({
    format: 'leafwright/1',
    unit: 'in',
    thickness: 0.04,
    allowance: { method: 'handbook' },
    chain,
  });
  if (!result.ok) throw new Error(JSON.stringify(result.errors));
  return result;
}

const JOGGLED: readonly ChainEntry[] = [
  { leg: 1 },
  bend(90, 'up'),
  { leg: 1 },
  { joggle: 0.08, run: 0.5, turn: 'down', radius: 0.125 },
  { leg: 1.5 },
  bend(180, 'down', 0),
  { leg: 1, measure: 'outside-edge' },
];

describe('the solids of a solved part', () => {
  it('have the very faces that the engine formed', () => {
    const parts: readonly (readonly ChainEntry[])[] = [
      [{ leg: 2 }],
      [{ leg: 1 }, bend(90, 'up'), { leg: 2 }, bend(22.5, 'down'), { leg: 1 }],
      [{ leg: 1 }, bend(90, 'up', 0), { leg: 2 }],
      JOGGLED.slice(0, 5),
    ];
    for (const chain of parts) {
      const result = solved(chain);
      expect(facesOf(solidsOf(result)!, result.thickness)).toEqual(result.formed!.faces!);
    }
  });

  it('know the entry of the chain, the leg and the bend that each belongs to', () => {
    const solids = solidsOf(solved(JOGGLED.slice(0, 5)))!;
    expect(solids.map(({ chain }) => chain)).toEqual([0, 1, 2, 3, 3, 3, 4]);
    expect(solids.map((solid) => (solid.kind === 'bar' ? solid.leg : solid.bend))).toEqual([0, 0, 1, 1, null, 2, 2]);
  });

  it('are none when a leg is consumed or a joggle can not be made', () => {
    expect(solidsOf(solved([{ leg: 0.1 }, bend(90, 'up'), { leg: 1 }]))).toBeNull();
    expect(solidsOf(solved([{ leg: 1 }, { joggle: 0.4, run: 0.1, turn: 'up', radius: 0.125 }, { leg: 1 }]))).toBeNull();
  });
});
