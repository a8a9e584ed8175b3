import type { Solved } from '../../shared/result';
import type { BlankView } from './blank-view';
import { lengthFigure } from './figures';
import { shorten, text, widthOf } from './lettering';
import { TYPE } from './paper-size';
import { legName } from './part-words';
import { QUIET } from './pens';
import type { Box, TextMark } from './sheet';

const SIZE = TYPE.body;
const HEIGHTS = [0.5, 0.3, 0.7, 0.18, 0.82];

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
  const found: TextMark[][] = [];
  for (const height of HEIGHTS) {
    const y = room.y + room.height * height;
    if (widthOf(full, SIZE) <= room.width && room.height >= SIZE * 1.4)
      found.push([text(full, middle, y + SIZE * 0.35, how)]);
    else if (widthOf(flat, SIZE) <= room.width && room.height >= SIZE * 4 && room.width >= 12) {
      const short = shorten(name, room.width, SIZE);
      found.push([text(short, middle, y - SIZE * 0.25, how), text(flat, middle, y + SIZE * 0.95, how)]);
    }
  }
  if (room.width >= SIZE * 1.1) {
    const words = [full, `${shorten(name, room.height - widthOf(` ${flat}`, SIZE), SIZE)} ${flat}`, flat].find(
      (candidate) => widthOf(candidate, SIZE) <= room.height,
    );
    if (words) found.push([text(words, middle + SIZE * 0.35, room.y + room.height / 2, { ...how, upward: true })]);
  }
  return found;
}
