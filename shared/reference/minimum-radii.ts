/**
 * Published minimum radii for 90° cold bends, as multiples of the thickness. Where two tables differ, both are kept:
 * which one rules is the shop's choice.
 */
import { GAGE_RADII } from './gage-radii';

export type RadiusTable = 'AC 43.13-1B' | 'Aluminum Association' | 'design handbook' | 'aerospace table';

export interface RadiusRow {
  readonly table: RadiusTable;
  readonly alloyTemper: string;
  /** Inches, rising. */
  readonly thickness: readonly number[];
  /** Multiples of T: the least that the table gives at each thickness. */
  readonly lower: readonly number[];
  /** And the most; the same where the table gives one figure. */
  readonly upper: readonly number[];
  readonly source: string;
}

const AC = 'FAA AC 43.13-1B (1998, chg 1 2001), ch. 4 sec. 4, table 4-6';
const AA = 'Aluminum Association, table 3-1, recommended minimum radii for 90° cold bends (2005)';

const AC_THICKNESS = [0.016, 0.032, 0.064, 0.128, 0.182, 0.258];
const AA_THICKNESS = [1 / 64, 1 / 32, 1 / 16, 1 / 8, 3 / 16, 1 / 4, 3 / 8, 1 / 2];

export const MINIMUM_RADII: readonly RadiusRow[] = [
  ac('2024-O', '0 0-1 0-1 0-1 0-1 0-1'),
  ac('2024-T3', '1.5-3 2-4 3-5 4-6 4-6 5-7'),
  ac('2024-T6', '2-4 3-5 3-5 4-6 5-7 6-10'),
  ac('5052-O', '0 0 0-1 0-1 0-1 0-1'),
  ac('5052-H32', '0 0 0.5-1 0.5-1.5 0.5-1.5 0.5-1.5'),
  ac('5052-H34', '0 0 0.5-1.5 1.5-2.5 1.5-2.5 2-3'),
  ac('5052-H36', '0-1 0.5-1.5 1-2 1.5-3 2-4 2-4'),
  ac('5052-H38', '0.5-1.5 1-2 1.5-3 2-4 3-5 4-6'),
  ac('6061-T4', '0-1 0-1 0.5-1 1-2 1.5-3 2.5-4'),
  ac('7075-O', '0 0-1 0-1 0.5-1.5 1-2 1.5-3'),
  aa('1100-H12', '0 0 0 0.5 1 1 1.5 2'),
  aa('1100-H16', '0 0.5 1 1.5 1.5 2.5 3 4'),
  aa('1100-H18', '1 1 1.5 2.5 3 3.5 4 4.5'),
  aa('2014-O', '0 0 0 0.5 1 1 2.5 4'),
  aa('2014-T6', '3 4 4 5 6 8 8.5 9.5'),
  aa('2024-O', '0 0 0 0.5 1 1 2.5 4'),
  // Only these two cells of the row for 2024-T3 have been read.
  { ...aa('2024-T3', '3 4'), thickness: [1 / 32, 1 / 16] },
  aa('2024-T361', '3 4 5 6 6 8 8.5 9.5'),
  aa('3003-H12', '0 0 0 0.5 1 1 1.5 2'),
  aa('3003-H16', '0.5 1 1 1.5 2.5 3 3.5 4'),
  aa('3003-H18', '1 1.5 2 2.5 3.5 4.5 5.5 6.5'),
  aa('5052-O', '0 0 0 0.5 1 1 1.5 1.5'),
  aa('5052-H32', '0 0 1 1.5 1.5 1.5 1.5 2'),
  aa('5052-H34', '0 1 1.5 2 2 2.5 2.5 3'),
  aa('5052-H36', '1 1 1.5 2.5 3 3.5 4 4.5'),
  aa('5052-H38', '1 1.5 2.5 3 4 5 5.5 6.5'),
];

export interface MinimumRadius {
  readonly table: RadiusTable;
  /** Multiples of T. */
  readonly lower: number;
  readonly upper: number;
  /** Thickness of the column that was read, inches. */
  readonly column: number;
  /** The radius that a table by gage prints, inches; null where the table gives multiples. */
  readonly printed: number | null;
  readonly source: string;
}

/** Inches: sheet of 0.032 and 0.063 is read in the columns 1/32 and 1/16, which the tables mean by it. */
const SAME_GAGE = 0.0008;

/**
 * What the tables say of a material at a thickness. Between two columns the thicker one is read. Tables by gage, which are
 * known at second hand only, speak where neither of the others does.
 *
 * @param material as a document names it; "Alclad 2024-T3" reads the row of 2024-T3
 * @param inches thickness > 0, inches
 * @returns a figure a table; empty where no row or no column reaches
 * @example minimumRadii('2024-T3', 0.04)[0]?.lower // 3
 */
export function minimumRadii(material: string, inches: number): readonly MinimumRadius[] {
  const name = material.replace(/^(?:alclad|clad)\s+/i, '').trim();
  const rows = MINIMUM_RADII.filter((row) => row.alloyTemper === name).flatMap((row) => {
    const i = columnFor(row.thickness, inches);
    const [lower, upper, column] = [row.lower[i], row.upper[i], row.thickness[i]];
    if (lower === undefined || upper === undefined || column === undefined) return [];
    return [{ table: row.table, lower, upper, column, printed: null, source: row.source }];
  });
  return rows.length > 0 ? rows : gageRadii(name, inches);
}

function gageRadii(name: string, inches: number): readonly MinimumRadius[] {
  return GAGE_RADII.filter((row) => row.alloyTemper === name).flatMap((row) => {
    const i = columnFor(row.thickness, inches);
    const [printed, column] = [row.radius[i], row.thickness[i]];
    if (printed === undefined || column === undefined) return [];
    const times = printed / inches;
    return [{ table: row.table, lower: times, upper: times, column, printed, source: row.source }];
  });
}

const columnFor = (thickness: readonly number[], inches: number): number =>
  thickness.findIndex((column) => inches <= column + SAME_GAGE);

function ac(alloyTemper: string, cells: string): RadiusRow {
  return row('AC 43.13-1B', AC, alloyTemper, AC_THICKNESS, cells);
}

function aa(alloyTemper: string, cells: string): RadiusRow {
  return row('Aluminum Association', AA, alloyTemper, AA_THICKNESS, cells);
}

/** Cells as the tables print them: "2-4" is a range, "3" a figure. */
function row(
  table: RadiusTable,
  source: string,
  alloyTemper: string,
  thickness: readonly number[],
  cells: string,
): RadiusRow {
  const ranges = cells.split(' ').map((cell) => cell.split('-').map(Number));
  return {
    table,
    alloyTemper,
    thickness,
    lower: ranges.map((range) => range[0]!),
    upper: ranges.map((range) => range.at(-1)!),
    source,
  };
}
