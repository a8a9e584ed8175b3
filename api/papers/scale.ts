/** A standard scale of a drawing. */
export interface Scale {
  /** Millimetres on paper for a millimetre of the part. */
  readonly factor: number;
  /** E.g. "1:2", "5:1". */
  readonly text: string;
}

const ENLARGED = [10, 5, 2];
/** Steps of a decade: the usual metric reductions, and the quarter and eighth that inch shops draw at. */
const STEPS = [1, 2, 2.5, 4, 5, 8];

const enlarged = (times: number): Scale => ({ factor: times, text: `${times}:1` });
const reduced = (times: number): Scale => ({ factor: 1 / times, text: `1:${times}` });

/**
 * The largest standard scale (10:1 … 1:1, 1:2, 1:2.5, 1:4, 1:5, 1:8, 1:10 …) at which a length fits into a room.
 *
 * @param actual length of the part, mm, more than 0 @param room length on paper, mm
 */
export function largestScale(actual: number, room: number): Scale {
  const up = ENLARGED.find((times) => actual * times <= room);
  if (up !== undefined) return enlarged(up);
  for (let decade = 1; ; decade *= 10) {
    const step = STEPS.find((times) => actual / (times * decade) <= room);
    if (step !== undefined) return reduced(step * decade);
  }
}
