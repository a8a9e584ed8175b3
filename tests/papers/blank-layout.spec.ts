import { layOutBlankPaper } from '../../api/papers/blank-layout';
import type { BlankPaperInput } from '../../api/papers/blank-paper-input';
import { touches } from '../../api/papers/leg-labels';
import { CAPITAL } from '../../api/papers/lettering';
import { PAPERS } from '../../api/papers/paper-size';
import type { Box, Mark, Pen, Sheet, TextMark } from '../../api/papers/sheet';
import { PAPER_SIZES } from '../../shared/contracts/papers';
import { ANGLE, LONG_NAME, paperInput, windingChain } from './paper-inputs';
import type { DocumentParts } from './paper-inputs';

const MARGIN = 10;

const textsOf = (sheet: Sheet): TextMark[] => sheet.marks.filter((mark) => mark.kind === 'text');

function collisions(sheet: Sheet): string[] {
  const texts = textsOf(sheet);
  return texts.flatMap((one, index) =>
    texts
      .slice(index + 1)
      .flatMap((other) => (touches(one.box, other.box) ? [`"${one.text}" on "${other.text}"`] : [])),
  );
}

function outside(sheet: Sheet, paper: { width: number; height: number }): string[] {
  const reach = (mark: Mark): Box | null => {
    if (mark.kind === 'text') return mark.box;
    const points = mark.kind === 'line' ? [mark.from, mark.to] : mark.kind === 'shape' ? mark.points : [];
    if (points.length === 0) return null;
    const xs = points.map(({ x }) => x);
    const ys = points.map(({ y }) => y);
    const [x, y] = [Math.min(...xs), Math.min(...ys)];
    return { x, y, width: Math.max(...xs) - x, height: Math.max(...ys) - y };
  };
  return sheet.marks.flatMap((mark) => {
    const box = reach(mark);
    const slack = 1e-6;
    const held =
      box === null ||
      (box.x >= MARGIN - slack &&
        box.y >= MARGIN - slack &&
        box.x + box.width <= paper.width - MARGIN + slack &&
        box.y + box.height <= paper.height - MARGIN + slack);
    return held ? [] : [mark.kind === 'text' ? mark.text : `${mark.kind} ${JSON.stringify(box)}`];
  });
}

function faults(input: BlankPaperInput): string[] {
  return layOutBlankPaper(input).sheets.flatMap((sheet, index) =>
    [...collisions(sheet), ...outside(sheet, PAPERS[input.size])].map((fault) => `sheet ${index + 1}: ${fault}`),
  );
}

const wordsOf = (input: BlankPaperInput): string[] =>
  layOutBlankPaper(input).sheets.flatMap((sheet) => textsOf(sheet).map(({ text }) => text));

describe('the layout of the blank paper', () => {
  const longPart = { number: 'HC-2107-1-'.repeat(12), title: `${LONG_NAME}, `.repeat(6) };

  for (const size of PAPER_SIZES) {
    it(`keeps every text clear of every other and inside the margins on ${size}, for 1 to 24 bends and the longest names`, () => {
      for (let bends = 1; bends <= 24; bends++) {
        const short = paperInput({ width: 4, chain: windingChain(bends, 1) }, { size });
        expect(faults(short)).withContext(`${bends} bends`).toEqual([]);
        const parts: DocumentParts = {
          grain: 'along',
          material: { name: LONG_NAME },
          trim: { start: 0.25, end: 0.5 },
          chain: windingChain(bends, 2, LONG_NAME),
        };
        const long = paperInput(parts, { size, part: longPart, shop: LONG_NAME.repeat(3), issuedBy: LONG_NAME });
        expect(faults(long)).withContext(`${bends} bends, long names`).toEqual([]);
      }
    });

    it(`does so on ${size} for shapes at the ends of the range`, () => {
      const cases: Record<string, DocumentParts> = {
        strip: { width: 1, chain: [{ leg: 12 }] },
        'narrow strip': { width: 0.2, chain: [{ leg: 300 }] },
        'tiny part': { width: 0.5, chain: [{ leg: 0.2 }, { bend: 90, turn: 'down', radius: 0.01 }, { leg: 0.2 }] },
        'long part': { width: 0.5, chain: [{ leg: 2000 }, { bend: 30, turn: 'down', radius: 0.125 }, { leg: 3000 }] },
        'wide part': { width: 5000, chain: [{ leg: 1 }, { bend: 30, turn: 'down', radius: 0.125 }, { leg: 1 }] },
        'lines at one end': {
          width: 3,
          chain: [...windingChain(8, 0.5), { bend: 45, turn: 'up', radius: 0.1 }, { leg: 60 }],
        },
        '60 bends': { width: 9, chain: windingChain(60, 1) },
        '200 bends': { width: 9, chain: windingChain(200, 1) },
        broken: { width: 6, chain: [{ leg: 0.1 }, { bend: 90, turn: 'up', radius: 0.125 }, { leg: 8 }] },
        holes: {
          ...ANGLE,
          holes: [{ leg: 0, diameter: 0.5, from: 'start', at: 3, across: 0.5, count: 12, pitch: 0.45 }],
        },
        joggle: { width: 3, chain: [{ leg: 2 }, { joggle: 0.04, run: 0.3, turn: 'up', radius: 0.06 }, { leg: 2 }] },
      };
      for (const [name, parts] of Object.entries(cases)) {
        expect(faults(paperInput(parts, { size })))
          .withContext(name)
          .toEqual([]);
      }
    });
  }

  it('lets nothing run together when there are more findings than the first sheet holds', () => {
    const input = paperInput(ANGLE);
    const finding = {
      level: 'caution',
      code: 'x',
      at: 'chain/1',
      message: `${LONG_NAME}. `.repeat(4),
      source: LONG_NAME,
    } as const;
    const many = { ...input, result: { ...input.result, findings: Array.from({ length: 40 }, () => finding) } };
    expect(faults(many)).toEqual([]);
    expect(wordsOf(many).some((words) => /^All in full, with their sources: sheet \d+\.$/u.test(words))).toBeTrue();
    expect(wordsOf(many).filter((words) => words === 'caution').length).toBe(40);
  });

  it('draws no line thinner than 0.18 mm or wider than 0.5 mm, and stations with figures of 2.5 mm and more', () => {
    const { sheets } = layOutBlankPaper(paperInput({ width: 4, chain: windingChain(12, 1) }));
    const pens = sheets.flatMap(({ marks }) =>
      marks.flatMap((mark): Pen[] => ('pen' in mark && mark.pen !== null ? [mark.pen] : [])),
    );
    expect(pens.length).toBeGreaterThan(50);
    for (const { width } of pens) expect(width >= 0.18 && width <= 0.5).toBeTrue();
    const station = sheets.flatMap(textsOf).find(({ upward, text }) => upward && /^\d+\.\d{3}$/u.test(text));
    expect((station?.size ?? 0) * CAPITAL).toBeGreaterThanOrEqual(2.5);
  });

  it('draws the blank to the scale that it prints', () => {
    const [first] = layOutBlankPaper(paperInput(ANGLE)).sheets;
    const outline = first?.marks.find((mark) => mark.kind === 'shape' && mark.pen?.width === 0.5);
    const xs = outline?.kind === 'shape' ? outline.points.map(({ x }) => x) : [];
    const ys = outline?.kind === 'shape' ? outline.points.map(({ y }) => y) : [];
    const { result } = paperInput(ANGLE);
    expect(first ? textsOf(first).map(({ text }) => text) : []).toContain('1:2.5');
    expect(Math.max(...xs) - Math.min(...xs)).toBeCloseTo(((result.blank.length ?? 0) * 25.4) / 2.5, 6);
    expect(Math.max(...ys) - Math.min(...ys)).toBeCloseTo((6 * 25.4) / 2.5, 6);
  });

  it('says what it leaves out of the drawing', () => {
    const said = (parts: DocumentParts): string => wordsOf(paperInput(parts)).join(' ');
    expect(said({ chain: windingChain(2, 2) })).toContain('Width not stated');
    expect(said({ chain: windingChain(2, 2) })).toContain('grain: not stated');
    expect(said({ width: 400, chain: windingChain(2, 2) })).toContain('Width drawn with a break');
    expect(said({ width: 0.2, chain: [{ leg: 300 }] })).toContain('not to scale across');
    expect(said({ width: 9, chain: windingChain(60, 1) })).toContain(
      'Stations of the tangent lines: see the line schedule.',
    );
    expect(said({ width: 9, chain: windingChain(200, 1) })).toContain('Stations of the lines: see the line schedule.');
    expect(said({ ...ANGLE, trim: { start: 0.25 } })).toContain('From the rough edge add 0.250 to every station.');
    expect(said(ANGLE)).not.toContain('rough edge');
  });

  it('draws no blank that has no figure, and prints the stop instead', () => {
    const input = paperInput({ width: 6, chain: [{ leg: 0.1 }, { bend: 90, turn: 'up', radius: 0.125 }, { leg: 8 }] });
    const [first] = layOutBlankPaper(input).sheets;
    expect(first?.marks.some((mark) => 'pen' in mark && mark.pen?.width === 0.5)).toBeFalse();
    const words = wordsOf(input);
    expect(words).toContain('The blank has no figure and is not drawn.');
    expect(words).toContain('no figure');
    expect(words.some((text) => text.startsWith('stop: '))).toBeTrue();
  });

  it('gives the first sheet what a bender needs at each line: radius, and that face B is marked on its own side', () => {
    const words = wordsOf(paperInput({ width: 9, chain: windingChain(2, 2) })).join(' ');
    const { radius } = paperInput({ width: 9, chain: windingChain(2, 2) }).result.bends[0]!;
    expect(words).toContain(`R ${radius.toFixed(3)}`);
    const down = { chain: [{ leg: 1 }, { bend: 90, turn: 'down', radius: 0.16 }, { leg: 2 }] } as const;
    expect(wordsOf(paperInput(down)).join(' ')).toContain('mark them on face B');
    expect(wordsOf(paperInput(ANGLE)).join(' ')).not.toContain('mark them on face B');
  });

  it('says STOP over a drawing that can be drawn but not made', () => {
    const bend = { bend: 90, turn: 'up', radius: 0.125 } as const;
    const box = { chain: [{ leg: 1 }, bend, { leg: 2 }, bend, { leg: 1 }, bend, { leg: 2.5 }] };
    expect(wordsOf(paperInput(box)).some((text) => text.startsWith("STOP: can't be made as drawn"))).toBeTrue();
    expect(wordsOf(paperInput(ANGLE)).some((text) => text.startsWith('STOP'))).toBeFalse();
  });

  it('gives a joggle its depth and run', () => {
    const chain = [{ leg: 1 }, { joggle: 0.04, run: 0.25, turn: 'up', radius: 0.125 }, { leg: 1 }] as const;
    const words = wordsOf(paperInput({ chain: [...chain] }));
    expect(words).toContain('Joggles');
    expect(words).toContain('0.040');
    expect(words).toContain('0.250');
    expect(words.join(' ')).toContain('L1 and L2');
  });

  it('marks every sheet of what is not released, and none of what is', () => {
    const marked = (input: BlankPaperInput): boolean[] =>
      layOutBlankPaper(input).sheets.map(({ marks }) => marks.some(({ kind }) => kind === 'watermark'));
    const draft = paperInput(ANGLE);
    expect(marked(draft)).toEqual([true, true]);
    expect(marked({ ...draft, revision: { ...draft.revision, state: 'released' } })).toEqual([false, false]);
  });
});
