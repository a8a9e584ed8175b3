import { runsOf } from './typefaces';
import type { Box, Shade, TextMark, Weight } from './sheet';

/** Height of capitals and figures over the size of the type. */
export const CAPITAL = 0.7;

export interface Extent {
  readonly width: number;
  /** Ink above and below the baseline, mm. */
  readonly above: number;
  readonly below: number;
}

export interface Lettering {
  readonly size: number;
  readonly weight?: Weight;
  readonly shade?: Shade;
  readonly align?: 'left' | 'centre' | 'right';
  readonly upward?: boolean;
  readonly clear?: boolean;
}

const known = new Map<string, Extent>();

/** Extent per mm of type, kept: the same figures and words come again and again in one paper. */
function unitExtent(text: string, weight: Weight): Extent {
  const key = weight + text;
  const kept = known.get(key);
  if (kept) return kept;
  let width = 0;
  let above = 0;
  let below = 0;
  for (const run of runsOf(text, weight)) {
    const em = run.face.font.unitsPerEm;
    for (const character of run.text) {
      const glyph = run.face.font.glyphForCodePoint(character.codePointAt(0) ?? 0);
      width += glyph.advanceWidth / em;
      above = Math.max(above, glyph.bbox.maxY / em);
      below = Math.max(below, -glyph.bbox.minY / em);
    }
  }
  const extent = { width, above: Number.isFinite(above) ? above : 0, below: Number.isFinite(below) ? below : 0 };
  if (known.size > 5000) known.clear();
  known.set(key, extent);
  return extent;
}

export function extentOf(text: string, size: number, weight: Weight = 'regular'): Extent {
  const { width, above, below } = unitExtent(text, weight);
  return { width: width * size, above: above * size, below: below * size };
}

export const widthOf = (text: string, size: number, weight: Weight = 'regular'): number =>
  extentOf(text, size, weight).width;

/** A text with its baseline through (x, y); `align` says which of its points lies there, along the way it reads. */
export function text(words: string, x: number, y: number, how: Lettering): TextMark {
  const { size, weight = 'regular', shade = 0, align = 'left', upward = false, clear = false } = how;
  const { width, above, below } = extentOf(words, size, weight);
  const back = align === 'left' ? 0 : align === 'right' ? width : width / 2;
  const at = upward ? { x, y: y + back } : { x: x - back, y };
  const box: Box = upward
    ? { x: at.x - above, y: at.y - width, width: above + below, height: width }
    : { x: at.x, y: at.y - above, width, height: above + below };
  return { kind: 'text', text: words, at, size, weight, shade, upward, clear, box };
}

/** The text, or as much of it as fits with an ellipsis. */
export function shorten(words: string, room: number, size: number, weight: Weight = 'regular'): string {
  if (widthOf(words, size, weight) <= room) return words;
  const characters = Array.from(words);
  let low = 0;
  let high = characters.length;
  while (low < high) {
    const middle = Math.ceil((low + high) / 2);
    const candidate = characters.slice(0, middle).join('').trimEnd() + '…';
    if (widthOf(candidate, size, weight) <= room) low = middle;
    else high = middle - 1;
  }
  return characters.slice(0, low).join('').trimEnd() + '…';
}

/** Breaks a text into lines no wider than `room`; a word too long for a line is cut, and the last line says … when more is left. */
export function wrap(words: string, room: number, size: number, most = Infinity, weight: Weight = 'regular'): string[] {
  const lines: string[] = [];
  let current = '';
  for (const word of words.split(/\s+/u).filter((part) => part !== '')) {
    let rest = word;
    if (current !== '' && widthOf(`${current} ${rest}`, size, weight) <= room) {
      current = `${current} ${rest}`;
      continue;
    }
    if (current !== '') lines.push(current);
    while (widthOf(rest, size, weight) > room) {
      const head = headThatFits(rest, room, size, weight);
      lines.push(head);
      rest = rest.slice(head.length);
    }
    current = rest;
  }
  if (current !== '') lines.push(current);
  if (lines.length <= most) return lines;
  const kept = lines.slice(0, most);
  const left = lines.slice(most - 1).join(' ');
  kept[most - 1] = shorten(left, room, size, weight);
  return kept;
}

function headThatFits(word: string, room: number, size: number, weight: Weight): string {
  let head = '';
  for (const character of word) {
    if (head !== '' && widthOf(head + character, size, weight) > room) break;
    head += character;
  }
  return head;
}
