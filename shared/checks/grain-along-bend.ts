import { fallsShort } from '../geometry/tolerance';
import { type Check, shown } from './check';
import { rulingRadius } from './ruling-radius';

/**
 * Sheet bends best square to its grain. Once a part: a caution, or a note where every radius meets the figure for bending
 * along the grain. Source: the airframe handbook's advice; the figure is common practice.
 */
export const grainAlongBend: Check = (input) => {
  const { figures, layout } = input;
  const [first] = layout.bends;
  if (figures.grain !== 'along' || first === undefined) return [];
  const ruling = rulingRadius(input);
  const meets = ruling !== null && layout.bends.every((bend) => !fallsShort(bend.radius, ruling.lower));
  return [
    {
      level: meets ? 'note' : 'caution',
      code: 'grain-along-bend',
      at: `chain/${first.chain}`,
      message: meets
        ? `The grain runs along the bend lines. Every radius meets the ${shown(ruling.lower)} ${figures.unit} wanted that way; try a bend from this lot all the same.`
        : 'The grain runs along the bend lines, where sheet cracks first. Lay the blank the other way on the sheet, or use a larger radius and try a bend from this lot.',
      source: 'FAA-H-8083-31 ch. 4: lay out so that bends run across the grain',
    },
  ];
};
