import type { Solved } from '@shared/result';
import { solve } from '@shared/solve';
import { channel } from './sample-part';
import { bendSentence } from './words';

const solved = solve(channel) as Solved;
const figure = (length: number): string => length.toFixed(3);

describe('the words of the part page', () => {
  it('tell a bend in a sentence', () => {
    const sentence = bendSentence(solved, 0, figure);
    expect(sentence).toContain('L1: face A up, 90° up, 90° between legs, inside radius 0.160');
    expect(sentence).toContain('tangent lines at 0.800 and 1.079');
    expect(sentence).toContain('datum side under the nose');
    expect(bendSentence(solved, 9, figure)).toBe('');
  });

  it('say so when the stations are not known', () => {
    const consumed = solve({ ...channel, chain: channel.chain.with(2, { leg: 0.2 }) }) as Solved;
    expect(bendSentence(consumed, 1, figure)).toContain('its stations are not known');
  });
});
