import type { PartDocument } from '../document';
import { replaceChain, whyChainStays } from './replace-chain';

const angle: PartDocument = {
  format: 'leafwright/1',
  unit: 'in',
  thickness: 0.04,
  allowance: { method: 'handbook' },
  chain: [
    { id: 'a', leg: 1, name: 'Foot' },
    { id: 'b', bend: 90, turn: 'up', radius: 0.16 },
    { id: 'c', leg: 2, measure: 'inside' },
    { id: 'd', joggle: 0.04, run: 0.3, turn: 'up', radius: 0.1 },
    { id: 'e', leg: '1 1/8' },
  ],
};

describe('replacing the chain', () => {
  it('puts the new chain in', () => {
    expect(replaceChain(angle, [{ leg: 4 }]).chain).toEqual([{ leg: 4 }]);
  });

  it('keeps a seat that is still there and gives up one that is not', () => {
    const two = [{ leg: 1 }, { bend: 90, turn: 'up', radius: 0.1 }, { leg: 2 }] as const;
    expect(replaceChain({ ...angle, seat: 1 }, two).seat).toBe(1);
    expect('seat' in replaceChain({ ...angle, seat: 2 }, two)).toBeFalse();
  });

  it('stays when holes would land on other legs', () => {
    const holed: PartDocument = {
      ...angle,
      holes: [{ leg: 1, diameter: 0.1, from: 'start', at: 0.5, across: 1 }],
    };
    expect(whyChainStays(holed, [{ leg: 4 }])).toContain('holes');
    expect(replaceChain(holed, [{ leg: 4 }])).toBe(holed);
    expect(whyChainStays(holed, angle.chain)).toBeNull();
  });
});
