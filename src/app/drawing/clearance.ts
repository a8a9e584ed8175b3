/** What already stands on the paper, and how badly something new would clash with it. */
import type { Box } from './box';
import { contains, grown, hits, overlaps } from './box';
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

export class Clearance {
  private readonly texts: Box[] = [];
  private readonly lines: Segment[] = [];
  private readonly thin: Segment[] = [];
  private readonly marks: Box[] = [];

  constructor(
    private readonly paper: Box,
    /** The metal. */
    private readonly outline: readonly Segment[],
  ) {}

  add(footprint: Footprint): void {
    this.texts.push(...footprint.texts);
    this.lines.push(...footprint.lines);
    this.thin.push(...footprint.thin);
  }

  /** A small mark: texts keep off it, lines may pass through it. */
  addMark(box: Box): void {
    this.marks.push(box);
  }

  /** 0 is clear; crossings that drafting allows cost a little; from CLASH up it can't stand. */
  cost({ texts, lines, thin }: Footprint): number {
    let cost = 0;
    for (const text of texts) {
      if (!contains(this.paper, text)) return CLASH;
      const clear = grown(text, 3);
      if ([...this.texts, ...this.marks].some((other) => overlaps(clear, other))) return CLASH;
      if ([this.outline, this.lines, this.thin].some((those) => those.some((line) => hits(clear, line)))) return CLASH;
    }
    for (const line of [...lines, ...thin]) if (this.texts.some((text) => hits(grown(text, 2), line))) return CLASH;
    for (const line of [...lines, ...thin]) cost += 6 * this.marks.filter((mark) => hits(mark, line)).length;
    for (const line of lines) {
      if (this.outline.some((edge) => cross(line, edge))) return CLASH;
      if (this.lines.some((other) => cross(line, other) || tooNear(line, other))) return CLASH;
      cost += 12 * this.thin.filter((other) => cross(line, other)).length;
    }
    for (const line of thin) {
      cost += 30 * this.lines.filter((other) => cross(line, other)).length;
      cost += 15 * this.outline.filter((edge) => cross(line, edge)).length;
    }
    return cost;
  }
}

/** Two dimension lines that run side by side need room for a figure between them. */
function tooNear(a: Segment, b: Segment): boolean {
  const horizontal = (s: Segment): boolean => Math.abs(s.to.x - s.from.x) >= Math.abs(s.to.y - s.from.y);
  if (horizontal(a) !== horizontal(b)) return false;
  const [main, off] = horizontal(a) ? (['x', 'y'] as const) : (['y', 'x'] as const);
  const low = Math.max(Math.min(a.from[main], a.to[main]), Math.min(b.from[main], b.to[main]));
  const high = Math.min(Math.max(a.from[main], a.to[main]), Math.max(b.from[main], b.to[main]));
  if (low > high) return false;
  const offAt = (s: Segment, place: number): number => {
    const run = s.to[main] - s.from[main];
    return run === 0 ? s.from[off] : s.from[off] + ((place - s.from[main]) / run) * (s.to[off] - s.from[off]);
  };
  return [low, high].some((place) => Math.abs(offAt(a, place) - offAt(b, place)) < 16);
}
