/** The metal of the blank: outline, bend zones, leg flats, grain, and which end is which. */
import type { LegResult, Solved } from '@shared/result';
import type { Mark, TextMark } from './marks';
import { textWidth } from './marks';

export interface SheetPlace {
  readonly x: (station: number) => number;
  readonly top: number;
  readonly foot: number;
  readonly figureOf: (length: number) => string;
  readonly grain: 'along' | 'across' | null;
}

const box = (left: number, top: number, right: number, foot: number): string =>
  `M${left} ${top}H${right}V${foot}H${left}Z`;

export function sheetMarks(solved: Solved, place: SheetPlace): Mark[] {
  const { x, top, foot } = place;
  const end = solved.developedLength ?? 0;
  const zones = solved.bends.flatMap((bend): Mark[] => {
    if (bend.tangentStart === null || bend.tangentEnd === null) return [];
    const d = box(x(bend.tangentStart), top, x(bend.tangentEnd), foot);
    return [{ kind: 'path', role: 'zone', d, pick: bend.chain }];
  });
  const legs = solved.legs.filter(isPlaced);
  // A leg is seen as one when it is selected; the hit over the edge is what a pointer finds.
  const flats = legs.map((leg) => ({ d: box(x(leg.start), top, x(leg.end), foot), pick: leg.chain }));
  const grainLeg = place.grain ? roomiest(legs, place) : null;
  return [
    { kind: 'path', role: 'sheet', d: box(x(0), top, x(end), foot) },
    ...zones,
    ...flats.map((flat): Mark => ({ kind: 'path', role: 'leg', ...flat })),
    { kind: 'path', role: 'edge', d: box(x(0), top, x(end), foot) },
    ...flats.map((flat): Mark => ({ kind: 'path', role: 'hit', ...flat })),
    ...legs.flatMap((leg) => flatMarks(leg, place, leg === grainLeg)),
    ...(grainLeg && place.grain ? grainMarks(grainLeg, place, place.grain) : []),
  ];
}

type PlacedLeg = LegResult & { start: number; end: number };

const isPlaced = (leg: LegResult): leg is PlacedLeg => leg.start !== null && leg.end !== null;

/** A gap from side to side between long break lines: this way the blank goes on for longer than it is drawn. */
export function breakMarks(left: number, right: number, top: number, foot: number): Mark[] {
  const y = foot - Math.min(20, (foot - top) / 4);
  const zigzag = 'l4 -6l6 12l4 -6';
  const back = 'l-4 6l-6 -12l-4 6';
  const edge = `M${left - 8} ${y}H${left + 40}${zigzag}H${right - 54}${zigzag}H${right + 8}`;
  const under = `v5H${right - 40}${back}H${left + 54}${back}H${left - 8}Z`;
  return [{ kind: 'path', role: 'break', d: edge + under }];
}

/** Name and flat of a leg in its middle: both, or the figure alone, or nothing, by the room there is. */
function flatMarks(leg: PlacedLeg, place: SheetPlace, withGrain: boolean): Mark[] {
  const { x, top, foot, figureOf } = place;
  const room = x(leg.end) - x(leg.start) - 12;
  const figure = figureOf(leg.flat);
  const middle = (x(leg.start) + x(leg.end)) / 2;
  const centre = (top + foot) / 2 + (withGrain ? 14 : 0);
  const common = { kind: 'text', anchor: 'middle', pick: leg.chain } as const;
  const text = (words: string, y: number, role: TextMark['role']): TextMark => {
    return { ...common, role, text: words, at: { x: middle, y } };
  };
  const fits = (words: string): boolean => textWidth(words, 'label') <= room;
  if (!fits(figure)) return [];
  const name = leg.name === null ? '' : shortened(leg.name, room);
  if (name === '') return [text(figure, centre, 'figure')];
  if (name === leg.name && fits(`${name}  ${figure}`)) return [text(`${name}  ${figure}`, centre, 'label')];
  return [text(name, centre - 8, 'label'), text(figure, centre + 8, 'figure')];
}

function shortened(name: string, room: number): string {
  if (textWidth(name, 'label') <= room) return name;
  for (let length = name.length - 1; length >= 3; length--) {
    const cut = `${name.slice(0, length).trimEnd()}…`;
    if (textWidth(cut, 'label') <= room) return cut;
  }
  return '';
}

function roomiest(legs: readonly PlacedLeg[], { x }: SheetPlace): PlacedLeg | null {
  const widest = [...legs].sort((a, b) => b.flat - a.flat)[0];
  return widest && x(widest.end) - x(widest.start) >= 104 ? widest : null;
}

/** An arrow with two heads in the direction of the grain: square to the bend lines or along them. */
function grainMarks(leg: PlacedLeg, { x, top, foot }: SheetPlace, grain: 'along' | 'across'): Mark[] {
  const middle = (x(leg.start) + x(leg.end)) / 2;
  const y = (top + foot) / 2 - 14;
  const label = (at: number): Mark => {
    return { kind: 'text', role: 'label', text: 'grain', at: { x: at, y }, anchor: 'start' };
  };
  if (grain === 'across') {
    const left = middle - 30;
    return [
      {
        kind: 'path',
        role: 'grain',
        d: `M${left - 10} ${y}h36M${left - 5} ${y - 3}l-6 3l6 3M${left + 21} ${y - 3}l6 3l-6 3`,
      },
      label(left + 34),
    ];
  }
  const left = middle - 20;
  return [
    {
      kind: 'path',
      role: 'grain',
      d: `M${left} ${y - 12}v24M${left - 3} ${y - 7}l3 -6l3 6M${left - 3} ${y + 7}l3 6l3 -6`,
    },
    label(left + 10),
  ];
}
