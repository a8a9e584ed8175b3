/** Where a finding sits, and in which order findings are read, on the screen and on paper alike. */
import type { FindingLevel, Solved } from '../result';
import { legName, lineName } from './words';

export const FINDING_LEVELS: readonly FindingLevel[] = ['stop', 'caution', 'note'];

type Named = Pick<Solved, 'legs' | 'bends' | 'joggles'>;

/**
 * A finding's place by the names that people read: "L2", "Left flange and L3", "hole 1"; empty for the part as a whole.
 *
 * @param solved that the finding is about @param at paths of the document, one space between them
 */
export function placeWords(solved: Named, at: string): string {
  const paths = at.split(' ').filter((path) => path !== '');
  return paths.map((path) => wordsOf(solved, path)).join(' and ');
}

/** Entries of the chain that a finding names. @example placesOf('chain/1 chain/3') // [1, 3] */
export const placesOf = (at: string): number[] => [...at.matchAll(/chain\/(\d+)/g)].map((match) => Number(match[1]));

function wordsOf({ legs, bends, joggles }: Named, path: string): string {
  const [list, number] = path.split('/');
  const index = Number(number);
  if (list === 'holes' && number !== undefined) return `hole ${index + 1}`;
  if (list !== 'chain' || number === undefined) return path;
  const lines = bends.flatMap((bend, place) => (bend.chain === index ? [lineName(place)] : []));
  if (lines.length > 0) return lines.join(', ');
  const leg = legs.findIndex(({ chain }) => chain === index);
  if (leg >= 0) return legName(legs[leg]?.name ?? null, leg);
  return joggles.some(({ chain }) => chain === index) ? 'joggle' : path;
}
