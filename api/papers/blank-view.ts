/** Where the blank lies on the sheet: stations to x, and the edges of the net blank. */
export interface BlankView {
  readonly x: (station: number) => number;
  /** Edges on the sheet, mm. */
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
  readonly roughLeft: number;
  readonly roughRight: number;
  /** Range in which labels may stand. */
  readonly low: number;
  readonly high: number;
  /** How the width is drawn: true to scale, cut out with a break, or a strip of no scale. */
  readonly across: Across;
}

export type Across = 'true' | 'broken' | 'nominal' | 'unknown';

/** From the blank's edge to where the extension lines of the stations begin to fan out. */
export const dimensionGap = 6;
