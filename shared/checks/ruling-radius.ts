import { type MinimumRadius, minimumRadii } from '../reference/minimum-radii';
import { convertLength } from '../units/length';
import type { CheckInput } from './check';
import { shown } from './check';

export interface RulingRadius {
  readonly material: string;
  /** In the part's unit, the grain taken into account. */
  readonly lower: number;
  readonly upper: number;
  /** Every row that says something, in words. */
  readonly rows: string;
  readonly source: string;
}

/** The least radius for the part's material and thickness by the shop's choice of table, or null where no table speaks. */
export function rulingRadius({ figures, rules }: Pick<CheckInput, 'figures' | 'rules'>): RulingRadius | null {
  const material = figures.material?.name ?? figures.unknownMaterial;
  if (material === null || material === undefined) return null;
  const { thickness, unit, grain } = figures;
  const rows = minimumRadii(material, convertLength(thickness, unit, 'in'));
  const ruling = chosen(rows, rules.radiusRule);
  if (ruling === null) return null;
  const factor = thickness * (grain === 'along' ? rules.limits.grainAlong : 1);
  return {
    material,
    lower: ruling.lower * factor,
    upper: ruling.upper * factor,
    rows: rows.map(inWords).join('; '),
    source: ruling.source,
  };
}

/** The named table where it has a row; else the stricter of all, whose range reaches as far up as any table's does. */
function chosen(rows: readonly MinimumRadius[], rule: string): MinimumRadius | null {
  const named = rows.find((row) => row.table === rule);
  if (named !== undefined) return named;
  const [first, ...rest] = rows;
  if (first === undefined) return null;
  const strictest = rest.reduce((most, row) => (row.lower > most.lower ? row : most), first);
  return { ...strictest, upper: Math.max(...rows.map((row) => row.upper)) };
}

function inWords({ table, lower, upper, column, printed }: MinimumRadius): string {
  if (printed !== null) return `${table}, read at second hand: ${shown(printed)} in at ${shown(column)} in`;
  const times = lower === upper ? `${lower} T` : `${lower} to ${upper} T`;
  return `${table}: ${times} at ${shown(column)} in`;
}
