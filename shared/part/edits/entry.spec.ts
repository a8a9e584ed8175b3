import type { PartDocument } from '../document';
import { freshIds, legNumberAt, renumberLegs, replaceEntry } from './entry';

const hat: PartDocument = {
  format: 'leafwright/1',
  unit: 'in',
  thickness: 0.04,
  allowance: { method: 'handbook' },
  chain: [{ leg: 1 }, { bend: 90, turn: 'up', radius: 0.16 }, { leg: 2 }],
};

describe('an entry of the chain', () => {
  it('is replaced alone', () => {
    const edited = replaceEntry(hat, 2, () => ({ leg: 3 }));
    expect(edited.chain).toEqual([{ leg: 1 }, { bend: 90, turn: 'up', radius: 0.16 }, { leg: 3 }]);
    expect(edited.chain[0]).toBe(hat.chain[0]!);
    expect(hat.chain[2]).toEqual({ leg: 2 });
  });

  it('outside the chain leaves the document as it is', () => {
    expect(replaceEntry(hat, 3, () => ({ leg: 3 }))).toBe(hat);
    expect(replaceEntry(hat, -1, () => ({ leg: 3 }))).toBe(hat);
  });

  it('gets no id in a chain without ids and the lowest free ones in a chain with them', () => {
    expect(freshIds(hat, 2)).toEqual([undefined, undefined]);
    const named: PartDocument = {
      ...hat,
      chain: [{ id: 'e1', leg: 1 }],
      holes: [{ id: 'e3', leg: 0, diameter: 0.1, from: 'start', at: 0.5, across: 1 }],
    };
    expect(freshIds(named, 2)).toEqual(['e2', 'e4']);
  });

  it('is counted among the legs', () => {
    expect([0, 1, 2].map((index) => legNumberAt(hat, index))).toEqual([0, 1, 1]);
  });

  it('takes its holes and the seat along when its number moves', () => {
    const seated: PartDocument = {
      ...hat,
      seat: 1,
      holes: [{ leg: 0, diameter: 0.1, from: 'start', at: 0.5, across: 1 }],
    };
    const moved = renumberLegs(seated, (leg) => leg + 1);
    expect(moved.seat).toBe(2);
    expect(moved.holes?.[0]?.leg).toBe(1);
    expect('seat' in renumberLegs(hat, (leg) => leg + 1)).toBeFalse();
  });
});
