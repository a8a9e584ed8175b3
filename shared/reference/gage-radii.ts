/**
 * Minimum radii by gage, in inches, of alloys that the better tables leave out. Both tables are known at second hand only, and
 * every finding that rests on one says so.
 */
export interface GageRow {
  readonly table: 'design handbook' | 'aerospace table';
  readonly alloyTemper: string;
  /** Inches, rising. */
  readonly thickness: readonly number[];
  /** Least inside radius at each, inches. */
  readonly radius: readonly number[];
  readonly source: string;
}

const HANDBOOK = 'preferred radii by thickness, a design handbook (read at second hand)';
const AEROSPACE = 'aerospace table of minimum bend radii, issuing body not stated (read at second hand)';

const HANDBOOK_GAGES = [0.025, 0.032, 0.04, 0.05, 0.08, 0.09];
const AEROSPACE_GAGES = [
  0.012, 0.016, 0.02, 0.025, 0.032, 0.04, 0.05, 0.063, 0.071, 0.08, 0.09, 0.1, 0.125, 0.16, 0.19,
];

export const GAGE_RADII: readonly GageRow[] = [
  handbook('6061-T6', [0.094, 0.094, 0.125, 0.156, 0.281, 0.312]),
  handbook('304', [0.063, 0.063, 0.094, 0.094, 0.156, 0.188]),
  handbook('4130N', [0.063, 0.094, 0.125, 0.156, 0.25, 0.281]),
  {
    table: 'aerospace table',
    alloyTemper: '7075-T6',
    thickness: AEROSPACE_GAGES,
    radius: [0.06, 0.09, 0.12, 0.12, 0.16, 0.22, 0.25, 0.31, 0.41, 0.44, 0.5, 0.69, 0.87, 1.0, 1.25],
    source: AEROSPACE,
  },
];

function handbook(alloyTemper: string, radius: readonly number[]): GageRow {
  return { table: 'design handbook', alloyTemper, thickness: HANDBOOK_GAGES, radius, source: HANDBOOK };
}
