import type { Solved } from '../../shared/result';
import { lengthFigure } from './figures';
import { CAPITAL, text, widthOf } from './lettering';
import { TYPE } from './paper-size';
import { BEND_LINE, FRAME, SIGHT_DATUM_SIDE, SIGHT_FAR_SIDE, TANGENT_LINE, THIN } from './pens';
import { line } from './sheet';
import type { Box, Mark, Pen } from './sheet';
import { spread } from '../../shared/geometry/spread';

interface DrawnLine {
  readonly station: number;
  readonly pen: Pen;
  /** The bend line stands out among the five. */
  readonly main: boolean;
}

/** The five lines of the first bend that has them; null when none has. */
function linesOf({ bends }: Solved): { index: number; lines: DrawnLine[] } | null {
  for (const [index, { tangentStart, centre, tangentEnd, sightLine }] of bends.entries()) {
    if (tangentStart === null || centre === null || tangentEnd === null || sightLine === null) continue;
    const lines: DrawnLine[] = [
      { station: tangentStart, pen: TANGENT_LINE, main: false },
      { station: sightLine.startUnderNose, pen: SIGHT_DATUM_SIDE, main: false },
      { station: centre, pen: BEND_LINE, main: true },
      { station: sightLine.endUnderNose, pen: SIGHT_FAR_SIDE, main: false },
      { station: tangentEnd, pen: TANGENT_LINE, main: false },
    ];
    return { index, lines: lines.sort((a, b) => a.station - b.station) };
  }
  return null;
}

export const firstLine = (result: Solved): number | null => linesOf(result)?.index ?? null;

/**
 * The lines of the first bend drawn so far apart that each is seen: at the scale of the blank the sight lines of a
 * square bend lie within a pencil's width of its bend line.
 */
export function drawEnlargedLines(result: Solved, box: Box): Mark[] {
  const found = linesOf(result);
  if (!found) return [];
  const stations = found.lines.map(({ station }) => station);
  const low = Math.min(...stations);
  const high = Math.max(...stations);
  if (!(high > low)) return [];
  const inset = box.width * 0.16;
  const place = (station: number): number => box.x + inset + ((station - low) / (high - low)) * (box.width - 2 * inset);
  const places = stations.map(place);
  const words = found.lines.map(({ station }) => lengthFigure(station, result.unit));
  const capital = TYPE.station * CAPITAL;
  const put = spread(places, capital + 1.2, box.x + capital, box.x + box.width - capital) ?? places;
  const foot = box.y + 1 + Math.max(...words.map((figure) => widthOf(figure, TYPE.station, 'semibold')));
  const top = foot + 5.5;
  const bottom = box.y + box.height;
  const edges = [top, bottom].map((y) => line(box.x, y, box.x + box.width, y, FRAME));
  const drawn = found.lines.flatMap(({ pen, main }, index): Mark[] => {
    const x = places[index] ?? 0;
    const at = put[index] ?? x;
    const how = { size: TYPE.station, weight: main ? 'semibold' : 'regular', upward: true } as const;
    return [
      line(x, top, x, bottom, pen),
      line(x, top - 0.8, at, foot + 1.6, THIN),
      line(at, foot + 1.6, at, foot + 0.8, THIN),
      text(words[index] ?? '', at + capital / 2, foot, how),
    ];
  });
  return [...edges, ...drawn];
}
