/** What only the page says of a part; what the papers say too stands in shared/part. */
import type { Allowance } from '@shared/part/document';
import { betweenLegs, faceUp, lineName } from '@shared/part/words';
import type { Solved } from '@shared/result';
import { formatAngle } from '@shared/units/format';

/** Methods that a whole part can be given here; a shop figure or a measured allowance stays when a document brings one. */
export const PART_METHODS: readonly Allowance['method'][] = ['handbook', 'k-factor', 'din-6935', 'rule-90'];

/** The whole of a bend in a sentence, for those who do not see the drawing. */
export function bendSentence(solved: Solved, index: number, figure: (length: number) => string): string {
  const bend = solved.bends[index];
  if (!bend) return '';
  const name = bend.name === null ? lineName(index) : `${lineName(index)}, ${bend.name}`;
  const lines =
    bend.tangentStart === null || bend.tangentEnd === null
      ? 'its stations are not known'
      : `tangent lines at ${figure(bend.tangentStart)} and ${figure(bend.tangentEnd)}`;
  const sight = bend.sightLine
    ? `, sight line at ${figure(bend.sightLine.startUnderNose)} with the datum side under the nose` +
      ` or ${figure(bend.sightLine.endUnderNose)} with the far side under the nose`
    : '';
  const angles = `${formatAngle(bend.angle)} ${bend.turn}, ${betweenLegs(bend.angle)}`;
  return `${name}: ${faceUp(bend)}, ${angles}, inside radius ${figure(bend.radius)}, ${lines}${sight}.`;
}
