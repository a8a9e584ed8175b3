import { legName } from '../../shared/part/words';
import type { Solved } from '../../shared/result';
import type { BlankView } from './blank-view';
import { lengthFigure } from './figures';
import { shorten, text, widthOf } from './lettering';
import { TYPE } from './paper-size';
import { QUIET } from './pens';
import type { Box, TextMark } from './sheet';

const SIZE = TYPE.body;
/** Where a label is tried, of the leg's depth and of the room to its sides: holes may be in its way. */
const HEIGHTS = [0.5, 0.3, 0.7, 0.18, 0.82];
const SIDES = [0, -0.6, 0.6];

export const touches = (a: Box, b: Box): boolean =>
  a.x < b.x + b.width && b.x < a.x + a.width && a.y < b.y + b.height && b.y < a.y + a.height;

/** A leg's name and flat on the blank, level or upward, the fullest that fits between its lines and clear of the holes. */
export function legLabels(result: Solved, view: BlankView, bottom: number, taken: readonly Box[]): TextMark[] {
  const used = [...taken];
  return result.legs.flatMap((leg, index) => {
    if (leg.start === null || leg.end === null) return [];
    const left = view.x(leg.start) + 1;
    const right = view.x(leg.end) - 1;
    const name = legName(leg.name, index);
    const flat = lengthFigure(leg.flat, result.unit);
    for (const marks of candidates(name, flat, {
      x: left,
      y: view.top + 1,
      width: right - left,
      height: bottom - view.top - 2,
    })) {
      if (marks.some(({ box }) => used.some((other) => touches(box, other)))) continue;
      used.push(...marks.map(({ box }) => box));
      return marks;
    }
    return [];
  });
}

function candidates(name: string, flat: string, room: Box): TextMark[][] {
  const full = `${name} ${flat}`;
  const how = { size: SIZE, shade: QUIET, align: 'centre', clear: true } as const;
  const middle = room.x + room.width / 2;
  const rows = (lines: readonly string[]): TextMark[][] =>
    room.height < SIZE * 1.4 * lines.length || lines.some((words) => widthOf(words, SIZE) > room.width)
      ? []
      : HEIGHTS.flatMap((height) => {
          const first = room.y + room.height * height + SIZE * (0.35 - 0.6 * (lines.length - 1));
          const slack = (room.width - Math.max(...lines.map((words) => widthOf(words, SIZE)))) / 2;
          return SIDES.map((side) =>
            lines.map((words, row) => text(words, middle + side * slack, first + row * SIZE * 1.2, how)),
          );
        });
  const upward = (words: string): TextMark[][] =>
    room.width < SIZE * 1.1 || widthOf(words, SIZE) > room.height
      ? []
      : [[text(words, middle + SIZE * 0.35, room.y + room.height / 2, { ...how, upward: true })]];
  const beside = room.height - widthOf(` ${flat}`, SIZE);
  return [
    ...rows([full]),
    ...rows([name, flat]),
    ...upward(full),
    ...(room.width >= 14 ? rows([shorten(name, room.width, SIZE), flat]) : []),
    ...(beside >= 10 ? upward(`${shorten(name, beside, SIZE)} ${flat}`) : []),
    ...rows([flat]),
    ...upward(flat),
  ].filter((marks) => marks.every(({ box }) => box.y >= room.y && box.y + box.height <= room.y + room.height));
}
