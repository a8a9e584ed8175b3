import { cleanText, runsOf } from './typefaces';

const plain = (words: string): [string, string][] =>
  runsOf(words, 'regular').map(({ face, text }) => [face.name, text]);

describe('runsOf', () => {
  it('writes a text of the basic face in one run', () => {
    expect(plain('5 53/64 −0.007 · 90° × Ø')).toEqual([['Regular-Latin', '5 53/64 −0.007 · 90° × Ø']]);
    expect(runsOf('L1', 'semibold')[0]?.face.name).toBe('SemiBold-Latin');
  });

  it('takes the extended face for a letter that only it has', () => {
    expect(plain('aŁb')).toEqual([
      ['Regular-Latin', 'a'],
      ['Regular-LatinExt', 'Ł'],
      ['Regular-Latin', 'b'],
    ]);
  });

  it('shows a mark for a character that no face has, never nothing', () => {
    expect(plain('⌀5 → 左')).toEqual([['Regular-Latin', '?5 ? ?']]);
    expect(plain('😀')).toEqual([['Regular-Latin', '?']]);
  });

  it('joins accents, turns any white space into a space and drops what has no ink', () => {
    expect(cleanText('e\u0301')).toBe('é');
    expect(cleanText('a\nb\tc\u00a0d')).toBe('a b c d');
    expect(cleanText('a\u200bb\u0007c')).toBe('abc');
  });
});
