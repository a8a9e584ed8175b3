import { parseTypedChain } from '../../shared/part/typed-chain';
import { formatLength } from '../../shared/units/format';
import { bendDown, bendUp, figuresOf, partOf } from '../support/plain-part';

const HANDBOOK = 'FAA-H-8083-31 ch. 4, Layout and Forming';

describe(`U channel, ${HANDBOOK}, steps 1–5: legs 1.00, 2.00, 1.00, T .040, R .16 (read in a text copy)`, () => {
  const typed = parseTypedChain('1 up 90 r.16 2 up 90 1');
  const solved = figuresOf(partOf(typed.ok ? typed.chain : []));

  it('flats .80, 1.60, .80 as printed', () => {
    expect(solved.legs.map((leg) => formatLength(leg.flat, 'in'))).toEqual(['0.800', '1.600', '0.800']);
    expect(solved.legs.map((leg) => leg.setback)).toEqual([
      [0, 0.2],
      [0.2, 0.2],
      [0.2, 0],
    ]);
  });

  it('allowance .279 a bend by the rule, 3.758 in all', () => {
    expect(solved.bends.map((bend) => formatLength(bend.allowance, 'in'))).toEqual(['0.279', '0.279']);
    expect(formatLength(solved.developedLength!, 'in')).toBe('3.758');
  });

  it('the handbook prints 3.74: it reads its table in the 5/32 column (.273) and rounds that to .27', () => {
    const flats = solved.legs.reduce((sum, leg) => sum + leg.flat, 0);
    expect(flats).toBeCloseTo(3.2, 12);
    expect(formatLength(flats + 2 * 0.27, 'in')).toBe('3.740');
    expect(formatLength(flats + 2 * 0.273, 'in')).toBe('3.746');
    expect(solved.developedLength! - 3.74).toBeCloseTo(0.018, 3);
  });

  it("its printed check holds: the total is less than the sum of the mold-line dimensions, '4.000'", () => {
    expect(solved.developedLength!).toBeLessThan(4);
  });

  it('hole in the web 0.500 from the left outside mold line (own arithmetic on its figures: .8 + .273 + .5 − .2 = 1.373)', () => {
    const chain = [{ leg: 1 }, bendUp(90, 0.16), { leg: 2 }, bendUp(90, 0.16), { leg: 1 }];
    const hole = { leg: 1, diameter: 0.128, from: 'mold-start', at: 0.5, across: 0.5 };
    const measured = chain.map((entry) =>
      'bend' in entry ? { ...entry, allowance: { method: 'measured', allowance: 0.273 } } : entry,
    );
    expect(figuresOf(partOf(measured, { holes: [hole] })).holes[0]!.station).toBeCloseTo(1.373, 12);
  });
});

describe('L-bracket, 120° between flanges, T .040, R .156 (read in a text copy)', () => {
  it('is bent 60°; the table gives 0.18204, the printed formula 0.0002 less', () => {
    const [bend] = figuresOf(partOf([{ leg: 1 }, bendUp(180 - 120, 0.156), { leg: 1 }])).bends;
    expect(bend!.angle).toBe(60);
    expect(bend!.allowance).toBeCloseTo(0.1818648, 10);
    expect(Math.abs(bend!.allowance - 0.18204)).toBeLessThan(0.0002);
  });
});

describe('Workbook example of three bends (sheet-metal workbook, 6th ed., 2012, "90 Degree Bends"; second-hand)', () => {
  const chain = [0.74, 0.42, 1.05, 1].flatMap((leg, i) => (i === 0 ? [{ leg }] : [bendUp(90, 0.032), { leg }]));
  const solved = figuresOf(partOf(chain, { thickness: 0.05 }));

  it('one bend: allowance .085, twice the setback .164, deduction .079', () => {
    const [bend] = solved.bends;
    expect(bend!.allowance).toBeCloseTo(0.085, 3);
    expect(2 * bend!.setback!).toBeCloseTo(0.164, 12);
    expect(bend!.deduction).toBeCloseTo(0.079, 3);
  });

  it('running totals .661 1.081 1.002 2.052 1.973 2.973, each deduction rounded as printed; 2.973 in all', () => {
    const deduction = Number(solved.bends[0]!.deduction!.toFixed(3));
    let running = 0;
    const steps = [0.74, 0.42, 1.05, 1].flatMap((leg, i) => {
      running += leg;
      const before = running;
      running -= i < 3 ? deduction : 0;
      return i === 0 ? [running] : i === 3 ? [before] : [before, running];
    });
    expect(steps.map((step) => step.toFixed(3))).toEqual(['0.661', '1.081', '1.002', '2.052', '1.973', '2.973']);
    expect(Math.abs(solved.developedLength! - 2.973)).toBeLessThan(0.001);
  });
});

describe('Layouts by the handbook formulas (own arithmetic, not published; kept as a second computation)', () => {
  const cases = [
    { name: 'hat', legs: [0.6, 1, 1.2, 1, 0.6], angle: 90, r: 0.125, t: 0.032, back: 0.157, ba: 0.21855, all: 4.01821 },
    { name: 'closed angle', legs: [2, 2], angle: 135, r: 0.25, t: 0.064, back: 0.75806, ba: 0.65565, all: 3.13953 },
    { name: 'J', legs: [0.5, 1, 2], angle: 90, r: 0.156, t: 0.051, back: 0.207, ba: 0.28052, all: 3.23304 },
  ];
  for (const { name, legs, angle, r, t, back, ba, all } of cases) {
    it(`${name}: setback ${back}, allowance ${ba}, ${all} in all`, () => {
      const turns = [bendUp, bendDown, bendDown, bendUp];
      const chain = legs.flatMap((leg, i) => (i === 0 ? [{ leg }] : [turns[i - 1]!(angle, r), { leg }]));
      const solved = figuresOf(partOf(chain, { thickness: t }));
      for (const bend of solved.bends) {
        expect(Math.abs(bend.setback! - back)).toBeLessThan(0.00002);
        expect(Math.abs(bend.allowance - ba)).toBeLessThan(0.00002);
      }
      expect(Math.abs(solved.developedLength! - all)).toBeLessThan(0.00002);
    });
  }
});

describe('A 6 × 8 angle, T .040, R 1/8, 90° (common practice, no source)', () => {
  const chain = [{ leg: 6, name: 'Short leg' }, bendUp(90, '1/8'), { leg: 8, name: 'Long leg' }];
  const solved = figuresOf(partOf(chain, { width: 6 }));

  it('setback .165, flats 5.835 and 7.835, allowance .224, developed length 13.894', () => {
    const [bend] = solved.bends;
    expect(bend!.setback).toBeCloseTo(0.165, 12);
    expect(solved.legs.map((leg) => formatLength(leg.flat, 'in'))).toEqual(['5.835', '7.835']);
    expect(formatLength(bend!.allowance, 'in')).toBe('0.224');
    expect(formatLength(solved.developedLength!, 'in')).toBe('13.894');
  });

  it('sight line 0.125 inside the tangent line: 7.960 from the end of the 8 in leg', () => {
    const { sightLine } = solved.bends[0]!;
    expect(formatLength(solved.developedLength! - sightLine!.endUnderNose, 'in')).toBe('7.960');
    expect(formatLength(sightLine!.startUnderNose, 'in')).toBe('5.960');
    expect(formatLength(sightLine!.endUnderNose, 'in')).toBe('5.934');
  });

  it('blank 13.894 × 6: 83.36 square inches', () => {
    expect(solved.blank.area).toBeCloseTo(83.36, 2);
  });
});
