import type { PartList, PartRow } from '@shared/contracts/parts';

/** For specs: one row of the register. */
export function sampleRow(id: string, change: Partial<PartRow> = {}): PartRow {
  return {
    id,
    number: `LW-${id}`,
    title: `Channel ${id}`,
    revision: 'A',
    state: 'draft',
    unit: 'in',
    thickness: 0.04,
    material: '2024-T3',
    blankLength: 3.758,
    blankWidth: 6,
    bends: 2,
    stops: 0,
    outline: { path: 'M0 0L1 0L1 1Z', box: [0, 0, 1, 1] },
    changedAt: '2026-05-20T12:00:00Z',
    changedBy: 'Wren Adler',
    ...change,
  };
}

export function sampleList(rows: readonly PartRow[], change: Partial<PartList> = {}): PartList {
  return { parts: [...rows], next: null, total: rows.length, materials: ['2024-T3', '5052-H32'], ...change };
}
