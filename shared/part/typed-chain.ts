/**
 * The typed chain: a whole chain in one line.
 *
 * `1 up 90 r1/8 2 up 90 1` is a channel. A leg is its length, then how it is measured when not to the mold line: one of
 * `mold outside inside flat` for both ends or two for start and end. A bend is `up` or `down`, its angle, and `r` with its
 * radius, which later bends keep until another is given. A joggle is `joggle 0.04 run 0.3 up`, with `r` likewise.
 * Angles and radii are one word, so that the next leg can follow: put brackets around one with spaces, `r(1 1/8)`.
 */
import { compile } from '../units/expression';
import { FUNCTIONS } from '../units/functions';
import { ANGLE_UNITS, LENGTH_UNITS } from '../units/length';
import { type ChainEntry, type Expression, isBend, isLeg, type Leg, type Measure, type Turn } from './document';
import { keepFrom } from './keep-from';
import { measureEnds } from './measure';
import { MEASURE_WORDS, splitFirst, unwrap, type Word, wordsOf, wrap } from './typed-words';

export interface TypedError {
  readonly start: number;
  readonly end: number;
  readonly message: string;
}

/** Where a field of the document stands in the text, so that the engine's own errors can be shown at their word. */
export interface TypedField {
  readonly path: string;
  readonly start: number;
  readonly end: number;
}

export type TypedChain =
  | { readonly ok: true; readonly chain: ChainEntry[]; readonly fields: readonly TypedField[] }
  | { readonly ok: false; readonly errors: readonly TypedError[] };

/**
 * @param text what was typed @param previous the chain it replaces: names, ids, allowances and noses are kept where entries stay
 * @returns the chain with the place of every field in the text, or the first error with its place
 * @example parseTypedChain('1 up 90 r.16 2 up 90 1').ok // true
 */
export function parseTypedChain(text: string, previous: readonly ChainEntry[] = []): TypedChain {
  try {
    const { chain, fields } = new Reader(text).read();
    return { ok: true, chain: keepFrom(previous, chain), fields };
  } catch (problem) {
    if (!(problem instanceof TypedProblem)) throw problem;
    return { ok: false, errors: [problem.error] };
  }
}

class TypedProblem extends Error {
  constructor(readonly error: TypedError) {
    super(error.message);
  }
}

/** A name may be a variable of the part: whether it is one, the engine says. */
const mayBeVariable = (name: string): boolean =>
  !FUNCTIONS.has(name) && !LENGTH_UNITS.has(name) && !ANGLE_UNITS.has(name);

class Reader {
  /** What is left of a figure after its first word stays in its place. */
  private readonly words: Word[];
  private readonly chain: ChainEntry[] = [];
  private readonly fields: TypedField[] = [];
  private at = 0;
  private radius: Expression | null = null;

  constructor(private readonly text: string) {
    this.words = wordsOf(text);
  }

  read(): { chain: ChainEntry[]; fields: TypedField[] } {
    if (this.words.length === 0) this.fail('Type a chain, for example: 1 up 90 r1/8 2 up 90 1');
    this.leg();
    while (this.at < this.words.length) {
      this.joint();
      this.leg();
    }
    return { chain: this.chain, fields: this.fields };
  }

  private leg(): void {
    const leg = this.figure('leg', 'The length of a leg');
    const measures: Measure[] = [];
    for (let word = this.word(); word?.keyword && word.text in MEASURE_WORDS; word = this.word()) {
      if (measures.length === 2) this.fail('A leg has two ends: give one word for both, or two.', word);
      this.mark('measure', word);
      measures.push(MEASURE_WORDS[word.text as keyof typeof MEASURE_WORDS]);
      this.at += 1;
    }
    const [start, end] = measures;
    if (start === undefined) this.chain.push({ leg });
    else this.chain.push({ leg, measure: end === undefined || end === start ? start : [start, end] });
  }

  private joint(): void {
    const word = this.word()!;
    if (word.text === 'joggle' && word.keyword) {
      this.at += 1;
      const joggle = this.figure('joggle', 'The depth of the joggle');
      if (this.word()?.text !== 'run') this.fail('A joggle needs its run: joggle 0.04 run 0.3 up', this.word());
      this.at += 1;
      const run = this.figure('run', 'The run of the joggle');
      const turn = this.turn('A joggle steps up or down: joggle 0.04 run 0.3 up');
      this.chain.push({ joggle, run, turn, radius: this.radiusOr('joggle') });
      return;
    }
    const turn = this.turn('Expected "up", "down" or "joggle" between two legs.');
    const bend = this.figure('bend', 'The angle of the bend', true);
    this.chain.push({ bend, turn, radius: this.radiusOr('bend') });
  }

  private turn(message: string): Turn {
    const word = this.word();
    if (word?.keyword !== true || (word.text !== 'up' && word.text !== 'down')) return this.fail(message, word);
    this.mark('turn', word);
    this.at += 1;
    return word.text;
  }

  /** The radius, when given, else the one before. */
  private radiusOr(kind: string): Expression {
    const word = this.word();
    if (word?.keyword !== true || word.text !== 'r') {
      return this.radius ?? this.fail(`Give the first ${kind} its radius, for example r1/8.`, this.words[this.at - 1]);
    }
    this.at += 1;
    this.radius = this.figure('radius', 'The bend radius', true);
    return this.radius;
  }

  private figure(field: string, says: string, oneWord = false): Expression {
    const word = this.word();
    if (word === undefined || word.keyword) return this.fail(`${says} is missing here.`, word);
    const { figure: typed, rest } = oneWord ? splitFirst(word) : { figure: word, rest: null };
    if (rest === null) this.at += 1;
    else this.words[this.at] = rest;
    const figure = unwrap(typed, oneWord);
    const compiled = compile(figure.text, 'in', mayBeVariable);
    if (!compiled.ok) {
      const { start, end } = compiled;
      const stray = figure.text.slice(start, end);
      const isStray = !oneWord && start > 0 && /^\p{L}+$/u.test(stray);
      const message = isStray
        ? `"${stray}" is no word of a chain: between two legs stands up, down or joggle.`
        : compiled.message;
      throw new TypedProblem({ start: figure.start + start, end: figure.start + Math.max(end, start + 1), message });
    }
    this.mark(field, figure);
    const number = Number(figure.text);
    return String(number) === figure.text ? number : figure.text;
  }

  private word(): Word | undefined {
    return this.words[this.at];
  }

  private mark(field: string, { start, end }: Word): void {
    this.fields.push({ path: `chain/${this.chain.length}/${field}`, start, end });
  }

  private fail(message: string, word?: Word): never {
    const end = this.text.length;
    throw new TypedProblem({ start: word?.start ?? Math.max(0, end - 1), end: word?.end ?? end, message });
  }
}

/**
 * A chain as text; reading it back gives the same legs, bends and joggles.
 *
 * @param chain of any document @returns one line
 * @example printTypedChain([{ leg: 1 }, { bend: 90, turn: 'up', radius: '1/8' }, { leg: 2 }]) // '1 up 90 r1/8 2'
 */
export function printTypedChain(chain: readonly ChainEntry[]): string {
  let radius: Expression | null = null;
  const words = chain.flatMap((entry): string[] => {
    if (isLeg(entry)) return [print(entry.leg), ...measureWords(entry)];
    const own = entry.radius === radius ? [] : [radiusWord(print(entry.radius, true))];
    radius = entry.radius;
    if (isBend(entry)) return [entry.turn, print(entry.bend, true), ...own];
    return ['joggle', print(entry.joggle), 'run', print(entry.run), entry.turn, ...own];
  });
  return words.join(' ');
}

/** `r1/8` and `r(1 1/8)` are one word; a name or a sign after the r would read as another name. */
const radiusWord = (figure: string): string => (/^[\d.(]/.test(figure) ? `r${figure}` : `r ${figure}`);

const print = (figure: Expression, oneWord = false): string => wrap(String(figure), oneWord);

const WORD_OF = new Map(Object.entries(MEASURE_WORDS).map(([word, measure]) => [measure, word]));

function measureWords(leg: Leg): string[] {
  const [start, end] = measureEnds(leg);
  if (start === end) return start === 'mold-line' ? [] : [WORD_OF.get(start)!];
  return [WORD_OF.get(start)!, WORD_OF.get(end)!];
}
