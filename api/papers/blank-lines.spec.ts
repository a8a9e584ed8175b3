import type { Solved } from '../../shared/result';
import { solve } from '../../shared/solve';
import { holeMarks } from './blank-lines';
import type { BlankPlan } from './blank-plan';

const result = solve({
  format: 'leafwright/1',
  unit: 'in',
  thickness: 0.04,
  width: 3,
  allowance: { method: 'handbook' },
  chain: [{ leg: 4 }],
  holes: [{ leg: 0, diameter: 0.25, from: 'start', at: 1, across: 0.5 }],
}) as Solved;

const planned = (across: BlankPlan['view']['across']): BlankPlan => ({
  view: {
    x: (station) => 100 + station * 25.4,
    left: 100,
    right: 201.6,
    roughLeft: 100,
    roughRight: 201.6,
    top: 50,
    bottom: 126.2,
    low: 0,
    high: 297,
    across,
  },
  scale: { factor: 1, text: '1:1' },
  stations: { shown: 'all', upward: false, labels: [], put: [], height: 0 },
  notes: { style: 'none', notes: [], put: [], height: 0 },
  sentences: [],
  length: 4,
});

describe('holeMarks', () => {
  it('puts a hole at its station, and across from the lower left corner, true to scale', () => {
    const [circle] = holeMarks(result, planned('true')).marks;
    expect(circle?.kind).toBe('circle');
    if (circle?.kind !== 'circle') return;
    expect(circle.centre.x).toBeCloseTo(125.4, 9);
    expect(circle.centre.y).toBeCloseTo(126.2 - 12.7, 9);
    expect(circle.radius).toBeCloseTo(3.175, 9);
  });

  it('draws no hole where the width is not to scale', () => {
    for (const across of ['broken', 'nominal', 'unknown'] as const) {
      expect(holeMarks(result, planned(across)).marks).toEqual([]);
    }
  });
});
