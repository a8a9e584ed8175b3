/** Finds what lies near a place without looking at everything on the paper. */
import type { Box } from './box';

interface Entry<T> {
  readonly item: T;
  readonly box: Box;
  /** The last search that came past it: a thing in several cells is looked at once. */
  seen: number;
}

/** Pixels; about the height of a figure with its clearance. */
const CELL = 24;

export class Grid<T> {
  private readonly columns: number;
  private readonly rows: number;
  private readonly cells: Entry<T>[][];
  private search = 0;

  /** What lies outside the paper is kept in the cells at its edge. */
  constructor(private readonly paper: Box) {
    this.columns = Math.max(1, Math.ceil((paper.right - paper.left) / CELL));
    this.rows = Math.max(1, Math.ceil((paper.bottom - paper.top) / CELL));
    this.cells = Array.from({ length: this.columns * this.rows }, () => []);
  }

  add(item: T, box: Box): void {
    const entry: Entry<T> = { item, box, seen: 0 };
    this.over(box, (cell) => {
      cell.push(entry);
      return false;
    });
  }

  /** Whether the test holds for one of the things whose boxes touch this one. */
  some(box: Box, test: (item: T) => boolean): boolean {
    const search = ++this.search;
    return this.over(box, (cell) => {
      for (const entry of cell) {
        if (entry.seen === search) continue;
        entry.seen = search;
        if (touch(entry.box, box) && test(entry.item)) return true;
      }
      return false;
    });
  }

  count(box: Box, test: (item: T) => boolean): number {
    let count = 0;
    this.some(box, (item) => {
      if (test(item)) count += 1;
      return false;
    });
    return count;
  }

  /** Goes through the cells under a box until one of them is enough. */
  private over(box: Box, visit: (cell: Entry<T>[]) => boolean): boolean {
    const { paper, columns, rows } = this;
    const [left, right] = [index(box.left - paper.left, columns), index(box.right - paper.left, columns)];
    const [top, bottom] = [index(box.top - paper.top, rows), index(box.bottom - paper.top, rows)];
    for (let row = top; row <= bottom; row++) {
      for (let column = left; column <= right; column++) {
        const cell = this.cells[row * columns + column];
        if (cell && visit(cell)) return true;
      }
    }
    return false;
  }
}

const index = (place: number, count: number): number => Math.min(count - 1, Math.max(0, Math.floor(place / CELL)));

/** Edges count: a line on the edge of a box is for the test to judge. */
const touch = (a: Box, b: Box): boolean =>
  a.left <= b.right && b.left <= a.right && a.top <= b.bottom && b.top <= a.bottom;
