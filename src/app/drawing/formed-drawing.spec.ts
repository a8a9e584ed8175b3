import { inOneLine, lineNote } from '@shared/part/words';
import { overlaps } from './box';
import { type FormedDrawing, formedDrawing } from './formed-drawing';
import type { LeaderNote } from './leader';
import { type Drawing, type TextMark, textBox } from './marks';
import { samplePart, solved, type Shape, thousandths } from './sample-parts';

const notesOf = (bend: number): LeaderNote[] => {
  const lower = 'BA 0.273 · SB 0.196';
  const note = lineNote({ turn: 'down', angle: 90 }, bend);
  return [
    { upper: inOneLine(note), lower },
    { upper: `${note.line} · ${note.face} · ${note.angle}`, lower },
  ];
};

function drawn(shape: Shape, bends: number, width = 950, height = 340): FormedDrawing {
  const result = solved(samplePart(shape, bends, shape === 'zigzag' ? 60 : 90));
  const drawing = formedDrawing(result, { width, height, figureOf: thousandths, notesOf });
  if (!drawing) throw new Error(`no drawing of a ${shape} with ${bends} bends`);
  return drawing;
}

/** The drawing as it is seen when an entry is selected. */
function withNote(drawing: FormedDrawing, chain: number): Drawing {
  const { marks, hides } = drawing.noteOn(chain);
  return { ...drawing, marks: [...drawing.marks.filter((mark) => !hides.includes(mark)), ...marks] };
}

const texts = (drawing: Drawing): TextMark[] => drawing.marks.filter((mark): mark is TextMark => mark.kind === 'text');

/** What lies on something else or runs off the paper; nothing, when all is well. */
function clashes(drawing: Drawing): string[] {
  const placed = texts(drawing).map((text) => ({ ...textBox(text), text: text.text }));
  return placed.flatMap((box, index) => {
    const off = box.left < 0 || box.right > drawing.width || box.top < 0 || box.bottom > drawing.height;
    const under = placed.slice(index + 1).filter((other) => overlaps(box, other));
    return [...(off ? [`${box.text} off the paper`] : []), ...under.map((other) => `${box.text} on ${other.text}`)];
  });
}

/** Dimension lines, extension lines and arrowheads that run off the paper. */
function strays({ marks, width, height }: Drawing): string[] {
  return marks.flatMap((mark) => {
    if (mark.kind !== 'path' || (mark.role !== 'dimension' && mark.role !== 'arrow')) return [];
    const figures = (mark.d.match(/-?\d+(?:\.\d+)?/g) ?? []).map(Number);
    const off = figures.some((figure, i) => figure < 0 || figure > (i % 2 === 0 ? width : height));
    return off ? [mark.d] : [];
  });
}

describe('the formed drawing', () => {
  it('keeps every dimension whole on the paper, on a phone too', () => {
    for (const shape of ['tray', 'zigzag'] as const) {
      for (let bends = 0; bends <= 24; bends++) {
        expect(strays(drawn(shape, bends)))
          .withContext(`${shape} ${bends}`)
          .toEqual([]);
        expect(strays(drawn(shape, bends, 374, 170)))
          .withContext(`${shape} ${bends} on a phone`)
          .toEqual([]);
      }
    }
  });

  it('lays no text on another and none outside, for 0 to 24 bends', () => {
    for (const shape of ['tray', 'zigzag', 'spiral'] as const) {
      for (let bends = 0; bends <= (shape === 'spiral' ? 12 : 24); bends++) {
        expect(clashes(drawn(shape, bends)))
          .withContext(`${shape} ${bends}`)
          .toEqual([]);
      }
    }
  });

  it('keeps the note of a selected bend clear as well, on a phone too', () => {
    for (const bends of [1, 2, 4, 12]) {
      for (let bend = 0; bend < bends; bend++) {
        expect(clashes(withNote(drawn('tray', bends), 2 * bend + 1)))
          .withContext(`tray ${bends}, L${bend + 1}`)
          .toEqual([]);
        expect(clashes(withNote(drawn('tray', bends, 374, 270), 2 * bend + 1)))
          .withContext(`tray ${bends} on a phone, L${bend + 1}`)
          .toEqual([]);
      }
    }
  });

  it('dimensions every leg of a channel, a hat and a flat strip', () => {
    for (const bends of [0, 1, 2, 4]) {
      const drawing = drawn('tray', bends);
      expect(drawing.left).toBe(0);
      expect(texts(drawing).filter((text) => text.role === 'figure').length).toBe(bends + 1);
    }
  });

  it('notes the selected bend', () => {
    const drawing = drawn('tray', 2);
    const said = texts(withNote(drawing, 3)).map((mark) => mark.text);
    expect(said).toContain('L2 · face B up · 90° (90° between legs)');
    expect(said).toContain('BA 0.273 · SB 0.196');
    expect(said.filter((text) => text === 'L2')).toEqual([]);
    expect(texts(drawing).map((mark) => mark.text)).not.toContain('BA 0.273 · SB 0.196');
    expect(drawing.noteOn(2)).toEqual({ marks: [], hides: [] });
    expect(drawing.noteOn(null)).toEqual({ marks: [], hides: [] });
  });

  it('marks a mold point a bend, but none at 180°', () => {
    const crosses = (angle: number): number => {
      const part = samplePart('tray', 1, angle);
      const legs = part.chain.map((entry) => ('leg' in entry ? { ...entry, measure: 'outside-edge' as const } : entry));
      const result = solved({ ...part, chain: legs });
      const drawing = formedDrawing(result, { width: 600, height: 300, figureOf: thousandths, notesOf });
      return drawing?.marks.filter((mark) => mark.kind === 'path' && mark.role === 'mold').length ?? -1;
    };
    expect(crosses(179)).toBe(1);
    expect(crosses(180)).toBe(0);
  });

  it('is none when a leg is consumed, or when there is no room', () => {
    const part = samplePart('tray', 2);
    const consumed = solved({ ...part, chain: part.chain.with(2, { leg: 0.1 }) });
    const options = { width: 600, height: 300, figureOf: thousandths, notesOf };
    expect(formedDrawing(consumed, options)).toBeNull();
    expect(formedDrawing(solved(part), { ...options, width: 20 })).toBeNull();
  });
});
