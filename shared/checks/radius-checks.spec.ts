import { findingsOf, levelsOf } from '../../tests/support/findings';
import { bendUp } from '../../tests/support/plain-part';

const ANGLE = [{ leg: 2 }, bendUp(90, 0.16), { leg: 2 }];

describe('grain-along-bend', () => {
  it('comes once a part with bends, when the grain is known to run along them', () => {
    const two = [...ANGLE, bendUp(45, 0.16), { leg: 2 }];
    expect(levelsOf(findingsOf('grain-along-bend', two, { grain: 'along' }))).toEqual(['caution']);
    expect(findingsOf('grain-along-bend', two, { grain: 'across' })).toEqual([]);
    expect(findingsOf('grain-along-bend', two)).toEqual([]);
    expect(findingsOf('grain-along-bend', [{ leg: 2 }], { grain: 'along' })).toEqual([]);
  });

  it('is a note where every radius meets the along-grain figure', () => {
    // 2024-T3 at 0.040 reads 4 T in the stricter table; along the grain 1.5 times that, 0.24.
    const along = (radius: number) =>
      levelsOf(
        findingsOf('grain-along-bend', [{ leg: 2 }, bendUp(90, radius), { leg: 2 }], {
          grain: 'along',
          material: '2024-T3',
        }),
      );
    expect(along(0.24)).toEqual(['note']);
    expect(along(0.2399)).toEqual(['caution']);
  });
});

describe('radius-below-minimum', () => {
  const at = (radius: number, more: Record<string, unknown> = {}, shop?: unknown) =>
    findingsOf(
      'radius-below-minimum',
      [{ leg: 2 }, bendUp(90, radius), { leg: 2 }],
      { material: '2024-T3', ...more },
      shop,
    );

  it('goes by AC 43.13-1B where the shop says so: a caution below the range, a note inside it, nothing above', () => {
    const shop = { radiusRule: 'AC 43.13-1B' };
    expect(levelsOf(at(0.1199, {}, shop))).toEqual(['caution']);
    expect(levelsOf(at(0.12, {}, shop))).toEqual(['note']);
    expect(levelsOf(at(0.1999, {}, shop))).toEqual(['note']);
    expect(at(0.2, {}, shop)).toEqual([]);
    expect(at(0.1199, {}, shop)[0]!.source).toContain('AC 43.13-1B');
    // Where tables differ, all are shown.
    expect(at(0.1199, {}, shop)[0]!.message).toContain('Aluminum Association: 4 T');
  });

  it('goes by the Aluminum Association where the shop says so', () => {
    const shop = { radiusRule: 'Aluminum Association' };
    expect(levelsOf(at(0.1599, {}, shop))).toEqual(['caution']);
    expect(at(0.16, {}, shop)).toEqual([]);
  });

  it('by default goes by the stricter of the two: 4 T from the one, up to 5 T from the other', () => {
    expect(levelsOf(at(0.1599))).toEqual(['caution']);
    expect(at(0.1599)[0]!.source).toContain('Aluminum Association');
    expect(levelsOf(at(0.16))).toEqual(['note']);
    expect(levelsOf(at(0.1999))).toEqual(['note']);
    expect(at(0.2)).toEqual([]);
  });

  it('reads a thickness between two columns in the thicker one', () => {
    const shop = { radiusRule: 'AC 43.13-1B' };
    expect(levelsOf(at(2 * 0.032, { thickness: 0.032 }, shop))).toEqual(['note']);
    expect(levelsOf(at(2 * 0.034, { thickness: 0.034 }, shop))).toEqual(['caution']);
    expect(levelsOf(at(3 * 0.034, { thickness: 0.034 }, shop))).toEqual(['note']);
  });

  it('asks 1.5 times as much along the grain', () => {
    expect(levelsOf(at(0.2399, { grain: 'along' }))).toEqual(['caution']);
    expect(levelsOf(at(0.24, { grain: 'along' }))).toEqual(['note']);
    expect(at(0.3, { grain: 'along' })).toEqual([]);
  });

  it('reads a table by gage, and says that it is known at second hand, where no other has a row', () => {
    const of = (radius: number, material: string) => at(radius, { material });
    expect(levelsOf(of(0.2199, '7075-T6'))).toEqual(['caution']);
    expect(of(0.2199, '7075-T6')[0]!.message).toContain('second hand');
    expect(of(0.22, '7075-T6')).toEqual([]);
    expect(levelsOf(of(0.1249, '6061-T6'))).toEqual(['caution']);
    expect(of(0.125, '6061-T6')).toEqual([]);
  });

  it('says nothing of a material or a thickness that no table holds', () => {
    expect(at(0, { material: 'unobtainable' })).toEqual([]);
    expect(at(0, { material: undefined })).toEqual([]);
    expect(at(0.01, { thickness: 0.9 })).toEqual([]);
  });
});

describe('radius-not-checked', () => {
  const at = (more: Record<string, unknown>, chain: unknown[] = [{ leg: 2 }, bendUp(90, 0.16), { leg: 2 }]) =>
    findingsOf('radius-not-checked', chain, more);

  it('is a note where no table speaks, once a part, and says why', () => {
    expect(levelsOf(at({ material: 'unobtainable' }))).toEqual(['note']);
    expect(at({ material: 'unobtainable' })[0]!.message).toContain('unobtainable');
    expect(at({ material: undefined })[0]!.message).toContain('no material is named');
    expect(levelsOf(at({ material: '2024-T3', thickness: 0.9 }))).toEqual(['note']);
  });

  it('is silent where a table speaks, and on a strip without bends', () => {
    expect(at({ material: '2024-T3' })).toEqual([]);
    expect(at({ material: undefined }, [{ leg: 2 }])).toEqual([]);
  });
});
