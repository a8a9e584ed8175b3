import { gardiner } from './gardiner';

const ALLOY = { name: 'alloy', modulus: 73000, yield: 345 };

/** Ri → Rf by the relation itself. */
const forward = (tool: number, thickness: number, { modulus, yield: stress }: typeof ALLOY): number => {
  const x = (tool * stress) / (modulus * thickness);
  return tool / (4 * x ** 3 - 3 * x + 1);
};

describe('Springback', () => {
  it('gives a tool radius that springs back to the finished one, soft or hard, sharp or wide', () => {
    for (const stress of [30, 345, 1000, 1900]) {
      for (const radius of [0.001, 0.03, 0.125, 1, 10, 100]) {
        const material = { ...ALLOY, yield: stress };
        const { toolRadius } = gardiner(90, radius, 0.04, material)!;
        expect(forward(toolRadius, 0.04, material) / radius)
          .withContext(`${stress} MPa, R ${radius}`)
          .toBeCloseTo(1, 9);
        expect(toolRadius).toBeLessThan(radius);
        expect((toolRadius * stress) / (material.modulus * 0.04)).toBeLessThan(0.5);
      }
    }
  });

  it('swings past the finished angle so that the length at mid-thickness stays', () => {
    const { toolRadius, toolAngle } = gardiner(90, 0.125, 0.04, ALLOY)!;
    expect(toolAngle * (toolRadius + 0.02)).toBeCloseTo(90 * (0.125 + 0.02), 11);
    expect(toolAngle).toBeGreaterThan(90);
  });

  it('of a sharp bend is none: the tool is as sharp and the angle stays', () => {
    expect(gardiner(90, 0, 0.04, ALLOY)).toEqual({ method: 'gardiner', toolRadius: 0, toolAngle: 90 });
  });

  it('is not told without modulus and yield', () => {
    expect(gardiner(90, 0.1, 0.04, null)).toBeNull();
    expect(gardiner(90, 0.1, 0.04, { name: 'x', modulus: 73000 })).toBeNull();
    expect(gardiner(90, 0.1, 0.04, { name: 'x', yield: 345 })).toBeNull();
  });
});
