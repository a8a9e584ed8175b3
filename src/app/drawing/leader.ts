/** A note on a leader: the text where it clashes with nothing, the line from it to what it speaks of. */
import type { Box } from './box';
import { boundsOf, grown, hits, overlaps } from './box';
import { CLASH, type Footprint } from './clearance';
import type { Mark, TextMark } from './marks';
import { linePath, textBox, textWidth } from './marks';
import type { Point } from './point';
import { along } from './point';

const REACHES = [40, 58, 80, 106, 136, 170];
const TURNS = Array.from({ length: 13 }, (_, step) => (step % 2 === 0 ? step / 2 : -(step + 1) / 2) * (Math.PI / 7));

export interface LeaderPlan {
  readonly marks: readonly Mark[];
  readonly footprint: Footprint;
}

export interface LeaderNote {
  readonly upper: string;
  readonly lower: string;
}

function plan(tip: Point, knee: Point, right: boolean, { upper, lower }: LeaderNote, pick: number) {
  const width = Math.max(textWidth(upper, 'note-strong'), textWidth(lower, 'note')) + 6;
  const end = { x: knee.x + (right ? width : -width), y: knee.y };
  const left = Math.min(knee.x, end.x) + 3;
  const common = { kind: 'text', anchor: 'start', pick } as const;
  const texts: TextMark[] = [
    { ...common, role: 'note-strong', text: upper, at: { x: left, y: knee.y - 10 } },
    { ...common, role: 'note', text: lower, at: { x: left, y: knee.y + 11 } },
  ];
  const corners = texts.map(textBox).flatMap((box) => [
    { x: box.left, y: box.top },
    { x: box.right, y: box.bottom },
  ]);
  const leader: Mark = { kind: 'path', role: 'leader', d: linePath(tip, knee) + linePath(knee, end), pick };
  return { marks: [leader, ...texts], box: boundsOf(corners) };
}

/**
 * @param tip on the metal @param outward unit vector away from it
 * @param cost of what would stand on the paper, as Clearance counts it
 * @returns null when there is no room at all
 */
export function leaderNote(
  tip: Point,
  outward: Point,
  note: LeaderNote,
  pick: number,
  cost: (footprint: Footprint) => number,
): LeaderPlan | null {
  let best: LeaderPlan | null = null;
  let least = CLASH;
  const start = Math.atan2(outward.y, outward.x);
  for (const [level, reach] of REACHES.entries()) {
    for (const [rank, turn] of TURNS.entries()) {
      const away = { x: Math.cos(start + turn), y: Math.sin(start + turn) };
      const knee = along(tip, away, reach);
      for (const right of away.x >= 0 ? [true, false] : [false, true]) {
        const base = level * 9 + rank * 5 + (right === away.x >= 0 ? 0 : 40);
        if (base >= least) continue;
        const { marks, box } = plan(tip, knee, right, note, pick);
        const line = { from: along(tip, away, 3), to: knee };
        // A knee that turns back would draw the leader through its own note.
        if (hits(box, line)) continue;
        const footprint: Footprint = { texts: [box], lines: [], thin: [line] };
        const total = base + cost(footprint);
        if (total >= least) continue;
        least = total;
        best = { marks, footprint };
      }
    }
  }
  return best;
}

/** Whether a text that stands already would be run into. */
export const runsInto = ({ texts, thin }: Footprint, text: Box): boolean =>
  thin.some((line) => hits(grown(text, 2), line)) || texts.some((box) => overlaps(grown(box, 3), text));
