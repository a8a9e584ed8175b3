/** A drawing is plain data: what is to be drawn, in order, each mark with the role that styles it. */
import type { Box } from './box';
import type { Point } from './point';

export type LineRole =
  | 'sheet'
  | 'bend'
  | 'leg'
  | 'zone'
  | 'edge'
  | 'break'
  | 'tangent'
  | 'sight-datum'
  | 'sight-far'
  | 'centre'
  | 'dimension'
  | 'arrow'
  | 'mold'
  | 'leader'
  | 'grain'
  | 'hit';
export type TextRole = 'figure' | 'station' | 'end-station' | 'note' | 'note-strong' | 'label' | 'name';

export interface Common {
  /** Entry of the chain that this mark belongs to: a click on it selects the entry, and it is marked with the entry. */
  readonly pick?: number;
}
export type PathMark = Common & { readonly kind: 'path'; readonly role: LineRole; readonly d: string };
export type TextMark = Common & {
  readonly kind: 'text';
  readonly role: TextRole;
  readonly text: string;
  /** Half way up the figures, at the anchor. */
  readonly at: Point;
  readonly anchor: 'start' | 'middle' | 'end';
};
export type Mark = PathMark | TextMark;

export interface Drawing {
  readonly width: number;
  readonly height: number;
  readonly marks: readonly Mark[];
}

/** What is laid over a drawing for the entry that is selected, and which of its marks give way to that. */
export interface Overlay {
  readonly marks: readonly Mark[];
  readonly hides: readonly Mark[];
}

export const NO_OVERLAY: Overlay = { marks: [], hides: [] };

export const TEXT_SIZE: Readonly<Record<TextRole, number>> = {
  figure: 12.5,
  station: 14,
  'end-station': 14,
  note: 12,
  'note-strong': 12.5,
  label: 12,
  name: 12,
};

const BOLD: ReadonlySet<TextRole> = new Set(['station', 'end-station', 'note-strong']);

/** Width of a text in IBM Plex Sans with tabular figures, a little on the generous side so that nothing touches. */
export function textWidth(text: string, role: TextRole): number {
  let ems = 0;
  for (const letter of text) ems += emsOf(letter);
  return ems * TEXT_SIZE[role] * (BOLD.has(role) ? 1.05 : 1);
}

const known = new Map<string, number>();

function emsOf(letter: string): number {
  const ems = known.get(letter) ?? measureLetter(letter);
  known.set(letter, ems);
  return ems;
}

function measureLetter(letter: string): number {
  if (/[0-9]/.test(letter)) return 0.6;
  if (/[ .,:;·'|ijl]/.test(letter)) return 0.31;
  if (/[mwMW—]/.test(letter)) return 0.92;
  if (/[A-Z]/.test(letter)) return 0.66;
  // Beyond Latin nothing is known of a letter but that it is no wider than the line is high.
  return (letter.codePointAt(0) ?? 0) < 0x250 ? 0.58 : 1;
}

export const textHeight = (role: TextRole): number => TEXT_SIZE[role] * 1.2;

/** What a text takes up on the paper. */
export function textBox(mark: Pick<TextMark, 'text' | 'role' | 'at' | 'anchor'>): Box {
  const width = textWidth(mark.text, mark.role);
  const height = textHeight(mark.role);
  const left = mark.anchor === 'start' ? mark.at.x : mark.anchor === 'end' ? mark.at.x - width : mark.at.x - width / 2;
  return { left, right: left + width, top: mark.at.y - height / 2, bottom: mark.at.y + height / 2 };
}

const place = (value: number): string => String(Math.round(value * 100) / 100);

/** A point as path data writes it: hundredths of a pixel. */
export const at = (point: Point): string => `${place(point.x)} ${place(point.y)}`;

export const linePath = (from: Point, to: Point): string => `M${at(from)}L${at(to)}`;
