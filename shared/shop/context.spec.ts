import { COMMON_PRACTICE, HOLE_EDGE, restoreShop } from './context';

const pathsOf = (value: unknown): string[] => {
  const restored = restoreShop(value);
  return restored.ok ? [] : restored.errors.map((error) => error.path);
};

describe('The shop context', () => {
  it('that says nothing leaves the limits of common practice in force, and the stricter of the tables', () => {
    for (const nothing of [undefined, {}]) {
      const restored = restoreShop(nothing);
      expect(restored.ok && restored.rules).toEqual({
        radiusRule: 'stricter',
        limits: { ...COMMON_PRACTICE, holeEdge: HOLE_EDGE },
      });
    }
  });

  it('changes what it names and leaves the rest', () => {
    const restored = restoreShop({ radiusRule: 'Aluminum Association', limits: { joggleRun: 5, holeEdge: undefined } });
    expect(restored.ok && restored.rules.radiusRule).toBe('Aluminum Association');
    expect(restored.ok && restored.rules.limits).toEqual({ ...COMMON_PRACTICE, holeEdge: HOLE_EDGE, joggleRun: 5 });
  });

  it('takes limits above 0 and up to 1000', () => {
    const at = (joggleRun: unknown): string[] => pathsOf({ limits: { joggleRun } });
    expect(at(0.001)).toEqual([]);
    expect(at(1000)).toEqual([]);
    for (const wrong of [0, -1, 1000.1, NaN, '3', null]) {
      expect(at(wrong)).withContext(String(wrong)).toEqual(['shop/limits/joggleRun']);
    }
  });

  it('is refused with paths that begin with "shop"', () => {
    expect(pathsOf(null)).toEqual(['shop']);
    expect(pathsOf([])).toEqual(['shop']);
    expect(pathsOf({ colour: 1 })).toEqual(['shop/colour']);
    expect(pathsOf({ limits: { colour: 1 } })).toEqual(['shop/limits/colour']);
    expect(pathsOf({ radiusRule: 'mine' })).toEqual(['shop/radiusRule']);
  });
});
