import { chainWords } from './chain-words';

describe('the words of a typed chain', () => {
  it('are told from its figures and lose nothing', () => {
    const text = '1 up 90 r.16  2 down 90 1/2 inside';
    const pieces = chainWords(text, []);
    expect(pieces.map((piece) => piece.text).join('')).toBe(text);
    expect(pieces.filter((piece) => piece.kind === 'word').map((piece) => piece.text)).toEqual([
      'up',
      'down',
      'inside',
    ]);
  });

  it('are marked where an error points, within a word too', () => {
    const pieces = chainWords('1 upp 90', [{ start: 2, end: 5 }]);
    expect(pieces.filter((piece) => piece.wrong).map((piece) => piece.text)).toEqual(['upp']);
    expect(chainWords('12', [{ start: 1, end: 2 }]).map((piece) => piece.wrong)).toEqual([false, true]);
  });

  it('are none in an empty text', () => {
    expect(chainWords('', [{ start: 0, end: 1 }])).toEqual([]);
  });
});
