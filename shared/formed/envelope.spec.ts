import { bendDown, bendUp, figuresOf, partOf } from '../../tests/support/plain-part';
import { extent } from './envelope';

const envelopeOf = (chain: readonly unknown[], seat?: number) =>
  figuresOf(partOf(chain, seat === undefined ? {} : { seat })).formed!.envelope!;

describe('The envelope', () => {
  it('of an angle lies on its longer leg: 8 wide and 6 high', () => {
    const angle = [{ leg: 6 }, bendUp(90, 0.125), { leg: 8 }];
    expect(envelopeOf(angle)).toEqual({ width: 8, height: 6, seat: 1 });
    const first = envelopeOf(angle, 0);
    expect([first.width, first.height, first.seat]).toEqual([6, 8, 0]);
  });

  it('lies on the first of two legs with one flat, also where rounding alone tells them apart', () => {
    expect(envelopeOf([{ leg: 1 }, bendUp(90, 0.125), { leg: 1 }]).seat).toBe(0);
    expect(envelopeOf([{ leg: 1 }, bendUp(90, 0.125), { leg: 1.001 }]).seat).toBe(1);
    let cases = 0;
    for (let hundredths = 50; hundredths < 150; hundredths += 1) {
      const [flat, leg] = [hundredths / 100, (hundredths + 30) / 100];
      if (!(leg - (0.1 + 0.2) > flat)) continue;
      cases += 1;
      const chain = [{ leg: flat, measure: 'flat' }, bendUp(90, 0.2), { leg }];
      expect(figuresOf(partOf(chain, { thickness: 0.1 })).formed!.envelope!.seat)
        .withContext(String(flat))
        .toBe(0);
    }
    expect(cases).toBeGreaterThan(0);
  });

  it('takes the extremes of arcs that no end shows', () => {
    const outside = { leg: 1, measure: 'outside-edge' };
    const { width, height } = envelopeOf([outside, bendUp(180, 0.1), outside]);
    expect(width).toBeCloseTo(1, 12);
    expect(height).toBeCloseTo(2 * 0.1 + 2 * 0.04, 12);
  });

  it('is that of the seat on a slope, however the part began', () => {
    const chain = [{ leg: 1, measure: 'flat' }, bendUp(45, 0.1), { leg: 3, measure: 'flat' }];
    const level = envelopeOf(chain, 0);
    const sloped = envelopeOf(chain, 1);
    const middle = (0.1 + 0.02) * Math.sin(Math.PI / 4);
    expect(level.width).toBeGreaterThan(1 + middle + 3 * Math.SQRT1_2 - 0.04);
    expect(sloped.width).toBeGreaterThan(3);
    expect(sloped.height).toBeLessThan(level.height);
    const turned = envelopeOf([...chain].reverse(), 0);
    expect(turned.width).toBeCloseTo(sloped.width, 12);
    expect(turned.height).toBeCloseTo(sloped.height, 12);
  });

  it('of curves in a turned frame', () => {
    const quarter = { kind: 'arc', centre: [0, 0], radius: 1, from: 0, sweep: 90 } as const;
    const [x0, , x1, y1] = extent([quarter], 45);
    expect(x1).toBeCloseTo(1, 12);
    expect(x0).toBeCloseTo(Math.SQRT1_2, 12);
    expect(y1).toBeCloseTo(Math.SQRT1_2, 12);
    expect(extent([quarter])).toEqual([0, 0, 1, 1]);
  });
});

describe('Heights over parallel legs', () => {
  const heightsOf = (chain: readonly unknown[]) => figuresOf(partOf(chain)).formed!.heights;

  it('of a channel and a Z are outside to outside', () => {
    const [channel] = heightsOf([{ leg: 1 }, bendUp(90, 0.1), { leg: 2 }, bendUp(90, 0.1), { leg: 1 }]);
    expect(channel!.legs).toEqual([0, 2]);
    expect(channel!.height).toBeCloseTo(2, 12);
    const [z] = heightsOf([{ leg: 1 }, bendUp(90, 0.1), { leg: 2 }, bendDown(90, 0.1), { leg: 1 }]);
    expect(z!.height).toBeCloseTo(2, 12);
  });

  it('of a joggled leg are the depth and the thickness', () => {
    const [joggled] = heightsOf([{ leg: 1 }, { joggle: 0.06, run: 0.3, turn: 'up', radius: 0.1 }, { leg: 1 }]);
    expect(joggled!.height).toBeCloseTo(0.06 + 0.04, 12);
  });

  it('are none where no later leg is parallel', () => {
    expect(heightsOf([{ leg: 1 }, bendUp(90, 0.1), { leg: 1 }])).toEqual([]);
    expect(heightsOf([{ leg: 1 }, bendUp(45, 0.1), { leg: 1 }, bendUp(44, 0.1), { leg: 1 }])).toEqual([]);
    expect(heightsOf([{ leg: 1 }, bendUp(45, 0.1), { leg: 1 }, bendDown(45, 0.1), { leg: 1 }]).length).toBe(1);
  });
});
