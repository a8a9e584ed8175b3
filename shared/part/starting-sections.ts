/** Sections that most parts begin as, from the overall sizes that people measure (outside to outside). */
import type { ChainEntry, Unit } from './document';

export interface Size {
  readonly key: string;
  readonly label: string;
  readonly initial: Readonly<Record<Unit, string>>;
  /** Degrees; everything else is a length. */
  readonly angle?: true;
}

export interface StartingSection {
  readonly id: string;
  readonly name: string;
  /** One sentence on what is measured how. */
  readonly says: string;
  readonly sizes: readonly Size[];
  /** The leg that lies level, so that width and height of the formed part are the ones that the sizes speak of. */
  readonly seat: number;
  /** @param sizes figure or expression by key @param radius of every bend @returns the chain, measured to mold lines */
  readonly make: (sizes: Readonly<Record<string, string>>, radius: string) => ChainEntry[];
}

type Turns = readonly ('up' | 'down')[];

/** Square section: legs by size key with their names, and the turn between each two. */
function square(legs: readonly (readonly [string, string])[], turns: Turns): StartingSection['make'] {
  return (sizes, radius) =>
    legs.flatMap(([key, name], i): ChainEntry[] => {
      const leg: ChainEntry = { leg: figure(sizes[key] ?? ''), name };
      const turn = turns[i];
      return turn === undefined ? [leg] : [leg, { bend: 90, turn, radius: figure(radius) }];
    });
}

/** Plain figures are kept as numbers, as the typed chain keeps them. */
function figure(text: string): string | number {
  const trimmed = text.trim();
  return trimmed !== '' && String(Number(trimmed)) === trimmed ? Number(trimmed) : trimmed;
}

const size = (key: string, label: string, inch: string, millimetre: string): Size => ({
  key,
  label,
  initial: { in: inch, mm: millimetre },
});

const HEIGHT = size('height', 'Overall height', '1', '25');
const WIDTH = size('width', 'Overall width', '2', '50');

export const STARTING_SECTIONS: readonly StartingSection[] = [
  {
    id: 'angle',
    name: 'Angle',
    seat: 0,
    says: 'Both legs outside to outside.',
    sizes: [size('first', 'First leg', '1', '25'), size('second', 'Second leg', '1', '25')],
    make: square(
      [
        ['first', 'First leg'],
        ['second', 'Second leg'],
      ],
      ['up'],
    ),
  },
  {
    id: 'channel',
    name: 'Channel',
    seat: 1,
    says: 'Flange height and web width, outside to outside.',
    sizes: [HEIGHT, WIDTH],
    make: square(
      [
        ['height', 'Left flange'],
        ['width', 'Web'],
        ['height', 'Right flange'],
      ],
      ['up', 'up'],
    ),
  },
  {
    id: 'z',
    name: 'Z',
    seat: 0,
    says: 'Web height from outside to outside, each flange from its edge to the outside of the web.',
    sizes: [size('lower', 'Lower flange', '3/4', '20'), HEIGHT, size('upper', 'Upper flange', '3/4', '20')],
    make: square(
      [
        ['lower', 'Lower flange'],
        ['height', 'Web'],
        ['upper', 'Upper flange'],
      ],
      ['up', 'down'],
    ),
  },
  {
    id: 'hat',
    name: 'Hat',
    seat: 0,
    says: 'Height from under the feet to the top of the crown, crown outside to outside, feet from edge to the far face of the web.',
    sizes: [size('foot', 'Each foot', '3/4', '20'), HEIGHT, size('crown', 'Crown width', '1 1/2', '40')],
    make: square(
      [
        ['foot', 'Left foot'],
        ['height', 'Left web'],
        ['crown', 'Crown'],
        ['height', 'Right web'],
        ['foot', 'Right foot'],
      ],
      ['up', 'down', 'down', 'up'],
    ),
  },
  {
    id: 'lipped-channel',
    name: 'Lipped channel',
    seat: 2,
    says: 'Lips, flange height and web width, outside to outside.',
    sizes: [size('lip', 'Each lip', '1/2', '12'), HEIGHT, WIDTH],
    make: square(
      [
        ['lip', 'Left lip'],
        ['height', 'Left flange'],
        ['width', 'Web'],
        ['height', 'Right flange'],
        ['lip', 'Right lip'],
      ],
      ['up', 'up', 'up', 'up'],
    ),
  },
  {
    id: 'j',
    name: 'J',
    seat: 1,
    says: 'Tall leg, web and short return, outside to outside.',
    sizes: [
      size('leg', 'Tall leg', '1 1/2', '40'),
      size('width', 'Web width', '1', '25'),
      size('return', 'Return', '1/2', '12'),
    ],
    make: square(
      [
        ['leg', 'Tall leg'],
        ['width', 'Web'],
        ['return', 'Return'],
      ],
      ['up', 'up'],
    ),
  },
  {
    id: 'sloped-hat',
    name: 'Hat with sloped webs',
    seat: 0,
    says: 'Height from the top of the feet to the top of the crown; crown and feet to the sharp outside corners; webs at the angle that they are bent up from the feet.',
    sizes: [
      size('foot', 'Each foot', '3/4', '20'),
      size('height', 'Height above the feet', '1', '25'),
      size('crown', 'Crown width', '1', '25'),
      { key: 'angle', label: 'Bend angle', initial: { in: '60', mm: '60' }, angle: true },
    ],
    make: (sizes, radius) => {
      // Both its corners lie on one face, so that the slope alone turns its length into height, whatever the thickness.
      const web = `(${sizes['height'] ?? ''}) / sin(${sizes['angle'] ?? ''})`;
      const bend = (turn: 'up' | 'down'): ChainEntry => ({
        bend: figure(sizes['angle'] ?? ''),
        turn,
        radius: figure(radius),
      });
      const foot = figure(sizes['foot'] ?? '');
      return [
        { leg: foot, name: 'Left foot' },
        bend('up'),
        { leg: web, name: 'Left web', measure: ['inside', 'mold-line'] },
        bend('down'),
        { leg: figure(sizes['crown'] ?? ''), name: 'Crown' },
        bend('down'),
        { leg: web, name: 'Right web', measure: ['mold-line', 'inside'] },
        bend('up'),
        { leg: foot, name: 'Right foot' },
      ];
    },
  },
  {
    id: 'stepped-angle',
    name: 'Angle with a stepped leg',
    seat: 0,
    says: 'Both legs outside to outside, the second over its step; the land is the flat end past the step.',
    sizes: [
      size('first', 'First leg', '1', '25'),
      size('second', 'Second leg', '2', '50'),
      size('land', 'Land past the step', '3/4', '20'),
      size('depth', 'Depth of the step', '.040', '1'),
      size('run', 'Run of the step', '1/4', '6'),
    ],
    make: (sizes, radius) => {
      const [second, land, run] = ['second', 'land', 'run'].map((key) => sizes[key] ?? '');
      return [
        { leg: figure(sizes['first'] ?? ''), name: 'First leg' },
        { bend: 90, turn: 'up', radius: figure(radius) },
        { leg: `(${second}) - (${run}) - (${land})`, name: 'Second leg' },
        { joggle: figure(sizes['depth'] ?? ''), run: figure(run ?? ''), turn: 'up', radius: figure(radius) },
        { leg: figure(land ?? ''), name: 'Land' },
      ];
    },
  },
];
