import { fallsShort } from '../geometry/tolerance';
import { type Check, shown } from './check';
import { rulingRadius } from './ruling-radius';

/**
 * A bend sharper than the tables allow (caution), or inside the table's range (note). Both limits grow when the grain runs
 * along the bend. Source: the row that rules; the growth along the grain is common practice.
 */
export const radiusBelowMinimum: Check = (input) => {
  const ruling = rulingRadius(input);
  if (ruling === null) return [];
  const { figures } = input;
  const { unit, thickness, grain } = figures;
  const along = grain === 'along' ? ', more along the grain (common practice)' : '';
  return figures.joints.flatMap((joint) => {
    const short = fallsShort(joint.radius, ruling.lower);
    if (!short && !fallsShort(joint.radius, ruling.upper)) return [];
    const of = `${ruling.material}, ${shown(thickness)} ${unit}`;
    return [
      {
        level: short ? ('caution' as const) : ('note' as const),
        code: 'radius-below-minimum',
        at: `chain/${joint.chain}`,
        message: short
          ? `The radius ${shown(joint.radius)} ${unit} is below the least for ${of}: ${shown(ruling.lower)} ${unit} (${ruling.rows}${along}). Use ${shown(ruling.lower)} ${unit} or more.`
          : `The radius ${shown(joint.radius)} ${unit} lies inside the table's range for ${of}: ${shown(ruling.lower)} to ${shown(ruling.upper)} ${unit} (${ruling.rows}${along}). Try a bend from this lot.`,
        source: ruling.source,
      },
    ];
  });
};
