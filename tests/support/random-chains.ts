import { setback } from '../../shared/layout/setback';
import type { Bend, ChainEntry, Leg, Measure, PartDocument } from '../../shared/part/document';

/** A random part whose legs are all long enough for their bends; they may still run into each other. */
export interface RandomPart {
  readonly document: PartDocument;
  readonly thickness: number;
}

const MEASURES: readonly Measure[] = ['mold-line', 'outside-edge', 'inside', 'flat'];
const ANGLES = [90, 90, 90, 45, 135, 30, 60, 120, 22.5];

/** 0 to 12 bends, up and down, sharp and round, 1° to 180°, every way of measuring, three methods. */
export function randomPart(random: () => number): RandomPart {
  const between = (least: number, most: number): number => least + random() * (most - least);
  const oneOf = <T>(list: readonly T[]): T => list[Math.floor(random() * list.length)] as T;
  const thickness = between(0.01, 0.13);
  const bends = Array.from(
    { length: Math.floor(random() * 13) },
    (): Bend & { readonly bend: number; radius: number } => ({
      bend: random() < 0.03 ? 180 : random() < 0.5 ? oneOf(ANGLES) : between(1, 179),
      turn: oneOf(['up', 'down']),
      radius: random() < 0.1 ? 0 : between(0.01, 0.4),
    }),
  );
  const end = (bend: (typeof bends)[number] | undefined): { measure: Measure; back: number } => {
    if (bend === undefined) return { measure: 'mold-line', back: 0 };
    const measure = oneOf(bend.bend === 180 ? (['outside-edge', 'flat'] as const) : MEASURES);
    return { measure, back: setback(measure, bend.bend, bend.radius, thickness) ?? 0 };
  };
  const legs = Array.from({ length: bends.length + 1 }, (_, i): Leg => {
    const [start, stop] = [end(bends[i - 1]), end(bends[i])];
    return { leg: start.back + stop.back + between(0.05, 3), measure: [start.measure, stop.measure] };
  });
  const chain = legs.flatMap((leg, i): ChainEntry[] => {
    const bend = bends[i];
    return bend === undefined ? [leg] : [leg, bend];
  });
  const allowance = oneOf([
    { method: 'handbook' } as const,
    { method: 'k-factor', k: between(0.05, 0.5) } as const,
    { method: 'rule-90', hardness: 'medium' } as const,
  ]);
  const document: PartDocument = { format: 'leafwright/1', unit: 'in', thickness, allowance, chain, width: 5 };
  return { document, thickness };
}

/** The same part with every entry changed. */
export const withChain = (document: PartDocument, change: (entry: ChainEntry) => ChainEntry): PartDocument => ({
  ...document,
  chain: document.chain.map(change),
});
