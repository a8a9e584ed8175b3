import { codesOf, figuresOf, partOf } from '../../tests/support/plain-part';
import { STARTING_SECTIONS } from './starting-sections';

const SHEETS = [
  { unit: 'in', thickness: 0.04, radius: '1/8' },
  { unit: 'mm', thickness: 1, radius: '3' },
] as const;

function made(id: string, sizes: Record<string, string>, seat?: number) {
  const section = STARTING_SECTIONS.find((candidate) => candidate.id === id)!;
  const chain = section.make(sizes, '.1');
  return { chain, solved: figuresOf(partOf(chain, seat === undefined ? {} : { seat })) };
}

const envelopeOf = (id: string, sizes: Record<string, string>, seat: number): readonly [number, number] => {
  const { width, height } = made(id, sizes, seat).solved.formed!.envelope!;
  return [Number(width.toFixed(9)), Number(height.toFixed(9))];
};

describe('The starting sections', () => {
  for (const { id, make, sizes } of STARTING_SECTIONS) {
    for (const { unit, thickness, radius } of SHEETS) {
      it(`${id}, in ${unit}: solves with its initial sizes and has no stop`, () => {
        const initial = Object.fromEntries(sizes.map((size) => [size.key, size.initial[unit]]));
        const solved = figuresOf(partOf(make(initial, radius), { unit, thickness }));
        expect(solved.findings.filter((finding) => finding.level === 'stop')).toEqual([]);
        expect(solved.section).not.toBeNull();
        expect(solved.legs.every((leg) => leg.name !== null)).toBeTrue();
      });
    }
  }

  it('have ids and names of their own, and a sentence each', () => {
    expect(new Set(STARTING_SECTIONS.map((section) => section.id)).size).toBe(STARTING_SECTIONS.length);
    expect(new Set(STARTING_SECTIONS.map((section) => section.name)).size).toBe(STARTING_SECTIONS.length);
    for (const { says, sizes } of STARTING_SECTIONS) {
      expect(says).toMatch(/\.$/);
      expect(new Set(sizes.map((size) => size.key)).size).toBe(sizes.length);
    }
  });

  it('lie on the leg that makes the envelope as high as the size says', () => {
    for (const id of ['channel', 'z', 'hat', 'lipped-channel']) {
      const { seat, sizes } = STARTING_SECTIONS.find((section) => section.id === id)!;
      const { solved } = made(id, Object.fromEntries(sizes.map(({ key, initial }) => [key, initial.in])), seat);
      expect(solved.formed!.envelope!.height).withContext(id).toBeCloseTo(1, 9);
    }
  });

  it('come out with the overall sizes that were asked for', () => {
    expect(envelopeOf('angle', { first: '3', second: '2' }, 0)).toEqual([3, 2]);
    expect(envelopeOf('channel', { height: '1', width: '2' }, 1)).toEqual([2, 1]);
    expect(envelopeOf('lipped-channel', { lip: '0.5', height: '1', width: '2' }, 2)).toEqual([2, 1]);
    expect(envelopeOf('j', { leg: '1.5', width: '1', return: '0.5' }, 1)).toEqual([1, 1.5]);
    // Both flanges reach to the outside of the web, which they share.
    expect(envelopeOf('z', { lower: '0.75', height: '1', upper: '0.75' }, 0)).toEqual([1.46, 1]);
    expect(envelopeOf('hat', { foot: '0.75', height: '1', crown: '1.5' }, 2)).toEqual([2 * 0.75 + 1.5 - 2 * 0.04, 1]);
  });

  it('with sloped webs: crown and feet at their corners, the height above the feet for any thickness', () => {
    for (const thickness of [0.02, 0.04, 0.1]) {
      const section = STARTING_SECTIONS.find((candidate) => candidate.id === 'sloped-hat')!;
      const chain = section.make({ foot: '0.75', height: '1', crown: '1.5', angle: '60' }, '.1');
      const { formed } = figuresOf(partOf(chain, { thickness, seat: 2 }));
      expect(formed!.envelope!.height).toBeCloseTo(1 + thickness, 12);
      const [foot, left, right] = formed!.moldPoints;
      expect(foot!.x).toBeCloseTo(0.75, 12);
      expect(right!.x - left!.x).toBeCloseTo(1.5, 12);
      expect(left!.y).toBeCloseTo(1 + thickness, 12);
    }
  });

  it('with a stepped leg: both legs outside to outside, the land past the step', () => {
    const section = STARTING_SECTIONS.find((candidate) => candidate.id === 'stepped-angle')!;
    const chain = section.make({ first: '1', second: '2', land: '.75', depth: '.04', run: '.25' }, '.1');
    const { formed, legs } = figuresOf(partOf(chain, { seat: 1 }));
    expect(formed!.envelope!.width).toBeCloseTo(2, 12);
    expect(formed!.envelope!.height).toBeCloseTo(1, 12);
    expect(legs[2]!.flat).toBe(0.75);
  });

  it('take expressions and variables as sizes', () => {
    const channel = STARTING_SECTIONS.find((section) => section.id === 'channel')!;
    const chain = channel.make({ height: 'W/2', width: ' W ' }, 'R');
    expect(chain[0]).toEqual({ leg: 'W/2', name: 'Left flange' });
    const solved = figuresOf(partOf(chain, { variables: { W: 2, R: '5/32' } }));
    expect(solved.formed!.envelope).toEqual({ width: 2, height: 1, seat: 1 });
    expect(codesOf(solved)).toEqual([]);
  });
});
