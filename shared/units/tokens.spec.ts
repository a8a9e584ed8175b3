import { tokenize } from './tokens';

const shown = (text: string): string[] =>
  (tokenize(text).tokens ?? []).map((token) => {
    const what = token.kind === 'figure' ? token.value : token.kind === 'name' ? token.name : token.sign;
    return `${what}@${token.start}-${token.end}`;
  });

describe('tokenize', () => {
  it('cuts figures, names and signs with their places', () => {
    expect(shown('W/2 + 1.5e-3')).toEqual(['W@0-1', '/@1-2', '2@2-3', '+@4-5', '0.0015@6-12']);
    expect(shown('  ')).toEqual([]);
    expect(shown('.5.5')).toEqual(['0.5@0-2', '0.5@2-4']);
    expect(shown('2mm')).toEqual(['2@0-1', 'mm@1-3']);
    expect(shown('Größe_2')).toEqual(['Größe_2@0-7']);
    expect(shown('90°')).toEqual(['90@0-2', '°@2-3']);
  });

  it('tells whole numbers from decimals', () => {
    const integer = (text: string): unknown =>
      tokenize(text).tokens?.map((token) => 'integer' in token && token.integer);
    expect(integer('12')).toEqual([true]);
    expect(integer('12.')).toEqual([false]);
    expect(integer('1e2')).toEqual([false]);
  });

  it('stops at the first character that has no business in a figure', () => {
    expect(tokenize('1 + $').error).toEqual({ message: `"$" can't be part of a figure.`, start: 4, end: 5 });
    expect(tokenize('😀').error).toEqual({ message: `"😀" can't be part of a figure.`, start: 0, end: 2 });
    expect(tokenize('\ud800').error?.end).toBe(1);
  });
});
