import { bendUp, codesOf, figuresOf, partOf } from '../../tests/support/plain-part';
import { joggle } from './joggle';

const DEGREE = Math.PI / 180;

/** Walks along mid-thickness: arc, straight, arc back. What comes out is the run and the step. */
function walk(angle: number, straight: number, radius: number, thickness: number): { run: number; depth: number } {
  const middle = radius + thickness / 2;
  const steps = 20_000;
  let [x, y, heading] = [0, 0, 0];
  const go = (length: number, turn: number): void => {
    for (let i = 0; i < steps; i += 1) {
      heading += turn / steps / 2;
      x += (Math.cos(heading) * length) / steps;
      y += (Math.sin(heading) * length) / steps;
      heading += turn / steps / 2;
    }
  };
  go(middle * angle * DEGREE, angle * DEGREE);
  x += Math.cos(heading) * straight;
  y += Math.sin(heading) * straight;
  go(middle * angle * DEGREE, -angle * DEGREE);
  return { run: x, depth: y };
}

function shapeOf(depth: number, run: number, radius: number, thickness: number): { angle: number; straight: number } {
  const shape = joggle(depth, run, radius, thickness);
  if (!shape.ok) throw new Error(`shortest run ${shape.shortestRun}`);
  return shape;
}

describe('A joggle', () => {
  it('has the angle and straight of its closed form', () => {
    const { angle, straight } = shapeOf(0.04, 0.25, 0.125, 0.04);
    expect(angle).toBeCloseTo(10.109, 3);
    expect(straight).toBeCloseTo(0.2022, 4);
  });

  it('comes out with its run and depth when walked step by step', () => {
    const cases = [
      [0.04, 0.25, 0.125, 0.04],
      [0.3, 0.4, 0.1, 0.05],
      [0.5, 0.31, 0.1, 0.05],
      [2, 0.5, 0.1, 0.05],
      [0.001, 3, 0.2, 0.02],
      [0.06, 0.12, 0, 0.06],
    ] as const;
    for (const [depth, run, radius, thickness] of cases) {
      const { angle, straight } = shapeOf(depth, run, radius, thickness);
      const walked = walk(angle, straight, radius, thickness);
      expect(walked.run).withContext(`${depth} over ${run}`).toBeCloseTo(run, 7);
      expect(walked.depth).withContext(`${depth} over ${run}`).toBeCloseTo(depth, 7);
    }
  });

  it('no deeper than its radii allows the shortest run √(2ρD − D²), and nothing shorter', () => {
    const [radius, thickness] = [0.2, 0.1];
    for (let i = 1; i <= 10; i += 1) {
      const depth = i * 0.05;
      const shortest = Math.sqrt(2 * 0.5 * depth - depth * depth);
      const label = `depth ${depth}`;
      expect(joggle(depth, shortest, radius, thickness).ok)
        .withContext(label)
        .toBeTrue();
      const tight = joggle(depth, shortest * (1 - 1e-9), radius, thickness);
      expect(tight.ok).withContext(label).toBeFalse();
      if (!tight.ok) expect(tight.shortestRun).withContext(label).toBeCloseTo(shortest, 12);
    }
  });

  it('deeper than its radii bends 90° at most: the shortest run is ρ', () => {
    const at = shapeOf(0.6, 0.5, 0.2, 0.1);
    expect(at.angle).toBeCloseTo(90, 10);
    expect(at.straight).toBeCloseTo(0.1, 12);
    const tight = joggle(0.6, 0.5 - 1e-9, 0.2, 0.1);
    expect(tight).toEqual({ ok: false, shortestRun: 0.5 });
  });

  it('at its shortest run has no straight, and its two bends do not cross each other', () => {
    for (const radius of [0.2, 0]) {
      const rho = 2 * radius + 0.1;
      const run = Math.sqrt(2 * rho * 0.08 - 0.08 * 0.08);
      const solved = figuresOf(
        partOf([{ leg: 100 }, { joggle: 0.08, run, turn: 'up', radius }, { leg: 1 }], { thickness: 0.1 }),
      );
      expect(codesOf(solved)).not.toContain('legs-cross');
      expect(codesOf(solved)).not.toContain('joggle-run-too-short');
      expect(solved.joggles[0]!.straight).toBe(0);
      expect(solved.section).not.toBeNull();
    }
  });
});

describe('A joggle a hair longer than its shortest run, in a long part', () => {
  it('has next to no straight, and its two bends still do not cross each other', () => {
    const run = Math.sqrt(2 * 0.5 * 0.08 - 0.08 * 0.08) * (1 + 1e-12);
    const chain = [{ leg: 5000 }, { joggle: 0.08, run, turn: 'up', radius: 0.2 }, { leg: 1 }];
    const solved = figuresOf(partOf(chain, { thickness: 0.1 }));
    expect(solved.joggles[0]!.straight!).toBeGreaterThan(0);
    expect(solved.joggles[0]!.straight!).toBeLessThan(1e-6);
    expect(codesOf(solved)).not.toContain('legs-cross');
  });
});

describe('A joggle in the layout', () => {
  const chain = [{ leg: 1 }, { joggle: 0.04, run: 0.25, turn: 'down', radius: 0.125 }, { leg: 2, measure: 'inside' }];

  it('gives two bends of opposite turns and the straight between them', () => {
    const { bends, joggles, legs, developedLength, formed } = figuresOf(partOf(chain));
    expect(joggles[0]).toEqual(jasmine.objectContaining({ chain: 1, offset: 0.04, run: 0.25, bends: [0, 1] }));
    expect(bends.map((bend) => bend.turn)).toEqual(['down', 'up']);
    expect(bends.map((bend) => bend.joggle)).toEqual([0, 0]);
    expect(bends[1]!.tangentStart! - bends[0]!.tangentEnd!).toBeCloseTo(joggles[0]!.straight!, 14);
    expect(legs.length).toBe(2);
    expect(developedLength).toBeCloseTo(3 + 2 * bends[0]!.allowance + joggles[0]!.straight!, 12);
    const last = formed!.faces!.lower.at(-1)!;
    const [from] = 'line' in last ? last.line : [[0, 0]];
    expect(from[0]).toBeCloseTo(1.25, 12);
    expect(from[1]).toBeCloseTo(-0.04, 12);
  });

  it('measures the ends of its legs flat whatever they say, and says so', () => {
    const { legs } = figuresOf(partOf([{ leg: 1 }, bendUp(90, 0.1), ...chain.slice(0, 3)]));
    expect(legs.map((leg) => leg.measure)).toEqual([
      ['mold-line', 'mold-line'],
      ['mold-line', 'flat'],
      ['flat', 'inside'],
    ]);
    expect(legs[1]!.setback[1]).toBe(0);
    expect(legs[2]!.flat).toBe(2);
  });

  it('that can not be made leaves its own figures and those after it open', () => {
    const solved = figuresOf(partOf([chain[0], { joggle: 0.04, run: 0.05, turn: 'up', radius: 0.125 }, chain[2]]));
    expect(codesOf(solved)).toEqual(['joggle-run-too-short']);
    expect(solved.joggles[0]).toEqual({ chain: 1, offset: 0.04, run: 0.05, angle: null, straight: null, bends: null });
    expect([solved.developedLength, solved.formed, solved.section, solved.legs[1]!.start]).toEqual([
      null,
      null,
      null,
      null,
    ]);
    expect(solved.bends).toEqual([]);
  });
});
