import type { PartDocument } from '@shared/part/document';
import { formedFrames, onCurve } from './formed-frames';
import { samplePart, solved } from './sample-parts';

const joggled: PartDocument = {
  ...samplePart('tray', 1),
  chain: [
    { leg: 1 },
    { bend: 90, turn: 'up', radius: 0.125 },
    { leg: 1 },
    { joggle: 0.08, run: 0.5, turn: 'down', radius: 0.125 },
    { leg: 1.5 },
  ],
};

describe('the frames of the formed part', () => {
  const parts: [string, PartDocument][] = [
    ['a flat strip', samplePart('tray', 0)],
    ['a channel', samplePart('tray', 2)],
    ['a tray', samplePart('tray', 7)],
    ['a zigzag', samplePart('zigzag', 6, 60)],
    ['a spiral', samplePart('spiral', 5)],
    ['a joggled angle', joggled],
  ];

  for (const [name, part] of parts) {
    it(`lie where the engine has the faces of ${name}`, () => {
      const result = solved(part);
      const frames = formedFrames(result)!;
      for (const face of ['upper', 'lower'] as const) {
        const lines = result.formed!.faces![face].flatMap((element) => ('line' in element ? [element.line] : []));
        expect(lines.length).toBe(frames.stretches.length);
        lines.forEach(([from, to], index) => {
          const [start, end] = frames.stretches[index]![face];
          for (const [drawn, [x, y]] of [
            [start, from],
            [end, to],
          ] as const) {
            expect(drawn.x).toBeCloseTo(x, 9);
            expect(drawn.y).toBeCloseTo(y, 9);
          }
        });
      }
    });
  }

  it('join each curve to the stretches on both sides of it', () => {
    const frames = formedFrames(solved(samplePart('tray', 4)))!;
    frames.curves.forEach((curve, index) => {
      for (const face of ['upper', 'lower'] as const) {
        const before = frames.stretches[index]![face][1];
        const after = frames.stretches[index + 1]![face][0];
        expect(onCurve(curve, face, 0).x).toBeCloseTo(before.x, 9);
        expect(onCurve(curve, face, 0).y).toBeCloseTo(before.y, 9);
        expect(onCurve(curve, face, 1).x).toBeCloseTo(after.x, 9);
        expect(onCurve(curve, face, 1).y).toBeCloseTo(after.y, 9);
      }
    });
  });

  it('name the entry of the chain that each belongs to', () => {
    const frames = formedFrames(solved(joggled))!;
    expect(frames.stretches.map((stretch) => stretch.chain)).toEqual([0, 2, 3, 4]);
    expect(frames.stretches.map((stretch) => stretch.leg)).toEqual([0, 1, null, 2]);
    expect(frames.curves.map((curve) => curve.chain)).toEqual([1, 3, 3]);
  });
});
