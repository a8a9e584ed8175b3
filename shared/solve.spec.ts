import * as fc from 'fast-check';
import { randomPart } from '../tests/support/random-chains';
import { bendUp, figuresOf, partOf } from '../tests/support/plain-part';
import { randomFrom, SEED } from '../tests/support/seed';
import { ENGINE_VERSION, solve } from './solve';

const WHOLE = partOf(
  [
    { id: 'a', leg: 'W/2', name: 'Flange', measure: ['flat', 'outside-edge'] },
    { id: 'b', ...bendUp(90, '1/8'), allowance: { method: 'measured', allowance: 0.2 }, nose: { radius: 0.1 } },
    { leg: 'W' },
    { joggle: 0.04, run: '0.3 in', turn: 'down', radius: 0.1 },
    { leg: 1.5 },
  ],
  {
    variables: { W: '2' },
    material: '2024-T3',
    width: '6',
    grain: 'along',
    seat: 1,
    nose: { radius: 0.12 },
    trim: { start: 0.25 },
    tolerances: { length: [0.01, 0.01] },
    hand: 'opposite',
    holes: [{ leg: 1, diameter: 0.128, from: 'mold-start', at: 0.6, across: 0.5, count: 2, pitch: 1 }],
    dashNumbers: [{ dash: '-1', variables: { W: 3 } }],
  },
);

/** No NaN, no infinity, no undefined anywhere in an answer. */
function faultIn(value: unknown, path = ''): string | null {
  if (typeof value === 'number') return Number.isFinite(value) ? null : `${path}: ${value}`;
  if (value === undefined || typeof value === 'function') return `${path}: ${typeof value}`;
  if (typeof value !== 'object' || value === null) return null;
  for (const [key, inner] of Object.entries(value)) {
    const fault = faultIn(inner, `${path}/${key}`);
    if (fault !== null) return fault;
  }
  return null;
}

function deepFreeze<T>(value: T): T {
  if (typeof value === 'object' && value !== null) {
    Object.values(value).forEach(deepFreeze);
    Object.freeze(value);
  }
  return value;
}

const isAnswer = (document: unknown, shop?: unknown): boolean => {
  const result = solve(document, shop);
  if (!result.ok) return result.errors.length > 0 && result.errors.every(({ message }) => message.length > 0);
  return faultIn(result) === null;
};

describe('solve', () => {
  it('answers a part with everything in it', () => {
    const solved = figuresOf(WHOLE);
    expect(faultIn(solved)).toBeNull();
    expect(solved.bends.map((bend) => bend.turn)).toEqual(['down', 'up', 'down']);
    expect(solved.holes.length).toBe(2);
    expect(solved.bends.map((bend) => bend.noseRadius)).toEqual([0.1, 0.12, 0.12]);
    expect(solved.formed!.envelope!.seat).toBe(1);
    expect(ENGINE_VERSION).toMatch(/^\d+\.\d+\.\d+$/);
  });

  it('changes nothing that it is given', () => {
    const frozen = deepFreeze(structuredClone(WHOLE));
    const shop = deepFreeze({ limits: { joggleRun: 4 } });
    expect(solve(frozen, shop).ok).toBeTrue();
    expect(frozen).toEqual(WHOLE);
    const random = randomFrom(SEED);
    for (let i = 0; i < 50; i += 1) expect(solve(deepFreeze(randomPart(random).document)).ok).toBeTrue();
  });

  it('answers alike for a document and for its copy as JSON, twice over', () => {
    const text = JSON.stringify(solve(WHOLE));
    expect(JSON.stringify(solve(JSON.parse(JSON.stringify(WHOLE))))).toBe(text);
    expect(JSON.stringify(solve(WHOLE))).toBe(text);
  });

  it('refuses a broken shop context with a path, and takes none', () => {
    expect(solve(WHOLE, {}).ok).toBeTrue();
    for (const shop of [null, 5, { limits: { joggleRun: 0 } }, { colour: 1 }, { radiusRule: 'mine' }]) {
      const result = solve(WHOLE, shop);
      expect(result.ok ? 'taken' : result.errors[0]!.path.split('/')[0]).toBe('shop');
    }
  });

  it('never throws and never gives a figure that is none, on garbage of any kind', () => {
    fc.assert(
      fc.property(
        fc.anything({ withBigInt: true, withDate: true, withSparseArray: true, withNullPrototype: true }),
        (value) => isAnswer(value),
      ),
      { seed: SEED, numRuns: 1000 },
    );
    expect(SEED).toBeGreaterThanOrEqual(0);
  });

  it('nor on a document with one field replaced, doubled or removed', () => {
    const places = pathsIn(JSON.parse(JSON.stringify(WHOLE)));
    const value = fc.oneof(
      fc.anything({ withSparseArray: true }),
      fc.double(),
      fc.constantFrom<unknown>(
        0,
        -1,
        1e-300,
        1e300,
        1e6,
        '1/0',
        'W',
        '-W',
        '1e308 * 10',
        180,
        '180',
        [],
        {},
        null,
        undefined,
        'up',
        'inside',
      ),
    );
    fc.assert(
      fc.property(fc.constantFrom(...places), value, fc.boolean(), (place, replacement, removed) => {
        const document = JSON.parse(JSON.stringify(WHOLE)) as Record<string, unknown>;
        const holder = place.slice(0, -1).reduce<unknown>((at, key) => (at as Record<string, unknown>)[key], document);
        const key = place.at(-1)!;
        if (removed) Reflect.deleteProperty(holder as object, key);
        else (holder as Record<string, unknown>)[key] = replacement;
        return isAnswer(document);
      }),
      { seed: SEED, numRuns: 3000 },
    );
    expect(places.length).toBeGreaterThan(60);
  });

  it('nor on sizes that are apart by hundreds of powers of ten', () => {
    const size = fc.oneof(
      fc.constantFrom(1e-320, 1e-200, 1e-100, 1e-12, 1, 999999, 1e6),
      fc.double({ min: 1e-310, max: 1e6, noNaN: true }),
    );
    const angle = fc.oneof(
      fc.constantFrom(1e-300, 1e-9, 90, 179.9999999999, 180),
      fc.double({ min: 1e-9, max: 180, noNaN: true }),
    );
    const material = fc.record({ name: fc.constant('x'), density: size, modulus: size, yield: size });
    fc.assert(
      fc.property(
        size,
        fc.array(fc.tuple(size, angle, size), { minLength: 1, maxLength: 5 }),
        material,
        (thickness, pieces, own) => {
          const chain = pieces.flatMap(([leg, bend, radius]) => [{ leg, measure: 'flat' }, bendUp(bend, radius)]);
          return isAnswer(partOf([...chain, { leg: 1, measure: 'flat' }], { thickness, material: own, width: 1 }));
        },
      ),
      { seed: SEED, numRuns: 2000 },
    );
    expect(SEED).toBeGreaterThanOrEqual(0);
  });

  it('holds the figures of the 6 × 8 angle in the form that every door prints', () => {
    const solved = figuresOf(partOf([{ leg: 6 }, bendUp(90, 0.125), { leg: 8 }], { width: 6, material: '2024-T3' }));
    expect(solved.blank.length).toBe(solved.developedLength);
    expect(solved.bends[0]!.kFactor).toBeCloseTo(0.4427, 4);
    expect(solved.bends[0]!.deduction).toBeCloseTo(0.1058, 4);
    expect(solved.bends[0]!.centre).toBeCloseTo(5.947, 3);
    expect(solved.blank.mass!.value).toBeCloseTo(0.333, 3);
    expect(solved.section!.area).toBeCloseTo((5.835 + 7.835) * 0.04 + (Math.PI / 4) * (0.165 ** 2 - 0.125 ** 2), 12);
    expect(solved.bends[0]!.springback!.method).toBe('gardiner');
  });
});

/** The path of every field, at every depth. */
function pathsIn(value: unknown, at: readonly string[] = []): (readonly string[])[] {
  if (typeof value !== 'object' || value === null) return [];
  return Object.entries(value).flatMap(([key, inner]) => [[...at, key], ...pathsIn(inner, [...at, key])]);
}
