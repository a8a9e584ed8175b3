import { layOutBlankPaper } from '../../api/papers/blank-layout';
import { blankPaper } from '../../api/papers/blank-paper';
import type { BlankPaperInput } from '../../api/papers/blank-paper-input';
import { formatLength, nearest64 } from '../../shared/units/format';
import { ANGLE, LONG_NAME, documentOf, paperInput, solved, windingChain } from './paper-inputs';
import type { DocumentParts } from './paper-inputs';

interface Read {
  readonly pages: readonly { readonly width: number; readonly height: number; readonly words: readonly string[] }[];
  readonly all: string;
}

/** Reads a paper back as another program does. */
async function readBack(bytes: Uint8Array): Promise<Read> {
  const { getDocument, VerbosityLevel } = await import('pdfjs-dist/legacy/build/pdf.mjs');
  const loading = getDocument({ data: bytes.slice(), verbosity: VerbosityLevel.ERRORS, useSystemFonts: false });
  const pdf = await loading.promise;
  const pages: Read['pages'][number][] = [];
  for (let number = 1; number <= pdf.numPages; number++) {
    const page = await pdf.getPage(number);
    const { width, height } = page.getViewport({ scale: 1 });
    const content = await page.getTextContent();
    const words = content.items.flatMap((item) => ('str' in item && item.str.trim() !== '' ? [item.str] : []));
    pages.push({ width, height, words });
  }
  await loading.destroy();
  return { pages, all: pages.flatMap(({ words }) => words).join('\n') };
}

const paperOf = async (parts: DocumentParts, change: Partial<BlankPaperInput> = {}): Promise<Read> =>
  readBack(await blankPaper(paperInput(parts, change)));

describe('the blank paper, read back', () => {
  it("holds the engine's figures of the 6 × 8 angle", async () => {
    const { result } = paperInput(ANGLE);
    const read = await paperOf(ANGLE);
    const [bend] = result.bends;
    const stations = [
      bend?.tangentStart,
      bend?.centre,
      bend?.tangentEnd,
      bend?.sightLine?.startUnderNose,
      bend?.sightLine?.endUnderNose,
    ];
    for (const station of stations) {
      expect(read.all).toContain(formatLength(station ?? NaN, 'in'));
      expect(read.pages[1]?.words.some((words) => words.startsWith(`${nearest64(station ?? NaN).text} `))).toBeTrue();
      expect(read.all).toContain(`${formatLength((station ?? NaN) * 25.4, 'mm')} mm`);
    }
    // Common practice, no source: flats 5.835 and 7.835, bend allowance 0.224, developed length 13.894.
    for (const words of [
      'Short leg 5.835',
      'Long leg 7.835',
      '0.224',
      '13.894 in',
      'net 13.894',
      '0.165',
      '90° (90° between legs)',
      'face A up',
    ]) {
      expect(read.all).toContain(words);
    }
  });

  it('holds every station of a 12-bend part in the drawing and in the schedule', async () => {
    const parts: DocumentParts = { width: 4, chain: windingChain(12, 1) };
    const { result } = paperInput(parts);
    const { pages } = await paperOf(parts);
    const after = pages.slice(1).flatMap(({ words }) => words);
    result.bends.forEach((bend, index) => {
      for (const station of [bend.tangentStart, bend.centre, bend.tangentEnd]) {
        expect(pages[0]?.words).toContain(formatLength(station ?? NaN, 'in'));
        expect(after).toContain(formatLength(station ?? NaN, 'in'));
      }
      for (const station of [bend.sightLine?.startUnderNose, bend.sightLine?.endUnderNose]) {
        expect(after).toContain(formatLength(station ?? NaN, 'in'));
      }
      expect(after).toContain(`L${index + 1}`);
    });
  });

  it('can be searched and copied without losing a character, a decimal point least of all', async () => {
    const characters = (words: readonly string[]): string =>
      Array.from(words.join('').replace(/\s/gu, '')).sort().join('');
    for (const parts of [ANGLE, { chain: windingChain(5, 1, LONG_NAME) }]) {
      const { sheets } = layOutBlankPaper(paperInput(parts));
      const { pages } = await paperOf(parts);
      const laidOut = sheets.map(({ marks }) =>
        characters(marks.flatMap((mark) => ('text' in mark ? [mark.text] : []))),
      );
      expect(pages.map(({ words }) => characters(words))).toEqual(laidOut);
    }
  });

  it('says whose paper it is, of what state, and what to beware of', async () => {
    const { pages, all } = await paperOf(ANGLE);
    for (const words of [
      'Harrow Creek',
      'HC-2107-1',
      'Hat stringer, bay 14 repair',
      'draft',
      '2024-T3',
      '0.040 in',
      'FAA-H-8083-31 ch. 4',
      '1 of 2',
      '2026-03-05 13:31:21 UTC by technician@harrowcreek.example',
      'uncontrolled when printed',
      'grain across, square to the bend lines',
      'Figures are shop aids.',
      'licensed or',
      'Wear eye protection.',
    ]) {
      expect(all.replace(/\n/gu, ' ')).toContain(words);
    }
    for (const { words } of pages) expect(words).toContain('NOT RELEASED');
  });

  it('keeps letters that only the extended face has, and shows a mark for those that no face has', async () => {
    const change = { part: { number: 'HC-1', title: 'Wręga Łódź → 左翼' } };
    const { all } = await paperOf(ANGLE, change);
    expect(all.replace(/\s/gu, '')).toContain('WręgaŁódź???');
  });

  it('is of the paper asked for, in landscape', async () => {
    const a4 = (await paperOf(ANGLE)).pages[0];
    const letter = (await paperOf(ANGLE, { size: 'letter' })).pages[0];
    expect(a4?.width).toBeCloseTo(841.89, 1);
    expect(a4?.height).toBeCloseTo(595.28, 1);
    expect(letter?.width).toBeCloseTo(792, 6);
    expect(letter?.height).toBeCloseTo(612, 6);
  });

  it('gives millimetre parts in millimetres, with inches beside', async () => {
    const parts: DocumentParts = {
      ...ANGLE,
      unit: 'mm',
      thickness: 1,
      chain: [{ leg: 50 }, { bend: 60, turn: 'down', radius: 2 }, { leg: 70 }],
    };
    const centre = solved(documentOf(parts)).bends[0]?.centre ?? NaN;
    const { all } = await paperOf(parts);
    expect(all).toContain(formatLength(centre, 'mm'));
    expect(all).toContain(`${formatLength(centre / 25.4, 'in')} in`);
    expect(all).toContain('60° (120° between legs)');
    expect(all).toContain('face B up');
    expect(all).not.toContain('1/64');
  });

  it('is the same to the byte for the same input, and another for another time of issue', async () => {
    const one = Buffer.from(await blankPaper(paperInput(ANGLE)));
    const two = Buffer.from(await blankPaper(paperInput(ANGLE)));
    const later = Buffer.from(await blankPaper(paperInput(ANGLE, { issuedAt: new Date('2026-03-05T13:31:22Z') })));
    expect(one.equals(two)).toBeTrue();
    expect(one.equals(later)).toBeFalse();
  });

  it('prints no station of a part with a consumed leg, but the stop', async () => {
    const { pages, all } = await paperOf({
      width: 6,
      chain: [{ leg: 0.1 }, { bend: 90, turn: 'up', radius: 0.125 }, { leg: 8 }],
    });
    expect(pages[0]?.words).toContain('The blank has no figure and is not drawn.');
    expect(pages[1]?.words.filter((words) => words === 'no figure').length).toBeGreaterThanOrEqual(5);
    expect(all).toContain('stop');
  });

  it('says of a strip without bends that it is one', async () => {
    const { all } = await paperOf({ width: 1, chain: [{ leg: 12 }] });
    expect(all).toContain('No bends: a flat strip.');
    expect(all).toContain('net 12.000');
  });
});
