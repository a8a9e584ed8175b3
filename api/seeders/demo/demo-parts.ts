/** Eight parts of the invented shop, of the kinds that such shops bend, in both units. */
import type { Bend, ChainEntry, Leg, PartDocument, Turn } from '../../../shared/part/document';

export interface DemoPart {
  readonly number: string;
  readonly title: string;
  readonly document: PartDocument;
}

const leg = (length: number | string, name: string, more: Partial<Leg> = {}): Leg => ({ leg: length, name, ...more });
const bend = (angle: number | string, turn: Turn, radius: number | string): Bend => ({ bend: angle, turn, radius });

const inches: Pick<PartDocument, 'format' | 'unit' | 'grain' | 'allowance'> = {
  format: 'leafwright/1',
  unit: 'in',
  grain: 'across',
  allowance: { method: 'handbook' },
};
const millimetres = { ...inches, unit: 'mm', allowance: { method: 'din-6935' } } as const;

/** One stiffening rib pressed up out of a floor: four bends, then the floor goes on. */
const rib = (number: number): ChainEntry[] => [
  bend('S', 'up', 'R'),
  leg('F', `Rib ${number}, near side`),
  bend('S', 'down', 'R'),
  leg('C', `Rib ${number}, crown`),
  bend('S', 'down', 'R'),
  leg('F', `Rib ${number}, far side`),
  bend('S', 'up', 'R'),
];

export const DEMO_PARTS: readonly DemoPart[] = [
  {
    number: 'HC-2101-1',
    title: 'Repair angle, lower skin lap',
    document: {
      ...inches,
      thickness: 0.04,
      material: '2024-T3',
      width: 8,
      chain: [leg(0.75, 'Skin leg'), bend(90, 'up', '3/16'), leg(0.875, 'Web leg')],
    },
  },
  {
    number: 'HC-2102-1',
    title: 'Channel, frame splice',
    document: {
      ...inches,
      thickness: 0.04,
      material: '2024-T3',
      width: 6,
      variables: { W: 2, H: 'W/2' },
      chain: [
        leg('H', 'Left flange'),
        bend(90, 'up', 0.16),
        leg('W', 'Web'),
        bend(90, 'up', 0.16),
        leg('H', 'Right flange'),
      ],
    },
  },
  {
    number: 'HC-2103-1',
    title: 'Hat stringer, aft fuselage floor',
    document: {
      ...inches,
      thickness: 0.032,
      material: '2024-T3',
      width: 24,
      chain: [
        leg(0.75, 'Left flange'),
        bend(90, 'up', '5/32'),
        leg(1, 'Left web'),
        bend(90, 'down', '5/32'),
        leg('1 1/4', 'Crown'),
        bend(90, 'down', '5/32'),
        leg(1, 'Right web'),
        bend(90, 'up', '5/32'),
        leg(0.75, 'Right flange'),
      ],
    },
  },
  {
    number: 'HC-2104-1',
    title: 'Z stiffener, access panel',
    document: {
      ...millimetres,
      thickness: 1,
      material: '2024-T3',
      width: 320,
      seat: 0,
      chain: [leg(20, 'Panel flange'), bend(90, 'up', 4), leg(38, 'Web'), bend(90, 'down', 4), leg(20, 'Free flange')],
    },
  },
  {
    number: 'HC-2105-1',
    title: 'Lipped channel, seat track support',
    document: {
      ...millimetres,
      thickness: 1.2,
      material: '6061-T6',
      width: 450,
      chain: [
        leg(12, 'Left lip'),
        bend(90, 'up', 4),
        leg(32, 'Left flange'),
        bend(90, 'up', 4),
        leg(60, 'Web'),
        bend(90, 'up', 4),
        leg(32, 'Right flange'),
        bend(90, 'up', 4),
        leg(12, 'Right lip'),
      ],
    },
  },
  {
    number: 'HC-2106-1',
    title: 'J stiffener, baggage bay wall',
    document: {
      ...inches,
      thickness: 0.04,
      material: 'Alclad 2024-T3',
      width: 18,
      seat: 0,
      chain: [
        leg(0.75, 'Wall flange'),
        bend(90, 'up', 0.16),
        leg('1 1/2', 'Web'),
        bend(90, 'down', 0.16),
        leg('7/8', 'Cap'),
        bend(90, 'down', 0.16),
        leg('1/2', 'Lip'),
      ],
    },
  },
  {
    number: 'HC-2107-1',
    title: 'Closed-angle bracket, antenna mount',
    document: {
      ...millimetres,
      thickness: 1.6,
      material: '5052-H32',
      width: 60,
      chain: [
        leg(45, 'Base', { measure: 'outside-edge' }),
        bend(120, 'up', 3.2),
        leg(35, 'Mount', { measure: 'outside-edge' }),
      ],
    },
  },
  {
    number: 'HC-2108-1',
    title: 'Equipment tray section, two ribs',
    document: {
      ...inches,
      thickness: 0.04,
      material: '5052-H32',
      width: 14,
      // S and F shape the ribs; C is their crown, B the floor between them, R the radius of every bend.
      variables: { R: '1/8', S: 45, F: 0.55, C: 0.75, B: 2 },
      chain: [
        leg('5/8', 'Left lip'),
        bend(90, 'down', 'R'),
        leg('1 3/4', 'Left wall'),
        bend(90, 'up', 'R'),
        leg('B', 'Floor, left'),
        ...rib(1),
        leg('B', 'Floor, middle'),
        ...rib(2),
        leg('B', 'Floor, right'),
        bend(90, 'up', 'R'),
        leg('1 3/4', 'Right wall'),
        bend(90, 'down', 'R'),
        leg('5/8', 'Right lip'),
      ],
    },
  },
];
