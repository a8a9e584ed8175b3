import type { BlankPaperInput } from '../../api/papers/blank-paper-input';
import type { ChainEntry, PartDocument } from '../../shared/part/document';
import type { Solved } from '../../shared/result';
import { solve } from '../../shared/solve';

export type DocumentParts = Partial<Omit<PartDocument, 'format'>> & Pick<PartDocument, 'chain'>;

/** A document in the usual sheet of these tests, 0.040 in by the handbook, with what the test changes. */
export const documentOf = (parts: DocumentParts): PartDocument => ({
  format: 'leafwright/1',
  unit: 'in',
  thickness: 0.04,
  material: '2024-T3',
  allowance: { method: 'handbook' },
  ...parts,
});

export function solved(document: PartDocument): Solved {
  const result = solve(document);
  if (!result.ok) throw new Error(JSON.stringify(result.errors));
  return result;
}

/** A draft of a part as it is handed to the paper, with the engine's own figures. */
export function paperInput(parts: DocumentParts, change: Partial<BlankPaperInput> = {}): BlankPaperInput {
  const document = documentOf(parts);
  return {
    part: { number: 'HC-2107-1', title: 'Hat stringer, bay 14 repair' },
    revision: {
      letter: 'A',
      state: 'draft',
      version: 7,
      changedAt: '2026-03-04T10:42:07.000Z',
      changedBy: 'designer@harrowcreek.example',
    },
    document,
    result: solved(document),
    shop: 'Harrow Creek',
    size: 'a4',
    issuedAt: new Date('2026-03-05T13:31:21.500Z'),
    issuedBy: 'technician@harrowcreek.example',
    ...change,
  };
}

const ANGLES = [90, 45, 30, 67.5];

/** A chain of any number of bends that winds up and down and never meets itself. */
export function windingChain(bends: number, leg: number, name?: string): ChainEntry[] {
  const named = (index: number): ChainEntry => (name === undefined ? { leg } : { leg, name: `${name} ${index}` });
  const chain: ChainEntry[] = [named(1)];
  for (let index = 0; index < bends; index++) {
    const turn = Math.floor(index / 4) % 2 === 0 ? (index % 2 ? 'down' : 'up') : index % 2 ? 'up' : 'down';
    chain.push({ bend: ANGLES[Math.floor(index / 2) % 4] ?? 90, turn, radius: 0.125 }, named(index + 2));
  }
  return chain;
}

/** The 6 × 8 angle of common practice. */
export const ANGLE: DocumentParts = {
  width: 6,
  grain: 'across',
  chain: [
    { leg: 6, name: 'Short leg' },
    { bend: 90, turn: 'up', radius: 0.125 },
    { leg: 8, name: 'Long leg' },
  ],
};

/** Letters from both faces and more than any field holds. */
export const LONG_NAME = 'Łącznik zewnętrzny, outer stiffening flange inboard of the forward attachment';
