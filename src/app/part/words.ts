/** What things of the part are called on the page. */
import type { Allowance, AllowanceMethod, Measure, Unit } from '@shared/part/document';
import type { BendResult, FindingLevel, Solved } from '@shared/result';
import { formatAngle } from '@shared/units/format';

export const MEASURES: readonly Measure[] = ['mold-line', 'outside-edge', 'inside', 'flat'];

export const MEASURE_WORDS: Readonly<Record<Measure, string>> = {
  'mold-line': 'mold line',
  'outside-edge': 'by calipers',
  inside: 'inside',
  flat: 'flat',
};

export const UNIT_WORDS: Readonly<Record<Unit, string>> = { in: 'inches', mm: 'millimetres' };

export const METHOD_WORDS: Readonly<Record<AllowanceMethod, string>> = {
  handbook: 'handbook',
  'k-factor': 'K-factor',
  'din-6935': 'DIN 6935',
  'rule-90': '90° rule',
  shop: 'shop figure',
  measured: 'measured',
};

/** Methods that a whole part can be given here; a shop figure or a measured allowance stays when a document brings one. */
export const PART_METHODS: readonly Allowance['method'][] = ['handbook', 'k-factor', 'din-6935', 'rule-90'];

export const LEVELS: readonly FindingLevel[] = ['stop', 'caution', 'note'];

/** The side that faces up when the bend is made: A is up on the first leg. */
export const faceUp = (bend: Pick<BendResult, 'turn'>): string => (bend.turn === 'up' ? 'face A up' : 'face B up');

export const bendName = (index: number): string => `L${index + 1}`;

export const between = (angle: number): string => `${formatAngle(180 - angle)} between`;

export const betweenLegs = (angle: number): string => `${between(angle)} legs`;

/** The whole of a bend in a sentence, for those who do not see the drawing. */
export function bendSentence(solved: Solved, index: number, figure: (length: number) => string): string {
  const bend = solved.bends[index];
  if (!bend) return '';
  const name = bend.name === null ? bendName(index) : `${bendName(index)}, ${bend.name}`;
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

/** Names the places of a finding as the ledger does: "L2", "leg 3". */
export function placeWords(solved: Solved, at: string): string {
  const words = placesOf(at).map((chain) => {
    const leg = solved.legs.findIndex((one) => one.chain === chain);
    if (leg >= 0) return solved.legs[leg]?.name ?? `leg ${leg + 1}`;
    const bend = solved.bends.findIndex((one) => one.chain === chain);
    return bend >= 0 ? bendName(bend) : '';
  });
  return words.filter((word) => word !== '').join(', ');
}

/** Entries of the chain that a finding names. */
export const placesOf = (at: string): number[] => [...at.matchAll(/chain\/(\d+)/g)].map((match) => Number(match[1]));
