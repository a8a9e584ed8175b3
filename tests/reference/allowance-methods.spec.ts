import { handbookAllowance } from '../../shared/allowance/handbook';
import { kFactorAllowance } from '../../shared/allowance/k-factor';
import { rule90Allowance } from '../../shared/allowance/rule-90';
import { bendUp, figuresOf, partOf } from '../support/plain-part';

describe("Machinery's Handbook, bending allowances: 90° rules (second-hand)", () => {
  const rules = [
    { hardness: 'soft', coefficient: 0.55, metals: 'soft brass and soft copper' },
    { hardness: 'medium', coefficient: 0.64, metals: 'half-hard copper and brass, soft steel, aluminium' },
    { hardness: 'hard', coefficient: 0.71, metals: 'bronze, hard copper, cold-rolled and spring steel' },
  ] as const;
  for (const { hardness, coefficient, metals } of rules) {
    it(`${hardness} (${metals}): ${coefficient} T + 1.57 R, 1.57 as printed for π/2`, () => {
      expect(rule90Allowance(90, 0.125, 0.063, hardness)).toBeCloseTo(coefficient * 0.063 + 1.57 * 0.125, 12);
      const exact = coefficient * 0.063 + (Math.PI / 2) * 0.125;
      expect(Math.abs(rule90Allowance(90, 0.125, 0.063, hardness) - exact)).toBeLessThan(0.0008 * 0.125);
    });
  }

  it("the airframe handbook's 0.0078 × 90 = 0.702 T lies between the medium and the hard rule", () => {
    expect(0.0078 * 90).toBeCloseTo(0.702, 12);
    expect(rule90Allowance(90, 0, 1, 'hard')).toBeGreaterThan(handbookAllowance(90, 0, 1));
    expect(rule90Allowance(90, 0, 1, 'medium')).toBeLessThan(handbookAllowance(90, 0, 1));
  });
});

describe('Mid-thickness allowances, (R + T/2) times the angle', () => {
  it('NAVEDTRA 14119 p. 13-42 (read in a text copy): the neutral line at half the thickness is K 0.5', () => {
    expect(kFactorAllowance(90, 0.25, 0.051, 0.5)).toBeCloseTo(((0.25 + 0.051 / 2) * Math.PI) / 2, 14);
  });

  it('AC 65-15A worked example (from memory): R .25, T .051, 90°: 0.4327; the empirical formula gives 0.4280', () => {
    expect(Math.abs(kFactorAllowance(90, 0.25, 0.051, 0.5) - 0.4327)).toBeLessThan(0.0001);
    expect(handbookAllowance(90, 0.25, 0.051)).toBeCloseTo(0.428, 4);
  });

  it("an aircraft builder's worked note citing AC 43.13 (second-hand): R .25, T .025: .413 printed, 0.41233 by its own formula", () => {
    expect(kFactorAllowance(90, 0.25, 0.025, 0.5)).toBeCloseTo(0.41233, 5);
    expect(Math.abs(kFactorAllowance(90, 0.25, 0.025, 0.5) - 0.413)).toBeLessThan(0.001);
    expect(handbookAllowance(90, 0.25, 0.025)).toBeCloseTo(0.4097, 4);
  });

  it('a US Navy training manual (read in a text copy) prints 0.0173 for the radius: a contradiction, not used here', () => {
    const navy = 90 * (0.0173 * 0.25 + 0.0078 * 0.051);
    expect(handbookAllowance(90, 0.25, 0.051) - navy).toBeCloseTo(90 * 0.00013 * 0.25, 10);
  });
});

describe('The handbook formula', () => {
  it('FAA-H-8083-31 ch. 4: (0.01743·R + 0.0078·T)·A, at every whole degree', () => {
    for (let angle = 1; angle <= 180; angle += 1) {
      expect(handbookAllowance(angle, 0.125, 0.04)).toBeCloseTo((0.01743 * 0.125 + 0.0078 * 0.04) * angle, 13);
    }
  });

  it('implies a K that falls a little with R/T, since 0.01743 is below π/180', () => {
    const implied = [0.04, 0.16, 0.4, 1].map(
      (radius) => figuresOf(partOf([{ leg: 5 }, bendUp(90, radius), { leg: 5 }])).bends[0]!.kFactor,
    );
    expect([...implied].sort((a, b) => b - a)).toEqual(implied);
    // At R/T = 0 it would be 0.0078·180/π.
    expect(implied[0]!).toBeLessThan((0.0078 * 180) / Math.PI);
  });
});
