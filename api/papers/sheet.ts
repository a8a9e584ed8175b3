/**
 * A paper as plain data, before any PDF: sheets of marks in millimetres, x to the right and y down from the top left
 * corner. Layout code makes it, tests measure it, the drawer only copies it out.
 */
export interface Point {
  readonly x: number;
  readonly y: number;
}

export interface Box {
  readonly x: number;
  readonly y: number;
  readonly width: number;
  readonly height: number;
}

/** A grey from 0 (black) to 1 (white): papers are copied in black and white, so colour would carry nothing. */
export type Shade = number;

export interface Pen {
  readonly width: number;
  readonly shade: Shade;
  /** Lengths of strokes and gaps in turn; continuous when left out. */
  readonly dash?: readonly number[];
}

export interface LineMark {
  readonly kind: 'line';
  readonly from: Point;
  readonly to: Point;
  readonly pen: Pen;
}

export interface ShapeMark {
  readonly kind: 'shape';
  readonly points: readonly Point[];
  readonly pen: Pen | null;
  readonly fill: Shade | null;
}

export interface CircleMark {
  readonly kind: 'circle';
  readonly centre: Point;
  readonly radius: number;
  readonly pen: Pen | null;
  readonly fill: Shade | null;
}

export type Weight = 'regular' | 'semibold';

export interface TextMark {
  readonly kind: 'text';
  readonly text: string;
  /** Start of the baseline. */
  readonly at: Point;
  /** Size of the type in mm; capitals are 0.7 of it. */
  readonly size: number;
  readonly weight: Weight;
  readonly shade: Shade;
  /** Reads from the bottom up when true, as texts along a vertical line do. */
  readonly upward: boolean;
  /** Paper-white under the text, so that a line breaks for it. */
  readonly clear: boolean;
  /** The ink of the text. */
  readonly box: Box;
}

/** A word large and light across the whole sheet, over everything and hiding nothing. */
export interface WatermarkMark {
  readonly kind: 'watermark';
  readonly text: string;
}

export type Mark = LineMark | ShapeMark | CircleMark | TextMark | WatermarkMark;

export interface Sheet {
  readonly width: number;
  readonly height: number;
  readonly marks: Mark[];
}

export interface Paper {
  readonly title: string;
  readonly author: string;
  readonly issuedAt: Date;
  readonly sheets: readonly Sheet[];
}

export const line = (x1: number, y1: number, x2: number, y2: number, pen: Pen): LineMark => ({
  kind: 'line',
  from: { x: x1, y: y1 },
  to: { x: x2, y: y2 },
  pen,
});

export const rectangle = (box: Box, pen: Pen | null, fill: Shade | null = null): ShapeMark => ({
  kind: 'shape',
  points: [
    { x: box.x, y: box.y },
    { x: box.x + box.width, y: box.y },
    { x: box.x + box.width, y: box.y + box.height },
    { x: box.x, y: box.y + box.height },
  ],
  pen,
  fill,
});
