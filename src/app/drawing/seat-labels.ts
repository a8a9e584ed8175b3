import { spread } from '@shared/geometry/spread';

export interface Seat {
  readonly place: number;
  /** 0 is the row next to the drawing. */
  readonly row: number;
}

/**
 * Labels of one width in up to `rows` rows: the row next to the drawing as long as it has room, else the next one out,
 * whose leaders pass through the gaps of the rows before it. When there is too little room they start at `low` and run over.
 */
export function seatLabels(
  wanted: readonly number[],
  width: number,
  gap: number,
  low: number,
  high: number,
  rows = 2,
): Seat[] {
  const full = width + gap;
  const crowded = wanted.some((place, index) => index > 0 && place - (wanted[index - 1] ?? place) < full);
  const pitch = crowded ? full / rows : full;
  const places = spread(wanted, pitch, low, high) ?? wanted.map((_, index) => low + index * pitch);
  const last = new Array<number>(rows).fill(-Infinity);
  return places.map((place) => {
    const free = last.findIndex((before) => place - before >= full - 1e-6);
    const row = free === -1 ? last.indexOf(Math.min(...last)) : free;
    last[row] = place;
    return { place, row };
  });
}

/** Length that `count` labels need in `rows` rows. */
export const roomFor = (count: number, width: number, gap: number, rows = 2): number => (count * (width + gap)) / rows;
