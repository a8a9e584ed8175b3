import { layOut } from '../layout/lay-out';
import type { PartDocument } from '../part/document';
import { evaluateDocument } from '../part/evaluate';
import { partlyFormed, type Progress } from './partly-formed';
import { formSolids, type Solid } from './solid';
import { extent } from './envelope';
import { sides } from './faces';

const T = 0.04;
const DOCUMENT: PartDocument = {
  format: 'leafwright/1',
  unit: 'in',
  thickness: T,
  allowance: { method: 'handbook' },
  chain: [
    { leg: 1 },
    { bend: 90, turn: 'up', radius: 0.16 },
    { leg: 2 },
    { bend: 90, turn: 'down', radius: 0.16 },
    { leg: 1 },
  ],
};

const evaluated = evaluateDocument(DOCUMENT);
if (!evaluated.ok) throw new Error('the document is sound');
const { bends, pieces, developedLength } = layOut(evaluated.figures);

const at = (progress: Progress): readonly Solid[] => partlyFormed(pieces!, bends, T, progress);
const box = (solids: readonly Solid[]): readonly number[] => extent(solids.flatMap((solid) => sides(solid, T)));

describe('a partly formed part', () => {
  it('is the flat blank before the first bend', () => {
    const [x0, y0, x1, y1] = box(at({ done: new Set() }));
    expect([x0, y0, y1]).toEqual([0, 0, T]);
    expect(x1).toBeCloseTo(developedLength!, 12);
  });

  it('is the finished part after the last', () => {
    expect(at({ done: new Set([0, 1]) })).toEqual(formSolids(pieces!, T));
  });

  it('keeps the flat length of a bend that is not made yet', () => {
    const solids = at({ done: new Set([0]) });
    const flat = solids.filter((solid) => solid.kind === 'bar' && solid.leg === null);
    expect(flat.map((solid) => solid.kind === 'bar' && solid.length)).toEqual([bends[1]!.allowance]);
  });

  it('wraps the nose over the angle so far, and leaves the rest straight on the leaf side', () => {
    const swinging = { bend: 0, angle: 30, leafSide: 'end' as const };
    const solids = at({ done: new Set(), swinging });
    const [, arc, rest] = solids;
    expect(arc?.kind === 'sector' && arc.sweep).toBe(30);
    expect(rest?.kind === 'bar' && rest.length).toBeCloseTo((bends[0]!.allowance * 2) / 3, 12);
    const other = at({ done: new Set(), swinging: { ...swinging, leafSide: 'start' } });
    expect(other.slice(1, 3).map(({ kind }) => kind)).toEqual(['bar', 'sector']);
  });

  it('goes from flat to formed without a jump', () => {
    const swing = (angle: number): readonly number[] =>
      box(at({ done: new Set([1]), swinging: { bend: 0, angle, leafSide: 'end' } }));
    expect(swing(0)).toEqual(box(at({ done: new Set([1]) })) as number[]);
    expect(swing(90)).toEqual(box(at({ done: new Set([0, 1]) })) as number[]);
    expect(swing(95)).toEqual(swing(90) as number[]);
    swing(1e-9).forEach((side, i) => expect(side).toBeCloseTo(swing(0)[i]!, 6));
  });
});
