import { bendDown, bendUp, codesOf, figuresOf, partOf } from '../../tests/support/plain-part';
import { randomPart } from '../../tests/support/random-chains';
import { randomFrom, SEED } from '../../tests/support/seed';
import { type Curve, distance, ends, segment } from '../geometry/curve';
import { TOUCHING } from '../geometry/tolerance';
import { layOut } from '../layout/lay-out';
import type { PartDocument } from '../part/document';
import { evaluateDocument } from '../part/evaluate';
import type { XY } from '../result';
import { crossingsOf } from './crossings';
import { extent } from './envelope';
import { sides } from './faces';
import { formSolids, type Solid } from './solid';

const crossed = (chain: readonly unknown[], more: Record<string, unknown> = {}): string[] =>
  figuresOf(partOf(chain, more)).findings.flatMap(({ code, at }) => (code === 'legs-cross' ? [at] : []));

/** Sheet bent round a rectangle until its last leg comes back to the first: `gap` is what is left between the two. */
function closedBox(gap: number): readonly unknown[] {
  const legs = [2, 1, 2, 1 - gap - 0.04];
  return legs.flatMap((leg, i) => (i === 0 ? [{ leg }] : [bendUp(90, 0.1), { leg }]));
}

describe('Where the formed part runs into itself', () => {
  it('an open section does not', () => {
    expect(crossed([{ leg: 1 }, bendUp(90, 0.16), { leg: 2 }, bendUp(90, 0.16), { leg: 1 }])).toEqual([]);
    expect(crossed([{ leg: 5 }])).toEqual([]);
  });

  it('a box whose last leg stops short does not, one that touches does', () => {
    expect(crossed(closedBox(0.01))).toEqual([]);
    expect(crossed(closedBox(1e-6))).toEqual([]);
    expect(crossed(closedBox(0))).toEqual(['chain/0 chain/6']);
    expect(crossed(closedBox(-0.01))).toEqual(['chain/0 chain/6']);
  });

  it('two flanges that lean into each other do, and name the two', () => {
    const chain = [{ leg: 2 }, bendUp(120, 0.1), { leg: 1.2 }, bendUp(120, 0.1), { leg: 2 }];
    const solved = figuresOf(partOf(chain));
    const [finding] = solved.findings.filter((candidate) => candidate.code === 'legs-cross');
    expect(finding!.level).toBe('stop');
    expect(finding!.message).toContain('Leg 1');
    expect(finding!.message).toContain('Leg 3');
    expect(solved.section).toBeNull();
    expect(solved.developedLength).not.toBeNull();
    expect(solved.formed).not.toBeNull();
  });

  it('neighbours do not, sharp or round, to any angle below 180°', () => {
    for (const radius of [0, 0.001, 0.2]) {
      for (const angle of [1, 45, 90, 135, 179]) {
        const sharp = [{ leg: 9 }, bendUp(angle, radius), { leg: 9, measure: 'flat' }];
        expect(crossed(sharp)).withContext(`${angle}°, R ${radius}`).toEqual([]);
        const down = [{ leg: 9 }, bendDown(angle, radius), { leg: 9, measure: 'flat' }];
        expect(crossed(down)).withContext(`${angle}° down, R ${radius}`).toEqual([]);
      }
    }
  });

  it('a closed hem does, an open one does not', () => {
    const outside = { leg: 1, measure: 'outside-edge' };
    expect(crossed([outside, bendUp(180, 0), outside])).toEqual(['chain/0 chain/2']);
    expect(crossed([outside, bendUp(180, 1e-6), outside])).toEqual([]);
    expect(crossed([outside, bendUp(180, 0.1), outside])).toEqual([]);
  });

  it('a leg inside a wide bend is found though no faces meet', () => {
    const inside: Solid = { kind: 'bar', start: [-0.9, 0.1], heading: 90, length: 0.1, leg: 1, chain: 4 };
    const wide: Solid = {
      kind: 'sector',
      centre: [0, 0],
      inner: 0.2,
      outer: 2,
      from: 90,
      sweep: 180,
      bend: 0,
      chain: 1,
      heading: 0,
      start: [0, 2],
    };
    const far: Solid = { kind: 'bar', start: [9, 9], heading: 0, length: 1, leg: 0, chain: 2 };
    expect(crossingsOf([wide, far, { ...far, start: [19, 9], chain: 3 }, inside], 0.04)).toEqual([[1, 4]]);
    expect(crossingsOf([inside, far, { ...far, start: [19, 9] }, wide], 0.04).length).toBe(1);
  });

  it('a scroll that winds inward does not until it meets itself', () => {
    const scroll = (legs: readonly number[]): readonly unknown[] =>
      legs.flatMap((leg, i) => (i === 0 ? [{ leg }] : [bendUp(90, 0.05), { leg }]));
    expect(crossed(scroll([2, 2, 2, 1.8, 1.8, 1.6, 1.6, 1.4]))).toEqual([]);
    expect(crossed(scroll([2, 2, 2, 2, 1.8, 1.6, 1.6])).length).toBeGreaterThan(0);
  });

  it('is asked of every pair: the same as all against all, on random chains', () => {
    const random = randomFrom(SEED);
    let found = 0;
    for (let i = 0; i < 200; i += 1) {
      const { document, thickness } = randomPart(random);
      const solids = solidsOf(document, thickness);
      const swept = crossingsOf(solids, thickness);
      found += swept.length;
      expect(swept).withContext(`seed ${SEED}, case ${i}`).toEqual(allAgainstAll(solids, thickness));
    }
    expect(found).toBeGreaterThan(20);
  });

  it('a part of 200 bends is judged in a second', () => {
    const zigzag = Array.from({ length: 200 }, (_, i) => [
      { leg: 5, measure: 'flat' },
      i % 2 === 0 ? bendUp(179, 0.02) : bendDown(179, 0.02),
    ]).flat();
    const began = performance.now();
    const solved = figuresOf(partOf([...zigzag, { leg: 5, measure: 'flat' }]));
    expect(performance.now() - began).toBeLessThan(5000);
    expect(solved.bends.length).toBe(200);
    expect(codesOf(solved)).toBeDefined();
  });
});

function solidsOf(document: PartDocument, thickness: number): readonly Solid[] {
  const evaluation = evaluateDocument(document);
  if (!evaluation.ok) throw new Error(JSON.stringify(evaluation.errors));
  return formSolids(layOut(evaluation.figures).pieces!, thickness);
}

function boundary(solid: Solid, thickness: number): readonly Curve[] {
  const [upper, lower] = sides(solid, thickness);
  return [upper, lower, segment(ends(upper)[0], ends(lower)[0]), segment(ends(upper)[1], ends(lower)[1])];
}

/** Inside by winding number over the boundary cut fine: another way than the engine's. */
function isInside([px, py]: XY, solid: Solid, thickness: number): boolean {
  const [upper, lower] = sides(solid, thickness);
  const cut = (curve: Curve): XY[] => {
    if (curve.kind === 'segment') return [...ends(curve)];
    return Array.from({ length: 181 }, (_, i): XY => {
      const angle = ((curve.from + (curve.sweep * i) / 180) * Math.PI) / 180;
      return [curve.centre[0] + curve.radius * Math.cos(angle), curve.centre[1] + curve.radius * Math.sin(angle)];
    });
  };
  const outline = [...cut(upper), ...cut(lower).reverse()];
  return outline.reduce((inside, [x0, y0], i) => {
    const [x1, y1] = outline[(i + 1) % outline.length]!;
    return y0 > py !== y1 > py && px < x0 + ((py - y0) * (x1 - x0)) / (y1 - y0) ? !inside : inside;
  }, false);
}

function allAgainstAll(solids: readonly Solid[], thickness: number): (readonly [number, number])[] {
  const outlines = solids.map((solid) => boundary(solid, thickness));
  const [x0, y0, x1, y1] = extent(outlines.flat());
  const near = TOUCHING * Math.max(x1 - x0, y1 - y0);
  const found: [number, number][] = [];
  for (let i = 0; i < solids.length; i += 1) {
    for (let j = i + 2; j < solids.length; j += 1) {
      const between = solids[i + 1]!;
      if (j === i + 2 && between.kind === 'sector' && Math.abs(between.sweep) < 180) continue;
      const meets = outlines[i]!.some((a) => outlines[j]!.some((b) => distance(a, b) < near));
      const within =
        isInside(ends(outlines[j]![0]!)[0], solids[i]!, thickness) ||
        isInside(ends(outlines[i]![0]!)[0], solids[j]!, thickness);
      if (meets || within) found.push([solids[i]!.chain, solids[j]!.chain]);
    }
  }
  return found;
}
