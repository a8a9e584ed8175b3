import type { ChainEntry } from '../part/document';
import type { FaceElement, Solved } from '../result';
import { solve } from '../solve';
import { outlineOf } from './outline';
import { seated } from './seated';

const solved = (chain: readonly ChainEntry[]): Solved => {
  const result = solve({
    format: 'leafwright/1',
    unit: 'in',
    thickness: 0.04,
    allowance: { method: 'handbook' },
    chain,
  });
  if (!result.ok) throw new Error(result.errors[0]?.message);
  return result;
};

const bend = (turn: 'up' | 'down', angle = 90): ChainEntry => ({ bend: angle, turn, radius: 0.16 });

/** Width and height of what would be drawn. */
const drawn = (result: Solved): readonly [number, number] => {
  const [, , width, height] = outlineOf(seated(result)!)!.box;
  return [width, height];
};

const lineAt = (elements: readonly FaceElement[], index: number): readonly (readonly [number, number])[] => {
  const element = elements.filter((entry) => 'line' in entry)[index];
  return element !== undefined && 'line' in element ? element.line : [];
};

describe('seated', () => {
  it('lays the web of a channel level, so that the drawing has the size of the envelope', () => {
    const result = solved([{ leg: 1 }, bend('up'), { leg: 2 }, bend('up'), { leg: 1 }]);
    const [width, height] = drawn(result);
    expect(width).toBeCloseTo(2, 6);
    expect(height).toBeCloseTo(1, 6);
    const [from, to] = lineAt(seated(result)!.lower, 1);
    expect(from?.[1]).toBeCloseTo(to?.[1] ?? NaN, 9);
  });

  it('agrees with the envelope for every turn and for angles that are no quarter turns', () => {
    const chains: ChainEntry[][] = [
      [{ leg: 1 }, bend('down'), { leg: 3 }, bend('up', 37), { leg: 1 }],
      [{ leg: 1 }, bend('up', 120), { leg: 2 }],
      [{ leg: 1 }, { joggle: 0.1, run: 0.5, turn: 'up', radius: 0.1 }, { leg: 3 }, bend('up', 60), { leg: 1 }],
    ];
    for (const chain of chains) {
      const result = solved(chain);
      const [width, height] = drawn(result);
      expect(width).toBeCloseTo(result.formed!.envelope!.width, 6);
      expect(height).toBeCloseTo(result.formed!.envelope!.height, 6);
    }
  });

  it('leaves a part alone whose first leg is the seat', () => {
    const result = solved([{ leg: 3 }, bend('up'), { leg: 1 }]);
    expect(seated(result)).toBe(result.formed!.faces);
  });

  it('has nothing to turn when nothing is formed', () => {
    expect(seated({ formed: null, legs: [], bends: [] })).toBeNull();
  });
});
