/**
 * Where labels go along a line when their places are too near each other: in the same order, `pitch` apart at least,
 * inside [low, high], each as near its place as the least squares of all moves allow.
 *
 * @param places wanted positions, ascending
 * @param pitch least distance of two neighbours (one figure, or one for each gap)
 * @returns the positions, or null when they don't fit
 * @example spread([5, 5], 2, 0, 10) // [4, 6]
 */
export function spread(
  places: readonly number[],
  pitch: number | readonly number[],
  low: number,
  high: number,
): number[] | null {
  const gaps = typeof pitch === 'number' ? places.slice(1).map(() => pitch) : pitch;
  // With each label's own share of the gaps taken off, "pitch apart" becomes "not before the one in front".
  const offsets: number[] = [];
  let offset = 0;
  places.forEach((_, index) => {
    offset += index === 0 ? 0 : (gaps[index - 1] ?? 0);
    offsets.push(offset);
  });
  if (low + offset > high + 1e-9) return null;

  const blocks: { sum: number; count: number }[] = [];
  places.forEach((place, index) => {
    let block = { sum: place - (offsets[index] ?? 0), count: 1 };
    for (let last = blocks.at(-1); last && last.sum / last.count > block.sum / block.count; last = blocks.at(-1)) {
      blocks.pop();
      block = { sum: last.sum + block.sum, count: last.count + block.count };
    }
    blocks.push(block);
  });
  const shifts = blocks.flatMap(({ sum, count }) => Array.from({ length: count }, () => sum / count));
  return shifts.map((shift, index) => Math.min(Math.max(shift, low), high - offset) + (offsets[index] ?? 0));
}

/** The farthest any label was moved. */
export const farthestMove = (places: readonly number[], put: readonly number[]): number =>
  Math.max(0, ...places.map((place, index) => Math.abs(place - (put[index] ?? place))));
