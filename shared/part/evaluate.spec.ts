import { bendUp, figuresOf, partOf, refusalOf } from '../../tests/support/plain-part';

const pathsOf = (document: unknown): string[] => refusalOf(document).map((error) => error.path);
const messageOf = (document: unknown): string => refusalOf(document)[0]?.message ?? 'accepted';
const part = (more: object): object =>
  partOf([{ leg: 1 }, bendUp(90, 0.1), { leg: 1 }], more as Record<string, unknown>);
const withBend = (more: object, frame: Record<string, unknown> = {}): object =>
  partOf([{ leg: 5 }, { ...bendUp(90, 0.1), ...more }, { leg: 5 }], frame);
const withLeg = (leg: unknown): object => partOf([{ leg }]);

describe('The limits of a document, on both sides', () => {
  it('thickness above 0', () => {
    expect(pathsOf(part({ thickness: 0 }))).toEqual(['thickness']);
    expect(pathsOf(part({ thickness: -0.04 }))).toEqual(['thickness']);
    expect(messageOf(part({ thickness: 0 }))).toBe('The thickness must be above 0 in; this is 0 in.');
    expect(pathsOf(part({ thickness: 1e-6 }))).toEqual([]);
  });

  it('leg dimensions and width above 0', () => {
    expect(pathsOf(withLeg(0))).toEqual(['chain/0/leg']);
    expect(pathsOf(withLeg('1 - 2'))).toEqual(['chain/0/leg']);
    expect(pathsOf(withLeg(1e-9))).toEqual([]);
    expect(pathsOf(part({ width: 0 }))).toEqual(['width']);
    expect(pathsOf(part({ width: 0.001 }))).toEqual([]);
  });

  it('lengths up to a million inches', () => {
    expect(pathsOf(withLeg(1e6))).toEqual([]);
    expect(pathsOf(withLeg(1e6 + 1))).toEqual(['chain/0/leg']);
    expect(messageOf(withLeg(1e9))).toBe("The length of a leg can't be above 1000000 in; this is 1000000000 in.");
    expect(pathsOf(partOf([{ leg: 25.4e6 }], { unit: 'mm' }))).toEqual([]);
    expect(pathsOf(partOf([{ leg: 25.5e6 }], { unit: 'mm' }))).toEqual(['chain/0/leg']);
  });

  it('bend angles above 0 and up to 180', () => {
    expect(pathsOf(withBend({ bend: 0 }))).toEqual(['chain/1/bend']);
    expect(pathsOf(withBend({ bend: -90 }))).toEqual(['chain/1/bend']);
    expect(pathsOf(withBend({ bend: 1e-6 }))).toEqual([]);
    const measured = [{ leg: 5, measure: 'flat' }, bendUp(180, 0.1), { leg: 5, measure: 'outside-edge' }];
    expect(pathsOf(partOf(measured))).toEqual([]);
    expect(pathsOf(withBend({ bend: 180.0001 }))).toEqual(['chain/1/bend']);
    expect(pathsOf(withBend({ bend: 181 }))).toEqual(['chain/1/bend']);
    expect(messageOf(withBend({ bend: '2 in' }))).toContain('an angle is wanted here');
  });

  it('radii from 0, and above 0 for DIN 6935 with k above 0', () => {
    expect(pathsOf(withBend({ radius: 0 }))).toEqual([]);
    expect(pathsOf(withBend({ radius: -0.001 }))).toEqual(['chain/1/radius']);
    const din = { allowance: { method: 'din-6935' }, thickness: 1 };
    const limit = 10 ** -1.3;
    expect(pathsOf(withBend({ radius: 0 }, din))).toEqual(['chain/1/radius']);
    expect(pathsOf(withBend({ radius: limit * 0.999 }, din))).toEqual(['chain/1/radius']);
    expect(pathsOf(withBend({ radius: limit * 1.001 }, din))).toEqual([]);
    const own = { radius: 0, allowance: { method: 'handbook' } };
    expect(pathsOf(withBend(own, din))).toEqual([]);
  });

  it('K above 0 and up to 1', () => {
    for (const method of ['k-factor', 'shop']) {
      const at = (k: unknown): string[] => pathsOf(withBend({}, { allowance: { method, k } }));
      expect(at(0)).toEqual(['allowance/k']);
      expect(at(0.0001)).toEqual([]);
      expect(at(1)).toEqual([]);
      expect(at(1.0001)).toEqual(['allowance/k']);
      expect(at('1/3')).toEqual([]);
      expect(at('0.4 in')).toEqual(['allowance/k']);
    }
    expect(pathsOf(withBend({ allowance: { method: 'k-factor', k: 2 } }))).toEqual(['chain/1/allowance/k']);
  });

  it('a measured allowance on a bend only, above 0', () => {
    const measured = (allowance: unknown): object => ({ allowance: { method: 'measured', allowance } });
    expect(pathsOf(withBend(measured(0.2)))).toEqual([]);
    expect(pathsOf(withBend(measured(0)))).toEqual(['chain/1/allowance/allowance']);
    expect(pathsOf(withBend({}, measured(0.2) as Record<string, unknown>))).toEqual(['allowance/method']);
  });

  it('nose radii, trims and tolerances from 0', () => {
    expect(pathsOf(part({ nose: { radius: 0 } }))).toEqual([]);
    expect(pathsOf(part({ nose: { radius: -0.1 } }))).toEqual(['nose/radius']);
    expect(pathsOf(withBend({ nose: { radius: -0.1 } }))).toEqual(['chain/1/nose/radius']);
    expect(pathsOf(part({ trim: { start: 0, end: 0.5 } }))).toEqual([]);
    expect(pathsOf(part({ trim: { start: -0.1, end: 'x' } }))).toEqual(['trim/start', 'trim/end']);
    const tolerances = {
      length: [0, 0],
      angle: ['1°', 1],
      radius: [0.1, 0],
      k: [0, 0.02],
      cut: [0, 0],
      thickness: [0, 0],
    };
    expect(pathsOf(part({ tolerances }))).toEqual([]);
    const broken = { length: [-0.1, 0], angle: [0, '1 in'], k: [0, '1 in'] };
    expect(pathsOf(part({ tolerances: broken }))).toEqual([
      'tolerances/length/0',
      'tolerances/angle/1',
      'tolerances/k/1',
    ]);
  });

  it('a seat that is a leg', () => {
    expect(pathsOf(part({ seat: 1 }))).toEqual([]);
    expect(pathsOf(part({ seat: 2 }))).toEqual(['seat']);
  });

  it('joggles of a depth and a run above 0', () => {
    const joggled = (more: object): object =>
      partOf([{ leg: 1 }, { joggle: 0.04, run: 0.3, turn: 'up', radius: 0.1, ...more }, { leg: 1 }]);
    expect(pathsOf(joggled({}))).toEqual([]);
    expect(pathsOf(joggled({ joggle: 0, run: 0 }))).toEqual(['chain/1/joggle', 'chain/1/run']);
  });
});

describe('Measures at a 180° bend', () => {
  const folded = (before: unknown, after: unknown): string[] =>
    pathsOf(partOf([{ leg: 1, measure: before }, bendUp(180, 0.1), { leg: 1, measure: after }]));

  it('are refused to a mold point, at the leg that asks for it, also by default', () => {
    expect(folded('outside-edge', 'flat')).toEqual([]);
    expect(folded('mold-line', 'flat')).toEqual(['chain/0/measure']);
    expect(folded('flat', 'inside')).toEqual(['chain/2/measure']);
    expect(folded(['inside', 'flat'], ['flat', 'inside'])).toEqual([]);
    expect(pathsOf(partOf([{ leg: 1 }, bendUp(180, 0.1), { leg: 1 }]))).toEqual(['chain/0/measure', 'chain/2/measure']);
    const [error] = refusalOf(partOf([{ leg: 1 }, bendUp(180, 0.1), { leg: 1, measure: 'flat' }]));
    expect(error!.message).toContain('outside-edge');
  });

  it('are refused once a leg, though both its ends ask', () => {
    const outside = { leg: 1, measure: 'outside-edge' };
    const chain = [outside, bendUp(180, 0.1), { leg: 1 }, bendUp(180, 0.1), outside];
    expect(pathsOf(partOf(chain))).toEqual(['chain/2/measure']);
  });

  it('are fine just below 180°', () => {
    expect(pathsOf(partOf([{ leg: 9 }, bendUp(179.999, 0.1), { leg: 9 }]))).toEqual([]);
  });
});

describe('Holes', () => {
  const hole = { leg: 0, diameter: 0.1, from: 'end', at: 0.5, across: 0.5 };
  const drilled = (more: object, chain: readonly unknown[] = [{ leg: 1 }, bendUp(90, 0.1), { leg: 1 }]): object =>
    partOf(chain, { holes: [{ ...hole, ...more }] });

  it('have a diameter above 0, a leg that is there, and a pitch when they are a row', () => {
    expect(pathsOf(drilled({}))).toEqual([]);
    expect(pathsOf(drilled({ diameter: 0 }))).toEqual(['holes/0/diameter']);
    expect(pathsOf(drilled({ leg: 2 }))).toEqual(['holes/0/leg']);
    expect(pathsOf(drilled({ count: 2 }))).toEqual(['holes/0/pitch']);
    expect(pathsOf(drilled({ count: 1 }))).toEqual([]);
    expect(pathsOf(drilled({ count: 2, pitch: 0 }))).toEqual(['holes/0/pitch']);
    expect(pathsOf(drilled({ at: 'x', across: 'y' }))).toEqual(['holes/0/at', 'holes/0/across']);
  });

  it('can not be measured from a mold point at 180°', () => {
    const outside = { leg: 1, measure: 'outside-edge' };
    const folded = [outside, bendUp(180, 0.1), outside];
    expect(pathsOf(drilled({ from: 'mold-end' }, folded))).toEqual(['holes/0/from']);
    expect(pathsOf(drilled({ from: 'mold-start' }, folded))).toEqual([]);
    expect(pathsOf(drilled({ leg: 1, from: 'mold-start' }, folded))).toEqual(['holes/0/from']);
  });
});

describe('A refused document', () => {
  it('names every field that is wrong, once', () => {
    const chain = [{ leg: 'x' }, bendUp('y', 'z'), { leg: 0 }];
    expect(pathsOf(partOf(chain, { thickness: 't', width: -1 }))).toEqual([
      'thickness',
      'width',
      'chain/0/leg',
      'chain/1/radius',
      'chain/1/bend',
      'chain/2/leg',
    ]);
  });

  it('names the broken variable and not the fields that use it', () => {
    expect(pathsOf(partOf([{ leg: 'W' }], { variables: { W: '1 +' } }))).toEqual(['variables/W']);
  });

  it('reads fields with the variables of the part and its own unit', () => {
    const solved = figuresOf(partOf([{ leg: 'W + 25.4 mm' }], { variables: { W: '1 1/2' }, thickness: '1 mm' }));
    expect(solved.developedLength).toBe(2.5);
    expect(solved.thickness).toBeCloseTo(1 / 25.4, 14);
  });

  it('refuses a broken variable of a dash number at its own place', () => {
    const dashNumbers = [
      { dash: '-1', variables: { W: 3 } },
      { dash: '-3', variables: { W: 'V' } },
    ];
    expect(pathsOf(partOf([{ leg: 'W' }], { variables: { W: 2 }, dashNumbers }))).toEqual([
      'dashNumbers/1/variables/W',
    ]);
  });
});
