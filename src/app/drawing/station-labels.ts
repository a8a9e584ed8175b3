/** Station figures along one edge of the blank: as near to their line as they can be, on leaders when they are crowded. */
import type { Mark, TextRole } from './marks';
import { at, textWidth } from './marks';
import { type Seat, seatLabels } from './seat-labels';

export interface Station {
  /** On the paper. */
  readonly x: number;
  readonly text: string;
  readonly role: TextRole;
  readonly pick?: number | undefined;
}

const GAP = 10;
const ROW = 20;
/** Straight stub at the blank, and the slanted part of a leader. */
const STUB = 6;
const SLANT = 16;

export const stationWidth = (stations: readonly Pick<Station, 'text' | 'role'>[]): number =>
  Math.max(0, ...stations.map((one) => textWidth(one.text, one.role)));

/** Length in pixels that these figures need side by side. */
export const stationRoom = (stations: readonly Pick<Station, 'text' | 'role'>[]): number =>
  (stations.length * (stationWidth(stations) + GAP)) / 2;

/** Stations with the seats of their figures, before it is known where the edge of the blank lies. */
export interface StationBand {
  readonly stations: readonly Station[];
  readonly seats: readonly Seat[];
  /** Height that the band takes up outside the blank. */
  readonly height: number;
}

const FIRST = STUB + SLANT + 12;

/** @param low @param high leftmost and rightmost centre of a figure */
export function seatStations(stations: readonly Station[], low: number, high: number): StationBand {
  const sorted = [...stations].sort((a, b) => a.x - b.x);
  const seats = seatLabels(
    sorted.map((station) => station.x),
    stationWidth(sorted),
    GAP,
    low,
    high,
  );
  const rows = 1 + Math.max(0, ...seats.map((seat) => seat.row));
  return { stations: sorted, seats, height: FIRST + (rows - 1) * ROW + 12 };
}

/** @param edge y of the blank's edge @param outward −1 above the blank, 1 below it */
export function stationMarks({ stations, seats }: StationBand, edge: number, outward: 1 | -1): Mark[] {
  return stations.flatMap(({ x, role, text, pick }, index): Mark[] => {
    const seat = seats[index];
    if (!seat) return [];
    const y = edge + outward * (FIRST + seat.row * ROW);
    const points = [
      { x, y: edge },
      { x, y: edge + outward * STUB },
      { x: seat.place, y: edge + outward * (STUB + SLANT) },
      { x: seat.place, y: y - outward * 10 },
    ];
    return [
      { kind: 'path', role: 'leader', d: `M${points.map(at).join('L')}`, pick },
      { kind: 'text', role, text, at: { x: seat.place, y }, anchor: 'middle', pick },
    ];
  });
}
