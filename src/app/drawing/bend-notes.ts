/** What each bend line is called and how it is bent, under the blank: on one line where it fits, else stacked. */
import type { Mark } from './marks';
import { at, textWidth } from './marks';
import { seatLabels } from './spread';

export interface BendNote {
  readonly x: number;
  /** "L2", "face B up", "90°". */
  readonly parts: readonly [string, string, string];
  readonly pick: number;
  readonly selected: boolean;
}

const GAP = 12;
const LINE = 16;

const whole = (note: BendNote): string => note.parts.join(' · ');
const widest = (texts: readonly string[]): number =>
  Math.max(0, ...texts.map((text) => textWidth(text, 'note-strong')));
const stackedWidth = (notes: readonly BendNote[]): number => widest(notes.flatMap((note) => note.parts));

/** Length in pixels that the notes need side by side when they are stacked. */
export const notesRoom = (notes: readonly BendNote[]): number => notes.length * (stackedWidth(notes) + GAP);

export interface NoteBand {
  readonly marks: readonly Mark[];
  readonly height: number;
}

export function bendNotes(notes: readonly BendNote[], edge: number, low: number, high: number): NoteBand {
  if (notes.length === 0) return { marks: [], height: 0 };
  const width = widest(notes.map(whole));
  const inLine = notes.every((note, index) => index === 0 || note.x - (notes[index - 1]?.x ?? 0) >= width + GAP);
  const stacked = !inLine;
  const room = stacked ? stackedWidth(notes) : width;
  const inset = room / 2;
  const seats = seatLabels(
    notes.map((note) => note.x),
    room,
    GAP,
    low + inset,
    high - inset,
    1,
  );
  const top = edge + (stacked ? 26 : 18);
  const marks = notes.flatMap((note, index): Mark[] => {
    const x = seats[index]?.place ?? note.x;
    const common = { pick: note.pick, selected: note.selected, anchor: 'middle' } as const;
    if (!stacked) return [{ kind: 'text', role: 'note', text: whole(note), at: { x, y: top }, ...common }];
    const leader = [
      { x: note.x, y: edge + 2 },
      { x: note.x, y: edge + 6 },
      { x, y: edge + 16 },
    ];
    return [
      { kind: 'path', role: 'leader', d: `M${leader.map(at).join('L')}`, pick: note.pick, selected: note.selected },
      ...note.parts.map((text, line): Mark => {
        const role = line === 0 ? 'note-strong' : 'note';
        return { kind: 'text', role, text, at: { x, y: top + line * LINE }, ...common };
      }),
    ];
  });
  return { marks, height: top - edge + (stacked ? 2 * LINE : 0) + 10 };
}
