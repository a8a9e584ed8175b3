/** What the things of a part are called, on the screen and on paper alike. */
import type { BendResult } from '../result';
import { formatAngle } from '../units/format';
import type { Grain, Measure, Unit } from './document';

export const UNIT_WORDS: Readonly<Record<Unit, string>> = { in: 'inches', mm: 'millimetres' };

export const MEASURE_WORDS: Readonly<Record<Measure, string>> = {
  'mold-line': 'mold line',
  'outside-edge': 'by calipers',
  inside: 'inside',
  flat: 'flat',
};

/** @example measureWords(['inside', 'flat']) // 'inside / flat' */
export function measureWords([start, end]: readonly [Measure, Measure]): string {
  return start === end ? MEASURE_WORDS[start] : `${MEASURE_WORDS[start]} / ${MEASURE_WORDS[end]}`;
}

export const GRAIN_WORDS: Readonly<Record<Grain, string>> = {
  along: 'grain along the bend lines',
  across: 'grain across, square to the bend lines',
};

/** A leg's own name, else "Leg 2" (counted from 1, as people do). */
export function legName(name: string | null, index: number): string {
  return name === null || name.trim() === '' ? `Leg ${index + 1}` : name.trim();
}

/** A bend line on blank, card and papers. @example lineName(1) // 'L2' */
export const lineName = (index: number): string => `L${index + 1}`;

/** The face of the blank that looks up when the bend is made on a leaf that swings up; A is up on the first leg. */
export const faceUp = ({ turn }: Pick<BendResult, 'turn'>): string => (turn === 'up' ? 'face A up' : 'face B up');

/** @param angle degrees from flat @example between(60) // '120° between' */
export const between = (angle: number): string => `${formatAngle(180 - angle)} between`;

/** @param angle degrees from flat @example betweenLegs(60) // '120° between legs' */
export const betweenLegs = (angle: number): string => `${between(angle)} legs`;

/** How far the metal is bent, and what that leaves. @example angleWords(60) // '60° (120° between legs)' */
export const angleWords = (angle: number): string => `${formatAngle(angle)} (${betweenLegs(angle)})`;

/** What has to be known to make a bend: said in one line, or part under part where there is less room. */
export interface LineNote {
  readonly line: string;
  readonly face: string;
  readonly angle: string;
  readonly between: string;
}

export const lineNote = (bend: Pick<BendResult, 'turn' | 'angle'>, index: number): LineNote => ({
  line: lineName(index),
  face: faceUp(bend),
  angle: formatAngle(bend.angle),
  between: betweenLegs(bend.angle),
});

/** @example inOneLine(lineNote({ turn: 'down', angle: 90 }, 1)) // 'L2 · face B up · 90° (90° between legs)' */
export const inOneLine = ({ line, face, angle, between: legs }: LineNote): string =>
  `${line} · ${face} · ${angle} (${legs})`;
