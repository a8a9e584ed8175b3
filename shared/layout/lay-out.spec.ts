import { bendDown, bendUp, codesOf, figuresOf, partOf } from '../../tests/support/plain-part';

describe('The flat layout', () => {
  it('of a strip is the strip', () => {
    const { legs, developedLength, bends } = figuresOf(partOf([{ leg: 3, name: 'Strip' }]));
    expect(developedLength).toBe(3);
    expect(bends).toEqual([]);
    expect(legs[0]).toEqual(jasmine.objectContaining({ name: 'Strip', flat: 3, start: 0, end: 3, setback: [0, 0] }));
  });

  it('takes each end of a leg as it is measured', () => {
    const flatOf = (measure: unknown): number =>
      figuresOf(partOf([{ leg: 1 }, bendUp(120, 0.16), { leg: 2, measure }, bendUp(60, 0.16), { leg: 1 }])).legs[1]!
        .flat;
    const [outer, inner] = [0.2, 0.16];
    const [big, small] = [Math.tan(Math.PI / 3), Math.tan(Math.PI / 6)];
    expect(flatOf('mold-line')).toBeCloseTo(2 - outer * big - outer * small, 12);
    expect(flatOf('inside')).toBeCloseTo(2 - inner * big - inner * small, 12);
    expect(flatOf('outside-edge')).toBeCloseTo(2 - outer - outer * small, 12);
    expect(flatOf('flat')).toBe(2);
    expect(flatOf(['flat', 'mold-line'])).toBeCloseTo(2 - outer * small, 12);
    expect(flatOf(['outside-edge', 'flat'])).toBeCloseTo(2 - outer, 12);
  });

  it('gives a free end no setback, whatever it says', () => {
    const { legs } = figuresOf(
      partOf([{ leg: 1, measure: 'inside' }, bendUp(90, 0.1), { leg: 1, measure: ['flat', 'inside'] }]),
    );
    expect(legs.map((leg) => leg.setback)).toEqual([
      [0, 0.1],
      [0, 0],
    ]);
  });

  it('lays sight lines one radius of the nose from the tangent lines', () => {
    const lines = (bend: object, more: Record<string, unknown> = {}) =>
      figuresOf(partOf([{ leg: 1 }, { ...bendUp(90, 0.16), ...bend }, { leg: 1 }], more)).bends[0]!;
    const own = lines({ nose: { radius: 0.1 } }, { nose: { radius: 0.12 } });
    const part = lines({}, { nose: { radius: 0.12 } });
    const none = lines({});
    for (const [bend, radius] of [
      [own, 0.1],
      [part, 0.12],
      [none, 0.16],
    ] as const) {
      expect(bend.noseRadius).toBe(radius);
      expect(bend.sightLine!.startUnderNose).toBeCloseTo(0.8 + radius, 14);
      expect(bend.sightLine!.endUnderNose).toBeCloseTo(bend.tangentEnd! - radius, 14);
    }
  });

  it('gives deduction as twice the setback less the allowance, and none at 180°', () => {
    const outside = { leg: 1, measure: 'outside-edge' };
    const { bends } = figuresOf(
      partOf(
        [{ leg: 2 }, bendUp(90, 0.16), outside, bendUp(180, 0.1), outside].map((entry, i) =>
          i === 2 ? { leg: 1, measure: ['mold-line', 'outside-edge'] } : entry,
        ),
      ),
    );
    expect(bends[0]!.deduction).toBeCloseTo(0.4 - bends[0]!.allowance, 14);
    expect([bends[1]!.setback, bends[1]!.deduction]).toEqual([null, null]);
    expect(bends[1]!.tangentEnd).not.toBeNull();
  });
});

describe('A leg that its bends consume', () => {
  const channel = (web: unknown) =>
    figuresOf(partOf([{ leg: 1 }, bendUp(90, 0.16), { leg: web }, bendUp(90, 0.16), { leg: 1 }]));

  it('is a stop at 0 and below, and none just above', () => {
    expect(codesOf(channel(0.4))).toEqual(['leg-consumed']);
    expect(codesOf(channel(0.3999))).toEqual(['leg-consumed']);
    expect(codesOf(channel(0.4001))).toEqual([]);
  });

  it('leaves what comes after it open, and what came before it as it is', () => {
    const solved = channel(0.3);
    expect(solved.legs[1]!.flat).toBeCloseTo(-0.1, 12);
    expect([solved.legs[1]!.start, solved.legs[1]!.end, solved.legs[2]!.start]).toEqual([
      solved.bends[0]!.tangentEnd,
      null,
      null,
    ]);
    expect(solved.bends[1]!.sightLine).toBeNull();
    expect(solved.bends[1]!.allowance).toBeGreaterThan(0);
    expect([solved.developedLength, solved.blank.length, solved.blank.area, solved.formed, solved.section]).toEqual([
      null,
      null,
      null,
      null,
      null,
    ]);
  });

  it('is consumed where decimals alone leave a last bit: nothing is left of it', () => {
    let cases = 0;
    for (let t = 10; t < 130; t += 1) {
      for (let r = 10; r < 100; r += 7) {
        const [thickness, radius, wide] = [t / 1000, r / 1000, (r + 11) / 1000];
        const leg = (2 * t + r + r + 11) / 1000;
        if (leg - (radius + thickness) - (wide + thickness) === 0) continue;
        cases += 1;
        const chain = [{ leg: 1 }, bendUp(90, radius), { leg }, bendDown(90, wide), { leg: 1 }];
        const solved = figuresOf(partOf(chain, { thickness }));
        if (solved.legs[1]!.flat !== 0 || codesOf(solved)[0] !== 'leg-consumed') fail(`T ${thickness}, R ${radius}`);
      }
    }
    expect(cases).toBeGreaterThan(100);
  });
});

describe('The blank', () => {
  const holes = [{ leg: 0, diameter: 0.5, from: 'start', at: 1, across: 1, count: 2, pitch: 1 }];

  it('is developed length by width, less holes, with its mass and its rough length', () => {
    const { blank } = figuresOf(
      partOf([{ leg: 10 }], { width: 4, material: '2024-T3', holes, trim: { start: 0.25, end: '1/2' } }),
    );
    const area = 40 - (2 * Math.PI) / 16;
    expect(blank.area).toBeCloseTo(area, 12);
    expect(blank.roughLength).toBe(10.75);
    expect(blank.trim).toEqual({ start: 0.25, end: 0.5 });
    expect(blank.mass!.unit).toBe('lb');
    // 2024 at 0.1 lb/in³.
    expect(blank.mass!.value).toBeCloseTo(area * 0.04 * 0.1, 9);
  });

  it('has no area without a width, and no mass without a density', () => {
    expect(figuresOf(partOf([{ leg: 10 }], { material: '2024-T3' })).blank.area).toBeNull();
    expect(figuresOf(partOf([{ leg: 10 }], { width: 1, material: { name: 'x' } })).blank.mass).toBeNull();
    expect(figuresOf(partOf([{ leg: 10 }], { width: 1, material: 'unobtainable' })).blank.mass).toBeNull();
    expect(figuresOf(partOf([{ leg: 10 }], { width: 1 })).blank.area).toBe(10);
  });

  it('has no area rather than one below zero, when its holes are more than it is', () => {
    const { blank } = figuresOf(
      partOf([{ leg: 1 }], { width: 1, material: '2024-T3', holes: [{ ...holes[0], diameter: 5 }] }),
    );
    expect([blank.area, blank.mass]).toEqual([null, null]);
  });
});
