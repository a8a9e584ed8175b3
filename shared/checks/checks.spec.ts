import { findingsOf, levelsOf } from '../../tests/support/findings';
import { bendDown, bendUp, figuresOf, partOf } from '../../tests/support/plain-part';

const ANGLE = [{ leg: 2 }, bendUp(90, 0.16), { leg: 2 }];

describe('k-above-half', () => {
  const at = (k: number, method = 'k-factor') => findingsOf('k-above-half', ANGLE, { allowance: { method, k } });

  it('speaks above 0.5 and not at it, of a given and of a shop K', () => {
    expect(at(0.5)).toEqual([]);
    expect(at(0.4999)).toEqual([]);
    expect(levelsOf(at(0.5001))).toEqual(['caution']);
    expect(levelsOf(at(0.6, 'shop'))).toEqual(['caution']);
  });

  it('speaks of a measured allowance that implies one, and not of a rule', () => {
    const measured = (k: number): readonly unknown[] => {
      const allowance = (Math.PI / 2) * (0.16 + k * 0.04);
      return [ANGLE[0], { ...bendUp(90, 0.16), allowance: { method: 'measured', allowance } }, ANGLE[2]];
    };
    expect(findingsOf('k-above-half', measured(0.5))).toEqual([]);
    expect(findingsOf('k-above-half', measured(0.51)).length).toBe(1);
    expect(findingsOf('k-above-half', ANGLE, { allowance: { method: 'rule-90', hardness: 'hard' } })).toEqual([]);
  });

  it('comes once a part, at the first such bend, with the largest K', () => {
    const own = (k: number): object => ({ ...bendUp(45, 0.16), allowance: { method: 'k-factor', k } });
    const found = findingsOf('k-above-half', [
      { leg: 2 },
      own(0.4),
      { leg: 2 },
      own(0.6),
      { leg: 2 },
      own(0.7),
      { leg: 2 },
    ]);
    expect(found.length).toBe(1);
    expect(found[0]!.at).toBe('chain/3');
    expect(found[0]!.message).toContain('0.7');
  });
});

describe('legs-cross', () => {
  it('names a dozen places of a part wound up in itself, and counts the rest', () => {
    const legs = (bends: number) => [
      { leg: 1 },
      ...Array.from({ length: bends }, () => [bendUp(90, 0.1), { leg: 1 }]).flat(),
    ];
    const few = findingsOf('legs-cross', legs(4));
    expect(few.length).toBeGreaterThan(0);
    expect(few.some(({ message }) => message.includes('more such places'))).toBeFalse();
    const many = findingsOf('legs-cross', legs(200));
    expect(many.length).toBe(12);
    expect(many[11]!.message).toMatch(/There are \d+ more such places\./);
  });
});

describe('allowance-beyond-sheet', () => {
  // R 0.125, T 0.04, 90°: the inside face is 0.19635 long, the outside 0.25918.
  const at = (allowance: number) =>
    findingsOf('allowance-beyond-sheet', [
      { leg: 2 },
      { ...bendUp(90, 0.125), allowance: { method: 'measured', allowance } },
      { leg: 2 },
    ]);

  it('is a caution below the inside face and above the outside face, and none between', () => {
    expect(levelsOf(at(0.1963))).toEqual(['caution']);
    expect(at(0.1964)).toEqual([]);
    expect(at(0.2591)).toEqual([]);
    expect(levelsOf(at(0.2592))).toEqual(['caution']);
  });
});

describe('the least figure that a stop asks for', () => {
  it('is rounded up, so that typing it back is enough', () => {
    const run = (length: number) =>
      findingsOf('joggle-run-too-short', [
        { leg: 1 },
        { joggle: 0.2, run: length, turn: 'up', radius: 0.125 },
        { leg: 1 },
      ]);
    const asked = Number(/shortest run is ([\d.]+)/.exec(run(0.2)[0]!.message)?.[1]);
    expect(asked).toBeGreaterThan(0.27);
    expect(run(asked)).toEqual([]);
    expect(run(asked - 0.00002).length).toBe(1);
  });
});

describe('material-unknown', () => {
  it('is a note for a name outside the table, and none for one inside or a material of its own', () => {
    expect(levelsOf(findingsOf('material-unknown', ANGLE, { material: 'unobtainable' }))).toEqual(['note']);
    expect(findingsOf('material-unknown', ANGLE, { material: '7075-T6' })).toEqual([]);
    expect(findingsOf('material-unknown', ANGLE, { material: { name: 'unobtainable' } })).toEqual([]);
  });
});

describe('mold-point-far', () => {
  it('speaks of a closed bend whose setback exceeds the shorter of its legs, not at it', () => {
    const back = 0.2 * Math.tan((75 * Math.PI) / 180);
    const at = (leg: number) =>
      findingsOf('mold-point-far', [{ leg, measure: 'flat' }, bendUp(150, 0.16), { leg: 5, measure: 'flat' }]);
    expect(at(back)).toEqual([]);
    expect(levelsOf(at(back - 0.001))).toEqual(['note']);
    expect(at(back - 0.001)[0]!.message).toContain('outside-edge');
  });

  it('is silent at 90° and below', () => {
    expect(findingsOf('mold-point-far', [{ leg: 0.1, measure: 'flat' }, bendUp(90, 0.16), { leg: 5 }])).toEqual([]);
  });
});

describe('joggle-run-steep', () => {
  it('speaks below three times the depth, or what the shop sets', () => {
    const at = (run: number, shop?: unknown) =>
      findingsOf(
        'joggle-run-steep',
        [{ leg: 1 }, { joggle: 0.1, run, turn: 'up', radius: 0.05 }, { leg: 1 }],
        {},
        shop,
      );
    expect(at(0.3)).toEqual([]);
    expect(levelsOf(at(0.2999))).toEqual(['caution']);
    expect(levelsOf(at(0.3, { limits: { joggleRun: 4 } }))).toEqual(['caution']);
    expect(at(0.4, { limits: { joggleRun: 4 } })).toEqual([]);
  });
});

describe('hole-edge-distance and hole-near-bend', () => {
  const hole = { leg: 0, diameter: 0.1, from: 'start', at: 0.5, across: 0.5 };
  const found = (code: string, more: object) => findingsOf(code, ANGLE, { width: 1, holes: [{ ...hole, ...more }] });

  it('want two diameters from the centre to every free edge', () => {
    expect(found('hole-edge-distance', { at: 0.2 })).toEqual([]);
    expect(levelsOf(found('hole-edge-distance', { at: 0.1999 }))).toEqual(['caution']);
    expect(found('hole-edge-distance', { across: 0.8 })).toEqual([]);
    expect(levelsOf(found('hole-edge-distance', { across: 0.8001 }))).toEqual(['caution']);
    expect(found('hole-edge-distance', { across: 1.5 })[0]!.message).toContain('off the blank');
  });

  it('want 1.5 T from the edge of a hole to a tangent line', () => {
    // The flat of leg 0 is 1.8; half a diameter and 1.5 T make 0.11.
    expect(found('hole-near-bend', { at: 1.69 })).toEqual([]);
    expect(levelsOf(found('hole-near-bend', { at: 1.6901 }))).toEqual(['caution']);
    expect(found('hole-near-bend', { leg: 1, at: 0.1101 })).toEqual([]);
    expect(levelsOf(found('hole-near-bend', { leg: 1, at: 0.1099 }))).toEqual(['caution']);
    expect(found('hole-near-bend', { at: 1.8 })[0]!.message).toContain('runs into a bend');
  });

  it('speak once a row', () => {
    expect(found('hole-near-bend', { at: 1.75, count: 3, pitch: 0.2 }).length).toBe(1);
  });
});

describe('nose-radius-mismatch', () => {
  const at = (factor: number, chosen = true) => {
    const [bend] = figuresOf(partOf(ANGLE, { material: '2024-T3' })).bends;
    const nose = chosen ? { nose: { radius: bend!.springback!.toolRadius * factor } } : {};
    return findingsOf('nose-radius-mismatch', ANGLE, { material: '2024-T3', ...nose });
  };

  it('speaks of a chosen nose more than a tenth off, either way', () => {
    expect(at(1)).toEqual([]);
    expect(at(1.0999)).toEqual([]);
    expect(levelsOf(at(1.1001))).toEqual(['caution']);
    expect(levelsOf(at(0.8999))).toEqual(['caution']);
    expect(at(0.9001)).toEqual([]);
    expect(at(1, false)).toEqual([]);
  });
});

describe('The findings of a part', () => {
  it('come with stops first, then cautions, then notes, each with a message and a source', () => {
    const solved = figuresOf(
      partOf([{ leg: 1 }, bendUp(90, 0.16), { leg: 0.3 }, bendDown(90, 0.16), { leg: 1 }], {
        grain: 'along',
        material: 'unobtainable',
        allowance: { method: 'k-factor', k: 0.9 },
      }),
    );
    expect(solved.findings.map(({ level, code }) => `${level} ${code}`)).toEqual([
      'stop leg-consumed',
      'caution grain-along-bend',
      'caution k-above-half',
      'note radius-not-checked',
      'note material-unknown',
    ]);
    for (const { message, source } of solved.findings) {
      expect(message.length).toBeGreaterThan(20);
      expect(source.length).toBeGreaterThan(5);
    }
  });

  it('of a consumed leg say how long it must be', () => {
    const [finding] = findingsOf('leg-consumed', [
      { leg: 1 },
      bendUp(90, 0.16),
      { leg: 0.3, name: 'Web' },
      bendUp(90, 0.16),
      { leg: 1 },
    ]);
    expect(finding!.message).toContain('Web is 0.3 in, but its bends take 0.4 in');
    expect(finding!.at).toBe('chain/2');
  });
});
