/** What each bend line is called and how it is bent, under the blank: on one line where it fits, else stacked. */
import { inOneLine, type LineNote } from '@shared/part/words';
import type { Mark } from './marks';
import { at, textWidth } from './marks';
import { seatLabels } from './seat-labels';

export interface BendNote {
  readonly x: number;
  readonly note: LineNote;
  readonly pick: number;
}

const GAP = 12;
const LINE = 16;

/** From the fullest to the least: ledger and table of stations have the angle between the legs where it has no room here. */
const WAYS: readonly ((note: LineNote) => readonly string[])[] = [
  (note) => [inOneLine(note)],
  ({ line, face, angle, between }) => [`${line} · ${face}`, `${angle} (${between})`],
  ({ line, face, angle, between }) => [line, face, angle, between],
  ({ line, face, angle }) => [line, face, angle],
];

/** Most of the texts are the same for every bend: each is measured once. */
const widest = (texts: readonly string[]): number =>
  Math.max(0, ...[...new Set(texts)].map((text) => textWidth(text, 'note-strong')));

/** Length in pixels that the notes need side by side at the least. */
export function notesRoom(notes: readonly LineNote[]): number {
  const least = WAYS.at(-1);
  return least ? notes.length * (widest(notes.flatMap(least)) + GAP) : 0;
}

export interface NoteBand {
  readonly marks: readonly Mark[];
  readonly height: number;
}

export function bendNotes(notes: readonly BendNote[], edge: number, low: number, high: number): NoteBand {
  if (notes.length === 0) return { marks: [], height: 0 };
  const ways = WAYS.map((way) => notes.map(({ note }) => way(note)));
  const fits = (texts: readonly (readonly string[])[]): boolean => {
    const room = widest(texts.flat()) + GAP;
    // One line has no leader, so that each must stand at its own place.
    const apart = notes.every((note, index) => index === 0 || note.x - (notes[index - 1]?.x ?? 0) >= room);
    return (texts[0]?.length === 1 ? apart : true) && notes.length * room <= high - low;
  };
  const texts = ways.find(fits) ?? ways.at(-1) ?? [];
  const rows = texts[0]?.length ?? 0;
  const width = widest(texts.flat());
  const seats = seatLabels(
    notes.map((note) => note.x),
    width,
    GAP,
    low + width / 2,
    high - width / 2,
    1,
  );
  const top = edge + (rows > 1 ? 26 : 18);
  const marks = notes.flatMap((note, index): Mark[] => {
    const x = seats[index]?.place ?? note.x;
    const { pick } = note;
    const leader = [
      { x: note.x, y: edge + 2 },
      { x: note.x, y: edge + 6 },
      { x, y: edge + 16 },
    ];
    return [
      ...(rows > 1 ? [{ kind: 'path', role: 'leader', d: `M${leader.map(at).join('L')}`, pick } as const] : []),
      ...(texts[index] ?? []).map((text, row): Mark => {
        const role = rows > 1 && row === 0 ? 'note-strong' : 'note';
        return { kind: 'text', role, text, at: { x, y: top + row * LINE }, anchor: 'middle', pick };
      }),
    ];
  });
  return { marks, height: top - edge + (rows - 1) * LINE + 10 };
}
