/** The words of a typed chain, with their places; what stands in brackets belongs to one figure. */

export interface Word {
  readonly text: string;
  /** One of the chain's own words, not a figure. */
  readonly keyword: boolean;
  readonly start: number;
  readonly end: number;
}

export const TURN_WORDS = ['up', 'down'] as const;
export const MEASURE_WORDS = { mold: 'mold-line', outside: 'outside-edge', inside: 'inside', flat: 'flat' } as const;

const KEYWORDS: ReadonlySet<string> = new Set([...TURN_WORDS, 'joggle', 'run', ...Object.keys(MEASURE_WORDS)]);
/** `r1/8`, `r.16`, `r(W/8)`, or `r` alone before a figure. */
const RADIUS = /^r(?=$|[\d.(])/i;

/** Keywords and figures of the text, in order. Words between two keywords are one figure, spaces and all. */
export function wordsOf(text: string): Word[] {
  const words: Word[] = [];
  let depth = 0;
  let figure: { start: number; end: number } | null = null;
  const close = (): void => {
    if (figure !== null) words.push({ text: text.slice(figure.start, figure.end), keyword: false, ...figure });
    figure = null;
  };
  for (const { 0: piece, index } of text.matchAll(/\S+/g)) {
    let start = index;
    const end = index + piece.length;
    if (depth === 0 && KEYWORDS.has(piece.toLowerCase())) {
      close();
      words.push({ text: piece.toLowerCase(), keyword: true, start, end });
      continue;
    }
    if (depth === 0 && RADIUS.test(piece)) {
      close();
      words.push({ text: 'r', keyword: true, start, end: start + 1 });
      start += 1;
      if (start === end) continue;
    }
    figure = { start: (figure as { start: number } | null)?.start ?? start, end };
    for (const character of piece) depth = Math.max(0, depth + (character === '(' ? 1 : character === ')' ? -1 : 0));
  }
  close();
  return words;
}

/** Whether a figure would be misread without brackets: it holds one of the chain's own words. */
const needsBrackets = (figure: string): boolean =>
  figure.split(/\s+/).some((piece) => KEYWORDS.has(piece.toLowerCase()) || RADIUS.test(piece));

/** The first word of a figure (brackets kept whole), and the rest of it when there is any. */
export function splitFirst(word: Word): { figure: Word; rest: Word | null } {
  let depth = 0;
  for (let i = 0; i < word.text.length; i += 1) {
    const character = word.text.charAt(i);
    if (character === '(') depth += 1;
    else if (character === ')') depth -= 1;
    else if (depth <= 0 && /\s/.test(character)) {
      const after = i + word.text.slice(i).search(/\S/);
      return {
        figure: { ...word, text: word.text.slice(0, i), end: word.start + i },
        rest: { ...word, text: word.text.slice(after), start: word.start + after },
      };
    }
  }
  return { figure: word, rest: null };
}

/** Takes off brackets that only keep a figure together; the printer puts them on again. */
export function unwrap(word: Word, oneWord: boolean): Word {
  const { text, start, end } = word;
  if (!isBracketed(text)) return word;
  const inner = text.slice(1, -1);
  const needed = needsBrackets(inner) || (oneWord && /\s/.test(inner.trim()));
  return needed ? { ...word, text: inner, start: start + 1, end: end - 1 } : word;
}

/** Puts on the brackets without which a figure would be read as several words. */
export function wrap(figure: string, oneWord: boolean): string {
  return needsBrackets(figure) || (oneWord && /\s/.test(figure)) ? `(${figure})` : figure;
}

/** One pair of brackets around the whole. */
function isBracketed(text: string): boolean {
  if (!text.startsWith('(')) return false;
  let depth = 0;
  for (let i = 0; i < text.length; i += 1) {
    if (text.charAt(i) === '(') depth += 1;
    else if (text.charAt(i) === ')') depth -= 1;
    if (depth === 0) return i === text.length - 1;
  }
  return false;
}
