import type { Grain } from '../../shared/part/document';
import { GRAIN_WORDS } from '../../shared/part/words';
import type { BlankPaperInput } from './blank-paper-input';
import { arrowhead } from './dimension';
import { text, widthOf } from './lettering';
import { TYPE } from './paper-size';
import { BEND_LINE, FRAME, SIGHT_DATUM_SIDE, SIGHT_FAR_SIDE, TANGENT_LINE, THIN } from './pens';
import { line } from './sheet';
import type { Box, Mark, Pen } from './sheet';

const KINDS: readonly (readonly [Pen, string])[] = [
  [BEND_LINE, 'bend line (centre)'],
  [TANGENT_LINE, 'bend tangent line'],
  [SIGHT_DATUM_SIDE, 'sight line, datum side under the nose'],
  [SIGHT_FAR_SIDE, 'sight line, far side under the nose'],
];

/** What is drawn and at what scale, which way the grain runs, and what each kind of line means. */
export function blankHeading(area: Box, scale: string, { document, result }: BlankPaperInput): Mark[] {
  const base = area.y + 3.6;
  const stopped = result.findings.some(({ level }) => level === 'stop');
  const heading = `Blank in the flat, face A up · scale ${scale}`;
  const marks: Mark[] = [
    text(stopped ? `STOP: can't be made as drawn, see findings · ${heading}` : heading, area.x, base, {
      size: TYPE.heading,
      weight: 'semibold',
    }),
    ...grainMark(area.x + area.width, base, document.grain),
  ];
  const bends = result.bends.length > 0;
  if (!bends) return marks;
  let x = area.x;
  for (const [pen, words] of KINDS) {
    const y = area.y + 9.2;
    marks.push(line(x, y - 0.9, x + 9, y - 0.9, pen), text(words, x + 10.5, y, { size: TYPE.small }));
    x += 10.5 + widthOf(words, TYPE.small) + 6;
  }
  return marks;
}

/** The grain as an arrow with two heads, lying as it lies on the drawn blank, with its words; ends at `right`. */
function grainMark(right: number, base: number, grain: Grain | undefined): Mark[] {
  if (grain === undefined)
    return [text('grain: not stated', right, base, { size: TYPE.body, weight: 'semibold', align: 'right' })];
  const words = GRAIN_WORDS[grain];
  const label = text(words, right, base, { size: TYPE.body, weight: 'semibold', align: 'right' });
  const middle = { x: label.box.x - (grain === 'along' ? 4 : 11), y: base - 1 };
  if (grain === 'along') {
    return [
      label,
      line(middle.x, middle.y - 3.6, middle.x, middle.y + 5, FRAME),
      arrowhead({ x: middle.x, y: middle.y - 4 }, 0, -1),
      arrowhead({ x: middle.x, y: middle.y + 5.4 }, 0, 1),
    ];
  }
  return [
    label,
    line(middle.x - 8, middle.y, middle.x + 8, middle.y, { ...FRAME, shade: THIN.shade }),
    arrowhead({ x: middle.x - 8.4, y: middle.y }, -1, 0),
    arrowhead({ x: middle.x + 8.4, y: middle.y }, 1, 0),
  ];
}
