/** Cuts a typed chain into pieces to be shown: its own words, the rest, and the word that an error points at. */
export interface Piece {
  readonly text: string;
  readonly kind: 'word' | 'figure';
  readonly wrong: boolean;
}

const WORDS = /\b(?:up|down|joggle|run|mold|outside|inside|flat)\b/gi;

export function chainWords(text: string, wrong: readonly { start: number; end: number }[]): Piece[] {
  const cuts = new Set([0, text.length]);
  const words = [...text.matchAll(WORDS)].map((match) => ({ start: match.index, end: match.index + match[0].length }));
  for (const { start, end } of [...words, ...wrong]) for (const place of [start, end]) cuts.add(place);
  const places = [...cuts].filter((place) => place >= 0 && place <= text.length).sort((a, b) => a - b);
  const within = (start: number, ranges: readonly { start: number; end: number }[]): boolean =>
    ranges.some((range) => range.start <= start && start < range.end);
  return places.slice(0, -1).map((start, index) => ({
    text: text.slice(start, places[index + 1]),
    kind: within(start, words) ? 'word' : 'figure',
    wrong: within(start, wrong),
  }));
}
