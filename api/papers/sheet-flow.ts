import { text } from './lettering';
import { TYPE } from './paper-size';
import type { Box, Mark, Sheet } from './sheet';

/** Sheets filled from the top down; a block that doesn't fit any more begins the next sheet. */
export class SheetFlow {
  readonly sheets: Sheet[] = [];
  private y = Infinity;

  constructor(
    private readonly newSheet: () => Sheet,
    readonly area: Box,
  ) {}

  /** Takes room for a block and says where it begins, on a new sheet when it has to be. */
  take(height: number): { y: number; newSheet: boolean } {
    const newSheet = this.y + height > this.area.y + this.area.height;
    if (newSheet) {
      this.sheets.push(this.newSheet());
      this.y = this.area.y;
    }
    const { y } = this;
    this.y += height;
    return { y, newSheet };
  }

  /** True when a block of this height still fits on the sheet begun last. */
  fits(height: number): boolean {
    return this.y + height <= this.area.y + this.area.height;
  }

  add(...marks: readonly Mark[]): void {
    this.sheets.at(-1)?.marks.push(...marks);
  }

  /** A heading, kept together with at least `with` mm of what it heads. */
  heading(words: string, keepWith: number): void {
    const gap = this.sheets.length > 0 && this.fits(keepWith + 11) ? 4 : 0;
    if (!this.fits(gap + 7 + keepWith)) this.y = Infinity;
    const { y } = this.take(gap + 7);
    this.add(text(words, this.area.x, y + gap + 4, { size: TYPE.heading, weight: 'semibold' }));
  }

  /** Number, among the sheets of this flow, of the sheet begun last. */
  get current(): number {
    return this.sheets.length;
  }
}
