import type { PartRow } from '@shared/contracts/parts';
import { formatLength } from '@shared/units/format';

type Sizes = Pick<PartRow, 'unit' | 'blankLength' | 'blankWidth' | 'thickness' | 'material'>;

/** "13.894 × 6.000 in"; the length alone when the bend lines have no length yet, a dash when there is no blank. */
export function blankWords({ unit, blankLength, blankWidth }: Sizes): string {
  if (blankLength === null) return '—';
  const length = formatLength(blankLength, unit);
  return blankWidth === null ? `${length} ${unit}` : `${length} × ${formatLength(blankWidth, unit)} ${unit}`;
}

/** "0.040 in"; a dash when it could not be read. */
export function thicknessWords({ unit, thickness }: Sizes): string {
  return thickness === null ? '—' : `${formatLength(thickness, unit)} ${unit}`;
}
