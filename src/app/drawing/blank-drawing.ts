/** The blank deck: the strip with its bend zones and lines, laid out lengthways to scale like a tape. */
import { lineNote } from '@shared/part/words';
import type { BendResult, Solved } from '@shared/result';
import type { BendNote } from './bend-notes';
import { bendNotes, notesRoom } from './bend-notes';
import { breakMarks, sheetMarks } from './blank-sheet';
import type { Drawing, Mark } from './marks';
import { linePath } from './marks';
import type { Station } from './station-labels';
import { seatStations, stationMarks, stationRoom } from './station-labels';

export type BlankLines = 'tangents' | 'sight lines' | 'both';
export const BLANK_LINES: readonly BlankLines[] = ['tangents', 'sight lines', 'both'];

export interface BlankOptions {
  /** Room there is; the drawing gets wider, never more crowded, when its figures need it. */
  readonly width: number;
  readonly lines: BlankLines;
  readonly figureOf: (length: number) => string;
  readonly grain: 'along' | 'across' | null;
}

export interface BlankDrawing extends Drawing {
  /** False when the width of the blank is drawn shortened, with a break. */
  readonly widthToScale: boolean;
}

/** Which side of the blank is under the nose: what tells the two sight lines of a bend apart. */
type Side = 'datum' | 'far';
/** Behind a sight line's figure; the deck says below what they stand for. */
export const SIDE_LETTERS: Readonly<Record<Side, string>> = { datum: 'D', far: 'F' };

const MARGIN = 46;
const LEAST_HEIGHT = 64;
const MOST_HEIGHT = 132;

/** A bend whose stations are all known. */
type Placed = BendResult & { tangentStart: number; centre: number; tangentEnd: number };

const isPlaced = (bend: BendResult): bend is Placed => bend.tangentStart !== null && bend.tangentEnd !== null;

/** Null when the stations can't be given; the findings say why. */
export function blankDrawing(solved: Solved, options: BlankOptions): BlankDrawing | null {
  const length = solved.developedLength;
  const bends = solved.bends.filter(isPlaced);
  if (length === null || length <= 0 || bends.length < solved.bends.length || options.width < 40) return null;

  const top = topStations(bends, length, options);
  const bottom = options.lines === 'both' ? sightStations(bends, options) : [];
  const notes = bends.map((bend, index): Omit<BendNote, 'x'> & { at: number } => ({
    at: bend.centre,
    note: lineNote(bend, index),
    pick: bend.chain,
  }));
  const needed = Math.max(
    stationRoom(top) + 2 * MARGIN,
    stationRoom(bottom) + 2 * MARGIN,
    notesRoom(notes.map(({ note }) => note)) + 24,
  );
  const width = Math.max(options.width, Math.ceil(needed));
  const scale = (width - 2 * MARGIN) / length;
  const x = (station: number): number => MARGIN + station * scale;

  const trueHeight = (solved.blank.width ?? 0) * scale;
  const height = Math.min(MOST_HEIGHT, Math.max(LEAST_HEIGHT, trueHeight));
  const widthToScale = trueHeight > 0 && Math.abs(height - trueHeight) < 0.5;
  const placed = (stations: readonly StationAt[]): Station[] => stations.map((one) => ({ ...one, x: x(one.at) }));

  const heads = seatStations(placed(top), MARGIN, width - MARGIN);
  const edge = heads.height + 6;
  const foot = edge + height;
  const feet = bottom.length > 0 ? seatStations(placed(bottom), MARGIN, width - MARGIN) : null;
  const under = foot + (feet?.height ?? 0);
  const band = bendNotes(
    notes.map((note) => ({ ...note, x: x(note.at) })),
    under,
    8,
    width - 8,
  );
  const marks: Mark[] = [
    ...sheetMarks(solved, { x, top: edge, foot, ...options }),
    ...lineMarks(bends, x, edge, foot, options),
    ...(widthToScale ? [] : breakMarks(MARGIN, width - MARGIN, edge, foot)),
    ...stationMarks(heads, edge, -1),
    ...(feet ? stationMarks(feet, foot, 1) : []),
    ...band.marks,
  ];
  return { width, height: under + Math.max(band.height, 8) + 4, marks, widthToScale };
}

type StationAt = Omit<Station, 'x'> & { readonly at: number };

function topStations(bends: readonly Placed[], length: number, options: BlankOptions): StationAt[] {
  const { figureOf, lines } = options;
  const ends: StationAt[] = [
    { at: 0, text: '0', role: 'end-station' },
    { at: length, text: figureOf(length), role: 'end-station' },
  ];
  return [...ends, ...(lines === 'sight lines' ? sightStations(bends, options) : tangentStations(bends, options))];
}

const sightLines = ({ sightLine }: BendResult): readonly (readonly [number, Side])[] =>
  sightLine === null
    ? []
    : [
        [sightLine.startUnderNose, 'datum'],
        [sightLine.endUnderNose, 'far'],
      ];

function tangentStations(bends: readonly Placed[], { figureOf }: BlankOptions): StationAt[] {
  return bends.flatMap((bend) =>
    [bend.tangentStart, bend.tangentEnd].map((at): StationAt => {
      return { at, text: figureOf(at), role: 'station', pick: bend.chain };
    }),
  );
}

function sightStations(bends: readonly Placed[], { figureOf }: BlankOptions): StationAt[] {
  return bends.flatMap((bend) =>
    sightLines(bend).map(([at, side]): StationAt => {
      return { at, text: `${figureOf(at)} ${SIDE_LETTERS[side]}`, role: 'station', pick: bend.chain };
    }),
  );
}

/** Tangent lines are always there, faint or full; sight lines only when asked for. */
function lineMarks(
  bends: readonly Placed[],
  x: (station: number) => number,
  top: number,
  foot: number,
  { lines }: BlankOptions,
): Mark[] {
  const down = (at: number): string => linePath({ x: x(at), y: top }, { x: x(at), y: foot });
  return bends.flatMap((bend): Mark[] => {
    const common = { pick: bend.chain };
    const marks: Mark[] = [
      { kind: 'path', role: 'centre', d: down(bend.centre), ...common },
      { kind: 'path', role: 'tangent', d: down(bend.tangentStart) + down(bend.tangentEnd), ...common },
    ];
    if (lines === 'tangents') return marks;
    const sights = sightLines(bend).map(([at, side]): Mark => ({
      kind: 'path',
      role: `sight-${side}`,
      d: down(at),
      ...common,
    }));
    return [...marks, ...sights];
  });
}
