import { BLANK_LINES, type BlankDrawing, blankDrawing, type BlankLines } from './blank-drawing';
import { overlaps } from './box';
import { type TextMark, textBox } from './marks';
import { samplePart, solved, thousandths } from './sample-parts';
import type { PartDocument } from '@shared/part/document';

function drawn(part: PartDocument, lines: BlankLines, width = 950): BlankDrawing | null {
  return blankDrawing(solved(part), { width, lines, figureOf: thousandths, grain: 'across' });
}

const texts = (drawing: BlankDrawing): TextMark[] =>
  drawing.marks.filter((mark): mark is TextMark => mark.kind === 'text');

/** What lies on something else or runs off the paper; nothing, when all is well. */
function clashes(drawing: BlankDrawing): string[] {
  const placed = texts(drawing).map((text) => ({ ...textBox(text), text: text.text }));
  return placed.flatMap((box, index) => {
    const off = box.left < 0 || box.right > drawing.width || box.top < 0 || box.bottom > drawing.height;
    const under = placed.slice(index + 1).filter((other) => overlaps(box, other));
    return [...(off ? [`${box.text} off the paper`] : []), ...under.map((other) => `${box.text} on ${other.text}`)];
  });
}

describe('the blank drawing', () => {
  it('lays no figure on another and none outside, for 0 to 24 bends and every choice of lines', () => {
    for (const lines of BLANK_LINES) {
      for (let bends = 0; bends <= 24; bends++) {
        for (const width of [358, 950]) {
          const drawing = drawn(samplePart('tray', bends), lines, width);
          if (!drawing) throw new Error(`no blank with ${bends} bends`);
          expect(clashes(drawing)).withContext(`${bends} bends, ${lines}, ${width} px`).toEqual([]);
        }
      }
    }
  });

  it('notes every bend: in one line, in four under each other, or in three, by the room', () => {
    const notes = (bends: number, width: number): string[] =>
      texts(drawn(samplePart('tray', bends), 'tangents', width)!)
        .filter((text) => text.role.startsWith('note'))
        .map(({ text }) => text);
    expect(notes(2, 950)).toContain('L2 · face A up · 90° (90° between legs)');
    expect(notes(4, 560)).toContain('90° between legs');
    expect(notes(4, 560).length).toBe(4 * 4);
    expect(notes(24, 358)).not.toContain('90° between legs');
    expect(notes(24, 358).length).toBe(24 * 3);
  });

  it('gives every station of the lines that are shown, and both ends', () => {
    const figures = (lines: BlankLines): number =>
      texts(drawn(samplePart('tray', 4), lines)!).filter((text) => text.role.endsWith('station')).length;
    expect(figures('tangents')).toBe(2 + 8);
    expect(figures('sight lines')).toBe(2 + 8);
    expect(figures('both')).toBe(2 + 16);
  });

  it('tells the two sight lines of a bend apart, by a letter and by the kind of line', () => {
    const drawing = drawn(samplePart('tray', 2), 'sight lines')!;
    const letters = texts(drawing).filter((text) => text.role === 'station');
    expect(letters.filter(({ text }) => / D$/.test(text)).length).toBe(2);
    expect(letters.filter(({ text }) => / F$/.test(text)).length).toBe(2);
    const lines = drawing.marks.map(({ role }) => role);
    expect(lines.filter((role) => role === 'sight-datum').length).toBe(2);
    expect(lines.filter((role) => role === 'sight-far').length).toBe(2);
  });

  it('gets wider than its room rather than crowded', () => {
    expect(drawn(samplePart('tray', 4), 'tangents')?.width).toBe(950);
    expect(drawn(samplePart('tray', 24), 'tangents', 358)!.width).toBeGreaterThan(1000);
  });

  it('says when the width is not to scale', () => {
    const part = samplePart('tray', 2);
    expect(drawn({ ...part, width: 0.4 }, 'tangents')?.widthToScale).toBeTrue();
    expect(drawn({ ...part, width: 60 }, 'tangents')?.widthToScale).toBeFalse();
    const { width: _none, ...open } = part;
    expect(drawn(open, 'tangents')?.widthToScale).toBeFalse();
  });

  it('is none when a leg is consumed', () => {
    const part = samplePart('tray', 2);
    expect(drawn({ ...part, chain: part.chain.with(2, { leg: 0.1 }) }, 'tangents')).toBeNull();
  });
});
