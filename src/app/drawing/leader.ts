/** A note on a leader: the text where it clashes with nothing, the line from it to what it speaks of. */
import type { Box } from './box';
import { boundsOf, hits } from './box';
import type { Clearance } from './clearance';
import { CLASH } from './clearance';
import type { Mark, TextMark } from './marks';
import { linePath, textBox, textWidth } from './marks';
import type { Point } from './point';
import { along } from './point';

const REACHES = [40, 58, 80, 106, 136, 170];
const TURNS = Array.from({ length: 13 }, (_, step) => (step % 2 === 0 ? step / 2 : -(step + 1) / 2) * (Math.PI / 7));

interface LeaderPlan {
  readonly marks: readonly Mark[];
  readonly box: Box;
}

function plan(tip: Point, knee: Point, right: boolean, upper: string, lower: string, pick: number): LeaderPlan {
  const width = Math.max(textWidth(upper, 'note-strong'), textWidth(lower, 'note')) + 6;
  const end = { x: knee.x + (right ? width : -width), y: knee.y };
  const left = Math.min(knee.x, end.x) + 3;
  const common = { kind: 'text', anchor: 'start', pick, selected: true } as const;
  const texts: TextMark[] = [
    { ...common, role: 'note-strong', text: upper, at: { x: left, y: knee.y - 10 } },
    { ...common, role: 'note', text: lower, at: { x: left, y: knee.y + 11 } },
  ];
  const boxes = texts.map(textBox);
  const corners = boxes.flatMap((box) => [
    { x: box.left, y: box.top },
    { x: box.right, y: box.bottom },
  ]);
  return {
    marks: [
      { kind: 'path', role: 'leader', d: linePath(tip, knee) + linePath(knee, end), pick, selected: true },
      ...texts,
    ],
    box: boundsOf(corners),
  };
}

/**
 * @param tip on the metal @param outward unit vector away from it
 * @returns the marks, or none when there is no room at all
 */
export function leaderNote(
  tip: Point,
  outward: Point,
  upper: string,
  lower: string,
  pick: number,
  clearance: Clearance,
): readonly Mark[] {
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
        const candidate = plan(tip, knee, right, upper, lower, pick);
        const line = { from: along(tip, away, 3), to: knee };
        // A knee that turns back would draw the leader through its own note.
        if (hits(candidate.box, line)) continue;
        const cost = base + clearance.cost({ texts: [candidate.box], lines: [], thin: [line] });
        if (cost >= least) continue;
        least = cost;
        best = candidate;
      }
    }
  }
  return best?.marks ?? [];
}
