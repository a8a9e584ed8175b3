/** The handbook's channel as the server gives it. */
import type { Part } from '@shared/contracts/parts';
import type { Revision } from '@shared/contracts/revisions';
import type { PartDocument } from '@shared/part/document';
import type { Solved } from '@shared/result';
import { solve } from '@shared/solve';

export const channel: PartDocument = {
  format: 'leafwright/1',
  unit: 'in',
  thickness: 0.04,
  material: '2024-T3',
  width: 6,
  allowance: { method: 'handbook' },
  chain: [
    { leg: 1, name: 'Left flange' },
    { bend: 90, turn: 'up', radius: 0.16 },
    { leg: 2, name: 'Web' },
    { bend: 90, turn: 'up', radius: 0.16 },
    { leg: 1, name: 'Right flange' },
  ],
};

export function revision(document: PartDocument = channel, version = 1): Revision {
  return {
    id: 'r1',
    letter: 'A',
    state: 'draft',
    version,
    document,
    result: solve(document) as Solved,
    engineVersion: '0',
    changedAt: new Date(2026, 0, 5, 10, 42, version).toISOString(),
    changedBy: 'Avery Example',
    editors: ['Avery Example'],
  };
}

export function part(document: PartDocument = channel, version = 1): Part {
  return {
    id: 'p1',
    number: 'HC-1001-1',
    title: 'Channel',
    version: 1,
    createdAt: '2026-01-05T10:00:00.000Z',
    createdBy: 'Avery Example',
    revision: revision(document, version),
  };
}
