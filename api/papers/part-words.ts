import type { Allowance, Measure, PartDocument } from '../../shared/part/document';
import type { BendResult, Solved } from '../../shared/result';
import { formatAngle } from '../../shared/units/format';

export const lineName = (index: number): string => `L${index + 1}`;

export const legName = (name: string | null, index: number): string => name ?? `Leg ${index + 1}`;

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

/** The face of the blank that looks up when the bend is made on a leaf that swings up. */
export const faceUp = (bend: BendResult): string => (bend.turn === 'up' ? 'face A up' : 'face B up');

export const betweenLegs = (bend: BendResult): string => `${formatAngle(180 - bend.angle)} between legs`;

const MEASURE_WORDS: Readonly<Record<Measure, string>> = {
  'mold-line': 'mold line',
  'outside-edge': 'by calipers',
  inside: 'inside',
  flat: 'flat',
};

export function measureWords([start, end]: readonly [Measure, Measure]): string {
  return start === end ? MEASURE_WORDS[start] : `${MEASURE_WORDS[start]} / ${MEASURE_WORDS[end]}`;
}

export function materialWords(material: PartDocument['material']): string {
  if (material === undefined) return 'not stated';
  return typeof material === 'string' ? material : material.name;
}

export const METHOD_NAMES: Readonly<Record<Allowance['method'], string>> = {
  'k-factor': 'K-factor',
  handbook: 'handbook',
  'din-6935': 'DIN 6935',
  'rule-90': '90° rule',
  shop: 'shop figure',
  measured: 'measured',
};

const RULE_90 = { soft: '0.55', medium: '0.64', hard: '0.71' } as const;

/** How bend allowances were found, and on whose word. */
export function allowanceWords(allowance: Allowance): string {
  switch (allowance.method) {
    case 'k-factor':
      return `K-factor ${allowance.k} as given by the designer: BA = A in radians · (R + K·T). Source: definition of K`;
    case 'handbook':
      return 'Handbook rule BA = (0.01743·R + 0.0078·T)·A, A in degrees. Source: FAA-H-8083-31 ch. 4';
    case 'din-6935':
      return 'K from R/T: half of 0.65 + 0.5·log10(R/T), 0.5 beyond R/T 5. Source: DIN 6935';
    case 'rule-90':
      return `90° rule, ${allowance.hardness} metal: ${RULE_90[allowance.hardness]}·T + 1.57·R, in proportion to A/90. Source: Machinery's Handbook, bending allowances`;
    case 'shop':
      return `Shop figure, K ${allowance.k}, from the shop's own bend coupons. Source: measured`;
    case 'measured':
      return `Arc length ${allowance.allowance} stated for the bend. Source: measured`;
  }
}

/** The part's method, and the lines that go by another one. */
export function partAllowanceWords(document: PartDocument, result: Solved): string {
  const others = new Map<string, string[]>();
  result.bends.forEach((bend, index) => {
    if (bend.method === document.allowance.method) return;
    const name = METHOD_NAMES[bend.method];
    others.set(name, [...(others.get(name) ?? []), lineName(index)]);
  });
  const except = [...others].map(([name, lines]) => `${lines.join(', ')} by ${name}`);
  return [...except.map((words) => `${words}.`), allowanceWords(document.allowance)].join(' ');
}

/** "L2", "Left flange and L3", "hole 1", "the part": a finding's place in the words of the paper. */
export function placeWords(at: string, result: Solved): string {
  const places = at.split(' ').filter((path) => path !== '');
  const words = places.map((path) => {
    const [list, number] = path.split('/');
    const index = Number(number);
    if (list === 'holes' && number !== undefined) return `hole ${index + 1}`;
    if (list !== 'chain' || number === undefined) return path;
    const lines = result.bends.flatMap((bend, place) => (bend.chain === index ? [lineName(place)] : []));
    if (lines.length > 0) return lines.join(', ');
    const leg = result.legs.findIndex(({ chain }) => chain === index);
    if (leg >= 0) return legName(result.legs[leg]?.name ?? null, leg);
    return result.joggles.some(({ chain }) => chain === index) ? 'joggle' : path;
  });
  return words.length === 0 ? 'the part' : words.join(' and ');
}
