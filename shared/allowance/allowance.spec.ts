import { bendUp, figuresOf, partOf } from '../../tests/support/plain-part';
import { bendAllowance } from './allowance';
import { impliedK, kFactorAllowance } from './k-factor';
import { rule90Allowance } from './rule-90';

const bendBy = (allowance: object, angle = 90, more: object = {}) =>
  figuresOf(partOf([{ leg: 5 }, { ...bendUp(angle, 0.16), ...more }, { leg: 5 }], { allowance })).bends[0]!;

describe('The allowance of a bend', () => {
  it('by a K that is given: the arc of the neutral line', () => {
    const bend = bendBy({ method: 'k-factor', k: 0.44 });
    expect(bend.allowance).toBeCloseTo((Math.PI / 2) * (0.16 + 0.44 * 0.04), 14);
    expect(bend.kFactor).toBe(0.44);
    expect(bend.method).toBe('k-factor');
  });

  it("by the shop's K, which says that it is the shop's", () => {
    const bend = bendBy({ method: 'shop', k: 0.44, figure: 'f1' });
    expect(bend.allowance).toBe(bendBy({ method: 'k-factor', k: 0.44 }).allowance);
    expect(bend.method).toBe('shop');
  });

  it('by the handbook, with the K that it implies', () => {
    const bend = bendBy({ method: 'handbook' });
    expect(bend.allowance).toBeCloseTo(0.279072, 12);
    expect(kFactorAllowance(90, 0.16, 0.04, bend.kFactor)).toBeCloseTo(bend.allowance, 14);
    expect(bend.kFactor).toBeCloseTo(0.4416, 4);
  });

  it('by DIN 6935, K being half of k', () => {
    const bend = bendBy({ method: 'din-6935' });
    expect(bend.kFactor).toBeCloseTo((0.65 + 0.5 * Math.log10(4)) / 2, 14);
    expect(bend.allowance).toBeCloseTo(kFactorAllowance(90, 0.16, 0.04, bend.kFactor), 14);
  });

  it('by the 90° rules, in proportion at other angles', () => {
    const bend = bendBy({ method: 'rule-90', hardness: 'soft' }, 45);
    expect(bend.allowance).toBeCloseTo((0.55 * 0.04 + 1.57 * 0.16) / 2, 14);
    expect(rule90Allowance(180, 0.16, 0.04, 'hard')).toBeCloseTo(2 * (0.71 * 0.04 + 1.57 * 0.16), 14);
  });

  it('as measured on that bend, with the K that it implies', () => {
    const own = { allowance: { method: 'measured', allowance: 0.28 } };
    const bend = bendBy({ method: 'handbook' }, 90, own);
    expect(bend.allowance).toBe(0.28);
    expect(bend.method).toBe('measured');
    expect(bend.kFactor).toBeCloseTo(impliedK(0.28, 90, 0.16, 0.04), 14);
  });

  it("of a bend's own method wins over the part's, for both bends of a joggle too", () => {
    const joggle = { joggle: 0.04, run: 0.3, turn: 'up', radius: 0.1, allowance: { method: 'k-factor', k: 0.3 } };
    const { bends } = figuresOf(partOf([{ leg: 1 }, joggle, { leg: 1 }, bendUp(90, 0.1), { leg: 1 }]));
    expect(bends.map((bend) => bend.method)).toEqual(['k-factor', 'k-factor', 'handbook']);
    expect(bends[0]!.allowance).toBe(bends[1]!.allowance);
  });

  it('is the same through the chooser as by each rule, at a whole range of angles', () => {
    for (let angle = 1; angle <= 180; angle += 1) {
      const k = 0.3 + angle / 1000;
      const { allowance } = bendAllowance({ method: 'k-factor', k, path: '' }, angle, 0.2, 0.05);
      expect(impliedK(allowance, angle, 0.2, 0.05)).toBeCloseTo(k, 11);
    }
  });
});
