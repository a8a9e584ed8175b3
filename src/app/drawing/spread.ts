/**
 * Labels on a line, each as near as it can be to where it belongs, no two nearer than `pitch`: the places that move the
 * labels least in the sense of squares (labels that would collide are pooled and pushed apart together).
 *
 * @param wanted places in rising order @param pitch least distance between neighbours
 * @param low @param high the room; when the labels need more than that they start at `low` and run over
 */
export function spread(wanted: readonly number[], pitch: number, low: number, high: number): number[] {
  // Taking off each label's own pitches turns "no nearer than pitch" into "not falling".
  const pools: { sum: number; count: number }[] = [];
  wanted.forEach((place, index) => {
    let pool = { sum: place - index * pitch, count: 1 };
    for (let last = pools.at(-1); last && last.sum / last.count > pool.sum / pool.count; last = pools.at(-1)) {
      pool = { sum: pool.sum + last.sum, count: pool.count + last.count };
      pools.pop();
    }
    pools.push(pool);
  });
  const highest = Math.max(low, high - (wanted.length - 1) * pitch);
  const level = pools.flatMap((pool) => {
    const mean = Math.min(Math.max(pool.sum / pool.count, low), highest);
    return new Array<number>(pool.count).fill(mean);
  });
  return level.map((mean, index) => mean + index * pitch);
}

export interface Seat {
  readonly place: number;
  /** 0 is the row next to the drawing. */
  readonly row: number;
}

/**
 * Labels of one width in up to `rows` rows: the row next to the drawing as long as it has room, else the next one out,
 * whose leaders pass through the gaps of the rows before it.
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
  const places = spread(wanted, crowded ? full / rows : full, low, high);
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
