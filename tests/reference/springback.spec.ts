import { gardiner } from '../../shared/springback/gardiner';

/** Gardiner read forward: finished radius of a tool radius. */
function finishedRadius(tool: number, thickness: number, yieldStress: number, modulus: number): number {
  const x = (tool * yieldStress) / (modulus * thickness);
  return tool / (4 * x ** 3 - 3 * x + 1);
}

describe("Springback by Gardiner's relation (Trans. ASME 79, 1957)", () => {
  const MPA_IN_PSI = 145.0377377;

  it('Ri 0.5 in, Y 300 MPa, T 0.0265 in, E 29·10⁶ psi: Ri/Rf 0.91516, Rf 0.5464 (exercise figures read, results computed)', () => {
    const modulus = 29e6 / MPA_IN_PSI;
    const finished = finishedRadius(0.5, 0.0265, 300, modulus);
    expect(Math.abs(finished - 0.5464)).toBeLessThan(0.0005);
    expect(Math.abs(0.5 / finished - 0.91516)).toBeLessThan(0.0005);
    const back = gardiner(90, finished, 0.0265, { name: 'steel', modulus, yield: 300 })!;
    expect(back.toolRadius).toBeCloseTo(0.5, 12);
  });

  /**
   * Springback factors kR of a German metal-trades table book (partly read; the column heads from memory): tool angle =
   * finished angle / kR for r/s. They are coarse, and the alloy tempers behind them are not stated, so only the drift is compared.
   */
  const R_OVER_S = [1, 1.6, 2.5, 4, 6.3, 10, 16, 25, 40, 63, 100];
  const KR_ALCUMG1 = [0.98, 0.98, 0.98, 0.98, 0.97, 0.97, 0.96, 0.95, 0.93, 0.91, 0.87];

  it('goes the way of the printed kR: no bend opens less than a sharper one, and the factor stays between 0 and 1', () => {
    const factors = R_OVER_S.map((ratio) => {
      const { toolAngle } = gardiner(90, ratio, 1, { name: 'EN AW-AlCuMg1', modulus: 72500, yield: 275 })!;
      return 90 / toolAngle;
    });
    const falls = (list: readonly number[]): boolean =>
      list.every((value, i) => i === 0 || value <= list[i - 1]! + 1e-12);
    expect(falls(factors)).toBeTrue();
    expect(falls(KR_ALCUMG1)).toBeTrue();
    factors.forEach((factor) => {
      expect(factor).toBeGreaterThan(0);
      expect(factor).toBeLessThan(1);
    });
    expect(factors[0]!).toBeCloseTo(KR_ALCUMG1[0]!, 1);
  });
});
