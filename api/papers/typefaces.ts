import fontkit from '@pdf-lib/fontkit';
import type { Font } from '@pdf-lib/fontkit';
import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { PACKAGE_ROOT } from '../package-root';
import type { Weight } from './sheet';

export type Coverage = 'Latin' | 'LatinExt';
export type FaceName = `${'Regular' | 'SemiBold'}-${Coverage}`;

export interface Face {
  readonly name: FaceName;
  readonly bytes: Uint8Array;
  readonly font: Font;
}

/** A stretch of text that one face can write. */
export interface Run {
  readonly face: Face;
  readonly text: string;
}

/** Stands for a character no face has; left alone it would be blank, and a name would lose a letter unseen. */
export const REPLACEMENT = '?';

const COVERAGES: readonly Coverage[] = ['Latin', 'LatinExt'];
const parsed = new Map<FaceName, Face>();

/** A face, read and parsed once: parsing costs more than a whole drawing. */
export function face(weight: Weight, coverage: Coverage): Face {
  const name: FaceName = `${weight === 'semibold' ? 'SemiBold' : 'Regular'}-${coverage}`;
  const known = parsed.get(name);
  if (known) return known;
  const bytes = new Uint8Array(readFileSync(join(PACKAGE_ROOT, 'public-fonts', `IBMPlexSans-${name}.ttf`)));
  const made: Face = { name, bytes, font: fontkit.create(bytes) };
  // A glyph keeps the character it was first asked for by. Asked for as a part of another (the points of a colon) it
  // would keep none, and every full stop would be missing where the paper's text is searched or copied.
  for (const code of made.font.characterSet) made.font.glyphForCodePoint(code);
  parsed.set(name, made);
  return made;
}

/** White space of any kind becomes a space, other control and invisible marks go, accents join their letters. */
export function cleanText(text: string): string {
  return text
    .normalize('NFC')
    .replace(/\s/gu, ' ')
    .replace(/[\p{Cc}\p{Cf}]/gu, '');
}

/** Splits a text into runs by the face that has each character: basic Latin first, then extended, then "?". */
export function runsOf(text: string, weight: Weight): Run[] {
  const runs: { face: Face; text: string }[] = [];
  for (const character of cleanText(text)) {
    const code = character.codePointAt(0) ?? 0;
    const owner = COVERAGES.map((coverage) => face(weight, coverage)).find(({ font }) =>
      font.hasGlyphForCodePoint(code),
    );
    const used = owner ?? face(weight, 'Latin');
    const written = owner ? character : REPLACEMENT;
    const last = runs.at(-1);
    if (last && last.face === used) last.text += written;
    else runs.push({ face: used, text: written });
  }
  return runs;
}
