import { bendDown, bendUp, figuresOf, partOf } from '../../tests/support/plain-part';
import { outlineOf } from './outline';

const outlineFor = (chain: readonly unknown[]) => outlineOf(figuresOf(partOf(chain)).formed!.faces!)!;

describe('The outline for a drawing', () => {
  it('of a strip is its rectangle', () => {
    expect(outlineFor([{ leg: 2 }])).toEqual({ path: 'M0 0.04L2 0.04L2 0L0 0Z', box: [0, 0, 2, 0.04] });
  });

  it('of an angle goes out along the upper face and back along the lower, arcs as arcs', () => {
    const { path, box } = outlineFor([{ leg: 1 }, bendUp(90, 0.16), { leg: 1 }]);
    expect(path).toBe('M0 0.04L0.8 0.04A0.16 0.16 0 0 1 0.96 0.2L0.96 1L1 1L1 0.2A0.2 0.2 0 0 0 0.8 0L0 0Z');
    expect(box).toEqual([0, 0, 1, 1]);
    expect(outlineFor([{ leg: 1 }, bendDown(90, 0.16), { leg: 1 }]).path).toContain('A0.2 0.2 0 0 0');
  });

  it('of a sharp bend has a corner inside', () => {
    const { path } = outlineFor([{ leg: 1 }, bendUp(90, 0), { leg: 1 }]);
    expect(path.match(/A/g)!.length).toBe(1);
    expect(path.endsWith('Z')).toBeTrue();
  });

  it('of no faces is none', () => {
    expect(outlineOf({ upper: [], lower: [] })).toBeNull();
  });
});
