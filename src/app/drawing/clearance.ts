/** What already stands on the paper, and how badly something new would clash with it. */
import type { Box } from './box';
import { contains, grown, hits, overlaps } from './box';
import { Grid } from './grid';
import type { Segment } from './point';
import { cross } from './point';

export interface Footprint {
  readonly texts: readonly Box[];
  readonly lines: readonly Segment[];
  /** Lines that may cross other lines without harm, as extension lines do. */
  readonly thin: readonly Segment[];
}

/** Anything at or above this can't be drawn. */
export const CLASH = 1000;

/** Two dimension lines that run side by side need this much between them, for a figure. */
const BESIDE = 16;

export class Clearance {
  private readonly texts: Grid<Box>;
  private readonly lines: Grid<Segment>;
  private readonly thin: Grid<Segment>;
  private readonly marks: Grid<Box>;
  /** The metal. */
  private readonly outline: Grid<Segment>;

  constructor(
    private readonly paper: Box,
    outline: readonly Segment[] = [],
  ) {
    this.texts = new Grid(paper);
    this.lines = new Grid(paper);
    this.thin = new Grid(paper);
    this.marks = new Grid(paper);
    this.outline = new Grid(paper);
    for (const edge of outline) this.outline.add(edge, boxOf(edge));
  }

  add({ texts, lines, thin }: Footprint): void {
    for (const text of texts) this.texts.add(text, text);
    for (const line of lines) this.lines.add(line, boxOf(line));
    for (const line of thin) this.thin.add(line, boxOf(line));
  }

  /** A small mark: texts keep off it, lines may pass through it. */
  addMark(box: Box): void {
    this.marks.add(box, box);
  }

  /** 0 is clear; crossings that drafting allows cost a little; from CLASH up it can't stand. */
  cost({ texts, lines, thin }: Footprint): number {
    if (texts.some((text) => this.blocksText(text))) return CLASH;
    let cost = 0;
    for (const line of lines) {
      const box = boxOf(line);
      if (!contains(this.paper, box)) return CLASH;
      if (this.outline.some(box, (edge) => cross(line, edge))) return CLASH;
      if (this.lines.some(grown(box, BESIDE), (other) => cross(line, other) || tooNear(line, other))) return CLASH;
      if (this.underText(line, box)) return CLASH;
      cost += 6 * this.marks.count(box, (mark) => hits(mark, line));
      cost += 12 * this.thin.count(box, (other) => cross(line, other));
    }
    for (const line of thin) {
      const box = boxOf(line);
      if (!contains(this.paper, box) || this.underText(line, box)) return CLASH;
      cost += 6 * this.marks.count(box, (mark) => hits(mark, line));
      cost += 30 * this.lines.count(box, (other) => cross(line, other));
      cost += 15 * this.outline.count(box, (edge) => cross(line, edge));
    }
    return cost;
  }

  private blocksText(text: Box): boolean {
    if (!contains(this.paper, text)) return true;
    const clear = grown(text, 3);
    const hit = (line: Segment): boolean => hits(clear, line);
    const overlap = (other: Box): boolean => overlaps(clear, other);
    return (
      this.outline.some(clear, hit) ||
      this.texts.some(clear, overlap) ||
      this.marks.some(clear, overlap) ||
      this.lines.some(clear, hit) ||
      this.thin.some(clear, hit)
    );
  }

  private underText(line: Segment, box: Box): boolean {
    return this.texts.some(grown(box, 2), (text) => hits(grown(text, 2), line));
  }
}

const boxOf = ({ from, to }: Segment): Box => ({
  left: Math.min(from.x, to.x),
  top: Math.min(from.y, to.y),
  right: Math.max(from.x, to.x),
  bottom: Math.max(from.y, to.y),
});

function tooNear(a: Segment, b: Segment): boolean {
  const lies = horizontal(a);
  if (lies !== horizontal(b)) return false;
  const main = lies ? 'x' : 'y';
  const off = lies ? 'y' : 'x';
  const low = Math.max(Math.min(a.from[main], a.to[main]), Math.min(b.from[main], b.to[main]));
  const high = Math.min(Math.max(a.from[main], a.to[main]), Math.max(b.from[main], b.to[main]));
  if (low > high) return false;
  const apartAt = (place: number): number => Math.abs(offAt(a, place, main, off) - offAt(b, place, main, off));
  return apartAt(low) < BESIDE || apartAt(high) < BESIDE;
}

const horizontal = ({ from, to }: Segment): boolean => Math.abs(to.x - from.x) >= Math.abs(to.y - from.y);

/** How high a line stands over a place along it. */
function offAt({ from, to }: Segment, place: number, main: 'x' | 'y', off: 'x' | 'y'): number {
  const run = to[main] - from[main];
  return run === 0 ? from[off] : from[off] + ((place - from[main]) / run) * (to[off] - from[off]);
}
