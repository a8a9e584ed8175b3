import type { Finding, Solved } from '@shared/result';
import { solve } from '@shared/solve';
import { channel } from '../sample-part';
import { findingCounts, gatheredFindings } from './gathered-findings';

const finding = (level: Finding['level'], at: string, message: string): Finding => ({
  level,
  code: 'a-check',
  at,
  message,
  source: 'a source',
});

const withFindings = (...findings: Finding[]): Solved => ({ ...(solve(channel) as Solved), findings });

describe('gathered findings', () => {
  it('put stops before cautions before notes', () => {
    const solved = withFindings(
      finding('note', '', 'N.'),
      finding('caution', '', 'C.'),
      finding('stop', 'chain/2', 'Web is too short.'),
    );
    expect(gatheredFindings(solved).map((one) => one.level)).toEqual(['stop', 'caution', 'note']);
    expect(findingCounts(solved)).toBe('1 stop, 1 caution, 1 note');
  });

  it('name the place once, by the name that the ledger gives it', () => {
    const [one] = gatheredFindings(withFindings(finding('stop', 'chain/2', 'Web is too short.')));
    expect(one?.places).toEqual([{ words: 'Web', chain: 2 }]);
    expect(one?.words).toBe('is too short.');
  });

  it('name a leg without a name once, though a sentence begins with a capital', () => {
    const nameless: Solved = solve({ ...channel, chain: [{ leg: 0.1 }, ...channel.chain.slice(1)] }) as Solved;
    const [one] = gatheredFindings(nameless);
    expect(one?.places[0]?.words).toMatch(/^leg 1$/i);
    expect(one?.words).toMatch(/^is 0\.1 in/);
  });

  it('say once what is said of several bends', () => {
    const solved = withFindings(
      finding('caution', 'chain/1', 'L1 is tight.'),
      finding('caution', 'chain/3', 'L2 is tight.'),
    );
    expect(gatheredFindings(solved).length).toBe(1);
    expect(gatheredFindings(solved)[0]?.places.map((place) => place.words)).toEqual(['L1', 'L2']);
    expect(findingCounts(solved)).toBe('2 cautions');
  });

  it('are none when nothing was found', () => {
    expect(gatheredFindings(withFindings())).toEqual([]);
    expect(findingCounts(withFindings())).toBe('');
  });
});
