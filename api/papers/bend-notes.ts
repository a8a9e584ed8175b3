import { lineNote } from '../../shared/part/words';
import type { LineNote } from '../../shared/part/words';
import type { Solved } from '../../shared/result';
import type { BlankView } from './blank-view';
import { text, widthOf } from './lettering';
import { TYPE } from './paper-size';
import { THIN } from './pens';
import { exactFigure } from './figures';
import { line } from './sheet';
import type { Mark } from './sheet';
import { farthestMove, spread } from '../../shared/geometry/spread';

export type NoteStyle = 'level' | 'upward' | 'name' | 'none';

interface Note {
  readonly station: number;
  readonly lines: readonly string[];
}

export interface BendNotes {
  readonly style: NoteStyle;
  readonly notes: readonly Note[];
  readonly put: readonly number[];
  readonly height: number;
}

const JOG = 5;
const LEAD = 1 + JOG + 1.4;
const LINE = TYPE.body * 1.22;
const SIZE = TYPE.body;
const FARTHEST = 22;

const noteWidth = ({ lines }: Note): number =>
  Math.max(...lines.map((words, row) => widthOf(words, SIZE, row === 0 ? 'semibold' : 'regular')));

/**
 * The ways in which the notes of the bend lines can stand under the blank without touching, the fullest first; the last
 * way is not to write them.
 */
export function bendNoteWays(
  result: Solved,
  view: Pick<BlankView, 'x' | 'low' | 'high' | 'left' | 'right'>,
): BendNotes[] {
  const bends = result.bends.flatMap((bend, index) =>
    bend.centre === null ? [] : [{ bend, index, station: bend.centre }],
  );
  const places = bends.map(({ station }) => view.x(station));
  const ways: BendNotes[] = [];
  const none: BendNotes = { style: 'none', notes: [], put: [], height: 0 };
  if (bends.length === 0) return [none];
  const notesOf = (lines: (note: LineNote, radius: string) => string[]): Note[] =>
    bends.map(({ bend, index, station }) => ({
      station,
      lines: lines(lineNote(bend, index), `R ${exactFigure(bend.radius, result.unit)}`),
    }));

  // Within the blank the extension lines of the overall dimensions pass them by; wider only when it must be.
  const place = (pitch: number | readonly number[], ends: number): number[] | null =>
    spread(places, pitch, view.left + ends + 1, view.right - ends - 1) ??
    spread(places, pitch, view.low + ends, view.high - ends);

  const stacked = notesOf(({ line, face, angle, between }, radius) => [
    `${line} · ${radius}`,
    face,
    `${angle} (${between})`,
  ]);
  const widths = stacked.map(noteWidth);
  const pitches = widths.slice(1).map((width, index) => (width + (widths[index] ?? 0)) / 2 + 3);
  const level = place(pitches, Math.max(0, ...widths) / 2);
  if (level && farthestMove(places, level) <= FARTHEST) {
    ways.push({ style: 'level', notes: stacked, put: level, height: LEAD + 3 * LINE });
  }
  const upward = (style: NoteStyle, notes: Note[]): void => {
    const deep = (notes[0]?.lines.length ?? 1) * LINE;
    const put = place(deep + (style === 'name' ? 0 : 1.2), deep / 2);
    if (put) ways.push({ style, notes, put, height: LEAD + Math.max(0, ...notes.map(noteWidth)) });
  };
  upward(
    'upward',
    notesOf(({ line, face, angle, between }, radius) => [`${line} · ${face}`, `${angle} · ${radius}`, between]),
  );
  upward(
    'upward',
    notesOf(({ line, face, angle, between }, radius) => [`${line} · ${face}`, `${angle} (${between}) · ${radius}`]),
  );
  upward(
    'name',
    notesOf(({ line }) => [line]),
  );
  return [...ways, none];
}

export function drawBendNotes(plan: BendNotes, view: BlankView): Mark[] {
  const knee = view.bottom + 1.5;
  const foot = knee + JOG;
  return plan.notes.flatMap(({ station, lines }, index) => {
    const x = view.x(station);
    const put = plan.put[index] ?? x;
    const leader: Mark[] = [line(x, view.bottom, x, knee, THIN), line(x, knee, put, foot, THIN)];
    const words = lines.map((part, row) => {
      const weight = row === 0 ? 'semibold' : 'regular';
      if (plan.style === 'level') {
        return text(part, put, foot + 0.6 + (row + 0.8) * LINE, { size: SIZE, weight, align: 'centre', clear: true });
      }
      const column = put + (row - (lines.length - 1) / 2) * LINE + SIZE * 0.35;
      return text(part, column, foot + 1, { size: SIZE, weight, align: 'right', upward: true, clear: true });
    });
    return [...leader, ...words];
  });
}
