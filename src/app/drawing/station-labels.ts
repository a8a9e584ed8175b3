/** Station figures along one edge of the blank: as near to their line as they can be, on leaders when they are crowded. */
import type { Mark, TextRole } from './marks';
import { at, textWidth } from './marks';
import { seatLabels } from './spread';

export interface Station {
  /** On the paper. */
  readonly x: number;
  readonly text: string;
  readonly role: TextRole;
  /** Whether a leader joins it to its line. */
  readonly leader: boolean;
  readonly pick?: number;
  readonly selected?: boolean;
}

const GAP = 10;
const ROW = 20;
/** Straight stub at the blank, and the slanted part of a leader. */
const STUB = 6;
const SLANT = 16;

export interface StationBand {
  readonly marks: readonly Mark[];
  /** Height that the band takes up outside the blank. */
  readonly height: number;
}

export const stationWidth = (stations: readonly Pick<Station, 'text' | 'role'>[]): number =>
  Math.max(0, ...stations.map((one) => textWidth(one.text, one.role)));

/** Length in pixels that these figures need side by side. */
export const stationRoom = (stations: readonly Pick<Station, 'text' | 'role'>[]): number =>
  (stations.length * (stationWidth(stations) + GAP)) / 2;

/**
 * @param edge y of the blank's edge @param outward −1 above the blank, 1 below it
 * @param low @param high leftmost and rightmost centre of a figure
 */
export function stationLabels(
  stations: readonly Station[],
  edge: number,
  outward: 1 | -1,
  low: number,
  high: number,
): StationBand {
  const sorted = [...stations].sort((a, b) => a.x - b.x);
  const seats = seatLabels(
    sorted.map((station) => station.x),
    stationWidth(sorted),
    GAP,
    low,
    high,
  );
  const rows = 1 + Math.max(0, ...seats.map((seat) => seat.row));
  const first = STUB + SLANT + 12;
  const marks = sorted.flatMap((station, index): Mark[] => {
    const seat = seats[index];
    if (!seat) return [];
    const common = { pick: station.pick, selected: station.selected };
    const y = edge + outward * (first + seat.row * ROW);
    const end = y - outward * 10;
    const knee = edge + outward * (STUB + SLANT);
    const points = [
      { x: station.x, y: edge },
      { x: station.x, y: edge + outward * STUB },
      { x: seat.place, y: knee },
      { x: seat.place, y: end },
    ];
    const text: Mark = {
      kind: 'text',
      role: station.role,
      text: station.text,
      at: { x: seat.place, y },
      anchor: 'middle',
      ...common,
    };
    if (!station.leader) return [text];
    return [{ kind: 'path', role: 'leader', d: `M${points.map(at).join('L')}`, ...common }, text];
  });
  return { marks, height: first + (rows - 1) * ROW + 12 };
}
