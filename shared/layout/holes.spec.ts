import { bendUp, figuresOf, partOf } from '../../tests/support/plain-part';

const chain = [{ leg: 1 }, bendUp(90, 0.16), { leg: 2 }, bendUp(60, 0.16), { leg: 1 }];
const stationOf = (hole: object): number =>
  figuresOf(partOf(chain, { holes: [{ diameter: 0.1, across: 0.5, at: 0.3, ...hole }] })).holes[0]!.station!;

describe('A hole on the blank', () => {
  const { legs, bends } = figuresOf(partOf(chain));

  it('lies from its tangent lines or mold points', () => {
    expect(stationOf({ leg: 1, from: 'start' })).toBeCloseTo(legs[1]!.start! + 0.3, 14);
    expect(stationOf({ leg: 1, from: 'end' })).toBeCloseTo(legs[1]!.end! - 0.3, 14);
    expect(stationOf({ leg: 1, from: 'mold-start' })).toBeCloseTo(legs[1]!.start! + 0.3 - 0.2, 14);
    expect(stationOf({ leg: 1, from: 'mold-end' })).toBeCloseTo(legs[1]!.end! + bends[1]!.setback! - 0.3, 14);
  });

  it('at a free end lies from the edge, whichever it is said to be', () => {
    expect(stationOf({ leg: 0, from: 'start' })).toBe(0.3);
    expect(stationOf({ leg: 0, from: 'mold-start' })).toBe(0.3);
    expect(stationOf({ leg: 2, from: 'mold-end' })).toBeCloseTo(legs[2]!.end! - 0.3, 14);
  });

  it('row runs along the width, one result a hole', () => {
    const row = { leg: 0, diameter: 0.1, from: 'start', at: 0.3, across: 0.5, count: 3, pitch: 0.75 };
    const { holes } = figuresOf(partOf(chain, { holes: [row, { ...row, count: 1 }] }));
    expect(holes.map((hole) => hole.across)).toEqual([0.5, 1.25, 2, 0.5]);
    expect(holes.map((hole) => hole.hole)).toEqual([0, 0, 0, 1]);
    expect(holes.every((hole) => hole.station === 0.3)).toBeTrue();
  });

  it('has no station where its leg has none', () => {
    const broken = [{ leg: 1 }, bendUp(90, 0.16), { leg: 0.1 }, bendUp(60, 0.16), { leg: 1 }];
    const hole = { leg: 2, diameter: 0.1, from: 'start', at: 0.3, across: 0.5 };
    expect(figuresOf(partOf(broken, { holes: [hole] })).holes[0]!.station).toBeNull();
  });
});
