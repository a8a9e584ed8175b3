import { formatMass } from '../../shared/section/mass';
import type { BlankPaperInput } from './blank-paper-input';
import { exactFigure, instant, lengthFigure } from './figures';
import { shorten, text, wrap } from './lettering';
import { PAPERS, TYPE } from './paper-size';
import { materialWords, partAllowanceWords } from './part-words';
import { FRAME, QUIET, RULE } from './pens';
import { line, rectangle } from './sheet';
import type { Box, Mark, Weight } from './sheet';

export const TITLE_BLOCK_HEIGHT = 27;
export const TITLE_STRIP_HEIGHT = 9;

interface Field {
  readonly caption: string;
  readonly words: string;
  /** Share of the row. */
  readonly share: number;
  readonly size?: number;
  readonly weight?: Weight;
}

export interface SheetNumber {
  readonly sheet: number;
  readonly of: number;
}

const sheetWords = ({ sheet, of }: SheetNumber): string => `${sheet} of ${of}`;
const issuedWords = ({ issuedAt, issuedBy }: BlankPaperInput): string => `${instant(issuedAt)} by ${issuedBy}`;
const UNCONTROLLED = 'uncontrolled when printed';
const UNIT_WORDS = { in: 'inch', mm: 'millimetre' } as const;

/** The full title block of the first sheet. */
export function titleBlock(input: BlankPaperInput, box: Box, scale: string, number: SheetNumber): Mark[] {
  const { part, revision, result, document, shop, size } = input;
  const { unit, blank } = result;
  const withUnit = (value: number | null): string =>
    value === null ? lengthFigure(null, unit) : `${lengthFigure(value, unit)} ${unit}`;
  const untrimmed = blank.trim.start === 0 && blank.trim.end === 0;
  const rows: Field[][] = [
    [
      { caption: 'Leafwright · shop', words: shop, share: 44 },
      { caption: 'part number', words: part.number, share: 66, size: 4.4, weight: 'semibold' },
      { caption: 'title', words: part.title, share: 84 },
      { caption: 'revision', words: revision.letter, share: 16, size: 4.4, weight: 'semibold' },
      { caption: 'state', words: revision.state, share: 24, weight: 'semibold' },
      {
        caption: 'version of the draft',
        words: `${revision.version}, ${instant(new Date(revision.changedAt))} by ${revision.changedBy}`,
        share: 43,
      },
    ],
    [
      { caption: 'material', words: materialWords(document.material), share: 50 },
      { caption: 'thickness T', words: `${exactFigure(result.thickness, unit)} ${unit}`, share: 26 },
      { caption: 'width of blank', words: blank.width === null ? 'not stated' : withUnit(blank.width), share: 30 },
      { caption: 'length of blank, net', words: withUnit(blank.length), share: 32, weight: 'semibold' },
      {
        caption: 'length of blank, rough',
        words: untrimmed ? 'as net, no trim' : withUnit(blank.roughLength),
        share: 32,
      },
      {
        caption: 'mass of blank',
        words: blank.mass ? `${formatMass(blank.mass.value)} ${blank.mass.unit}` : 'not known',
        share: 26,
      },
      { caption: 'unit', words: UNIT_WORDS[unit], share: 24 },
      { caption: 'scale', words: scale, share: 20 },
      { caption: 'paper', words: PAPERS[size].name, share: 16 },
      { caption: 'sheet', words: sheetWords(number), share: 21 },
    ],
    [
      { caption: 'bend allowance', words: partAllowanceWords(document, result), share: 148, size: TYPE.small },
      { caption: 'issued', words: issuedWords(input), share: 82 },
      { caption: 'this paper', words: UNCONTROLLED, share: 47, weight: 'semibold' },
    ],
  ];
  const height = box.height / rows.length;
  return [
    ...rows.flatMap((fields, index) => row(fields, { ...box, y: box.y + index * height, height })),
    rectangle(box, FRAME),
  ];
}

/** The short title strip of the sheets after the first. */
export function titleStrip(input: BlankPaperInput, box: Box, number: SheetNumber): Mark[] {
  const { part, revision, shop } = input;
  const fields: Field[] = [
    { caption: 'Leafwright · shop', words: shop, share: 38 },
    { caption: 'part number', words: part.number, share: 52, weight: 'semibold' },
    { caption: 'title', words: part.title, share: 56 },
    { caption: 'revision', words: `${revision.letter}, ${revision.state}, version ${revision.version}`, share: 40 },
    { caption: `issued · ${UNCONTROLLED}`, words: issuedWords(input), share: 72 },
    { caption: 'sheet', words: sheetWords(number), share: 19 },
  ];
  return [...row(fields, box), rectangle(box, FRAME)];
}

function row(fields: readonly Field[], box: Box): Mark[] {
  const total = fields.reduce((sum, { share }) => sum + share, 0);
  let x = box.x;
  return fields.flatMap((field, index) => {
    const width = (box.width * field.share) / total;
    const room = width - 3;
    const at = x + 1.5;
    x += width;
    const marks: Mark[] = [
      text(shorten(field.caption, room, TYPE.caption), at, box.y + 2.4, { size: TYPE.caption, shade: QUIET }),
      ...value(field, room, at, box),
    ];
    if (index > 0) marks.push(line(x - width, box.y, x - width, box.y + box.height, RULE));
    marks.push(line(box.x, box.y, box.x + box.width, box.y, RULE));
    return marks;
  });
}

/** One line of the field's own size when it fits, else one or two smaller ones, the second cut with an ellipsis. */
function value({ words, size = 3.2, weight = 'regular' }: Field, room: number, x: number, box: Box): Mark[] {
  const base = box.y + 7.1;
  if (wrap(words, room, size, Infinity, weight).length <= 1) return [text(words, x, base, { size, weight })];
  const small = TYPE.small;
  const lines = wrap(words, room, small, 2, weight);
  const first = lines.length === 1 ? base : box.y + 5.2;
  return lines.map((part, index) => text(part, x, first + index * small * 1.16, { size: small, weight }));
}
