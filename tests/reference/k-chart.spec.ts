import { halfTangent, setback } from '../../shared/layout/setback';
import { K_CHART, K_CHART_MISPRINTS } from './k-chart';

/** One unit of the last printed place: four places up to 90°, three up to 168°, two beyond. */
const lastPlace = (degrees: number): number => (degrees <= 90 ? 4 : degrees <= 168 ? 3 : 2);

describe('The K chart (AC 43.13-1B table 4-7)', () => {
  it('prints tan(A/2) for every angle read, cut off or rounded in its last place', () => {
    expect(K_CHART.length).toBe(105);
    for (const [degrees, printed] of K_CHART) {
      const unit = 10 ** -lastPlace(degrees);
      expect(Math.abs(halfTangent(degrees) - printed))
        .withContext(`${degrees}°`)
        .toBeLessThan(1.2 * unit);
    }
  });

  it('is often truncated, not rounded', () => {
    const cut = K_CHART.filter(([degrees, printed]) => {
      const scale = 10 ** lastPlace(degrees);
      const exact = halfTangent(degrees) * scale;
      const shown = Math.round(printed * scale);
      return shown === Math.floor(exact) && shown !== Math.round(exact);
    });
    // 82 of the chart's 179 values; of the 105 read here:
    expect(cut.length).toBe(52);
  });

  it('is wrong at 86°, 159° and 176°: those values are never used', () => {
    for (const [degrees, printed, exact] of K_CHART_MISPRINTS) {
      expect(halfTangent(degrees)).withContext(`${degrees}°`).toBeCloseTo(exact, 3);
      expect(Math.floor(halfTangent(degrees) * 1e4) / 1e4)
        .withContext(`${degrees}° cut off`)
        .not.toBe(printed);
      expect(K_CHART.some(([read]) => read === degrees)).toBeFalse();
    }
  });
});

describe('Printed setbacks', () => {
  it('AC 43.13-1B par. 4-56, fig. 4-3: R .250, T .064, bent 45° (open, 135° between legs): K 0.41421, setback 0.130', () => {
    expect(halfTangent(45)).toBeCloseTo(0.41421, 5);
    expect(setback('mold-line', 45, 0.25, 0.064)).toBeCloseTo(0.13, 3);
  });

  it('AC 43.13-1B par. 4-56, fig. 4-3: bent 135° (closed, 45° between legs): K 2.4142, setback 0.758', () => {
    expect(halfTangent(135)).toBeCloseTo(2.4142, 4);
    expect(setback('mold-line', 135, 0.25, 0.064)).toBeCloseTo(0.758, 3);
  });

  it('FAA-H-8083-31 ch. 4, U channel step 2: R .16, T .040, 90°: K 1, setback 0.200', () => {
    expect(setback('mold-line', 90, 0.16, 0.04)).toBe(0.2);
  });

  it('FAA-H-8083-31 ch. 4, setback chart example (partly read): R + T 0.183 at 135°: 0.435 off the chart, 0.4418 computed', () => {
    const computed = setback('mold-line', 135, 0.143, 0.04)!;
    expect(computed).toBeCloseTo(0.4418, 4);
    expect(Math.abs(computed - 0.435)).toBeLessThan(0.01);
  });
});
