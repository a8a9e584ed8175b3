/** What only a paper says of a part; what the screen says too stands in shared/part. */
import { METHOD_WORDS, allowanceWords } from '../../shared/part/allowance-words';
import type { PartDocument } from '../../shared/part/document';
import { legName, lineName } from '../../shared/part/words';
import type { BendResult, Solved } from '../../shared/result';

/** A bend's own name, else what it lies between. */
export function bendName(bend: BendResult, { legs, bends, joggles }: Solved): string {
  if (bend.name !== null) return bend.name;
  if (bend.joggle !== null) {
    const first = bends.findIndex(({ joggle }) => joggle === bend.joggle);
    const which = bends[first] === bend ? 'first bend' : 'second bend';
    return joggles.length > 1 ? `joggle ${bend.joggle + 1}, ${which}` : `joggle, ${which}`;
  }
  const before = legs.findIndex(({ chain }) => chain === bend.chain - 1);
  const after = legs.findIndex(({ chain }) => chain === bend.chain + 1);
  if (before < 0 || after < 0) return '';
  return `${legName(legs[before]?.name ?? null, before)} to ${legName(legs[after]?.name ?? null, after)}`;
}

export function materialWords(material: PartDocument['material']): string {
  if (material === undefined) return 'not stated';
  return typeof material === 'string' ? material : material.name;
}

/** The part's method, and the lines that go by another one. */
export function partAllowanceWords(document: PartDocument, result: Solved): string {
  const others = new Map<string, string[]>();
  result.bends.forEach((bend, index) => {
    if (bend.method === document.allowance.method) return;
    const name = METHOD_WORDS[bend.method];
    others.set(name, [...(others.get(name) ?? []), lineName(index)]);
  });
  const except = [...others].map(([name, lines]) => `${lines.join(', ')} by ${name}`);
  return [...except.map((words) => `${words}.`), allowanceWords(document.allowance)].join(' ');
}
