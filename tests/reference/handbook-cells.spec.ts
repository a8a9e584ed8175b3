import { HANDBOOK_RADIUS, HANDBOOK_THICKNESS, handbookAllowance } from '../../shared/allowance/handbook';
import { HANDBOOK_CELL_NOT_TO_USE, HANDBOOK_CELLS_FROM_MEMORY } from './handbook-cells';

/** The coefficient that the printed figures follow; the formula beside them prints 0.01743. */
const TABLE_RADIUS = 0.01745;
const aDegree = (coefficient: number, radius: number, thickness: number): number =>
  coefficient * radius + HANDBOOK_THICKNESS * thickness;

describe('The handbook bend allowance figure (FAA-H-8083-31 ch. 4)', () => {
  it('has one cell that was read, .040 × 5/32: 0.003034 a degree, by 0.01745·R with R as the printed .156', () => {
    expect(aDegree(TABLE_RADIUS, 0.156, 0.04).toFixed(6)).toBe('0.003034');
    expect(aDegree(HANDBOOK_RADIUS, 0.156, 0.04).toFixed(6)).toBe('0.003031');
    expect(aDegree(HANDBOOK_RADIUS, 5 / 32, 0.04).toFixed(6)).toBe('0.003035');
    expect(Math.abs(handbookAllowance(1, 0.156, 0.04) - 0.003034)).toBeLessThan(3.1e-6);
  });

  it('L-bracket, 120° between flanges, .040 × .156: 60° × 0.003034 = 0.18204; the printed formula lies 0.0002 under it', () => {
    expect((60 * 0.003034).toFixed(5)).toBe('0.18204');
    const bend = 180 - 120;
    expect(Math.abs(bend * aDegree(TABLE_RADIUS, 0.156, 0.04) - 0.18204)).toBeLessThan(0.00006);
    expect(handbookAllowance(bend, 0.156, 0.04) - 0.18204).toBeCloseTo(-0.0001752, 6);
  });

  it('cells from memory, a degree: within 0.000008 by the table coefficient, within 0.000011 by the printed formula', () => {
    for (const [thickness, radius, , printed] of HANDBOOK_CELLS_FROM_MEMORY) {
      if (printed === null) continue;
      const place = `.${thickness} × ${radius}`;
      expect(Math.abs(aDegree(TABLE_RADIUS, radius, thickness) - printed))
        .withContext(place)
        .toBeLessThan(8e-6);
      expect(Math.abs(handbookAllowance(1, radius, thickness) - printed))
        .withContext(place)
        .toBeLessThan(1.1e-5);
    }
  });

  it('cells from memory, at 90°: within 0.001 by the table coefficient, within 0.0016 by the printed formula', () => {
    for (const [thickness, radius, printed] of HANDBOOK_CELLS_FROM_MEMORY) {
      const place = `.${thickness} × ${radius}`;
      expect(Math.abs(90 * aDegree(TABLE_RADIUS, radius, thickness) - printed))
        .withContext(place)
        .toBeLessThan(0.001);
      expect(Math.abs(handbookAllowance(90, radius, thickness) - printed))
        .withContext(place)
        .toBeLessThan(0.0016);
    }
  });

  it('the table coefficient fits the cells better than the printed one, which is why the two are told apart', () => {
    const miss = (coefficient: number): number =>
      Math.max(
        ...HANDBOOK_CELLS_FROM_MEMORY.map(([t, r, printed]) => Math.abs(90 * aDegree(coefficient, r, t) - printed)),
      );
    expect(miss(TABLE_RADIUS)).toBeLessThan(miss(HANDBOOK_RADIUS));
    expect(miss(HANDBOOK_RADIUS)).toBeGreaterThan(0.0014);
  });

  it('a whole column grows with the thickness and a whole row with the radius, as remembered cells must', () => {
    for (const [t1, r1, a] of HANDBOOK_CELLS_FROM_MEMORY) {
      for (const [t2, r2, b] of HANDBOOK_CELLS_FROM_MEMORY) {
        if (t1 <= t2 && r1 <= r2 && (t1 < t2 || r1 < r2)) expect(a).withContext(`${t1} ${r1}`).toBeLessThan(b);
      }
    }
  });

  it('one remembered cell is not used: its two figures contradict each other', () => {
    const { at90, aDegree: perDegree, thickness, radius } = HANDBOOK_CELL_NOT_TO_USE;
    expect(Math.abs(90 * perDegree - at90)).toBeGreaterThan(0.008);
    expect(HANDBOOK_CELLS_FROM_MEMORY.some(([t, r]) => t === thickness && r === radius)).toBeFalse();
    expect(Math.abs(handbookAllowance(90, radius, thickness) - at90)).toBeLessThan(0.0016);
  });
});
