import { FINDING_LEVELS, placesOf, placeWords } from '@shared/part/finding-words';
import type { Finding, FindingLevel, Solved } from '@shared/result';

export interface FindingPlace {
  readonly words: string;
  readonly chain: number | null;
}

/** One thing to be said, and every place that it is said of. */
export interface GatheredFinding {
  readonly level: FindingLevel;
  readonly words: string;
  readonly source: string;
  readonly places: readonly FindingPlace[];
}

/** Stops first, then cautions, then notes; what is said of several bends in the same words is said once. */
export function gatheredFindings(solved: Solved): GatheredFinding[] {
  const gathered = new Map<string, GatheredFinding>();
  const ranked = [...solved.findings].sort((a, b) => FINDING_LEVELS.indexOf(a.level) - FINDING_LEVELS.indexOf(b.level));
  for (const finding of ranked) {
    const place = placeOf(solved, finding);
    const words = wordsOf(finding, place);
    const key = [finding.level, finding.code, finding.source, words].join('\n');
    const former = gathered.get(key);
    const places = [...(former?.places ?? []), ...(place.words === '' ? [] : [place])];
    gathered.set(key, { level: finding.level, words, source: finding.source, places });
  }
  return [...gathered.values()];
}

const placeOf = (solved: Solved, { at }: Finding): FindingPlace => ({
  words: placeWords(solved, at),
  chain: placesOf(at)[0] ?? null,
});

/** Most messages begin with the name of their place, which stands before them anyway; a sentence begins with a capital. */
function wordsOf({ message }: Finding, { words }: FindingPlace): string {
  const named = words !== '' && message.slice(0, words.length + 1).toLowerCase() === `${words} `.toLowerCase();
  return named ? message.slice(words.length + 1) : message;
}

/** "1 stop, 24 cautions"; empty when there is nothing. */
export function findingCounts(solved: Solved): string {
  return FINDING_LEVELS.flatMap((level) => {
    const count = solved.findings.filter((finding) => finding.level === level).length;
    return count === 0 ? [] : [`${count} ${level}${count === 1 ? '' : 's'}`];
  }).join(', ');
}
