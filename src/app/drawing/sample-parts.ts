/** Parts to try the drawings on: zigzags, channels and spirals with any number of bends. */
import type { ChainEntry, PartDocument, Turn } from '@shared/part/document';
import type { Solved } from '@shared/result';
import { solve } from '@shared/solve';

export type Shape = 'tray' | 'zigzag' | 'spiral';

const TURNS: Readonly<Record<Shape, (bend: number) => Turn>> = {
  tray: (bend) => (Math.floor(bend / 2) % 2 === 0 ? 'up' : 'down'),
  zigzag: (bend) => (bend % 2 === 0 ? 'up' : 'down'),
  spiral: () => 'up',
};

export function samplePart(shape: Shape, bends: number, angle = 90): PartDocument {
  const chain: ChainEntry[] = [{ leg: 0.8 }];
  for (let bend = 0; bend < bends; bend++) {
    chain.push({ bend: angle, turn: TURNS[shape](bend), radius: 0.125 });
    chain.push({ leg: shape === 'spiral' ? 0.8 + bend * 0.4 : bend % 2 === 0 ? 1.2 : 0.9 });
  }
  const allowance = { method: 'handbook' } as const;
  return { format: 'leafwright/1', unit: 'in', thickness: 0.04, width: 6, allowance, chain };
}

export function solved(document: PartDocument): Solved {
  const result = solve(document);
  if (!result.ok) throw new Error(result.errors.map((error) => `${error.path}: ${error.message}`).join('\n'));
  return result;
}

/** Figures as the page shows an inch part. */
export const thousandths = (length: number): string => length.toFixed(3);
