import type { Check } from './check';

/** A name that the reference table does not hold leaves mass and springback open. */
export const materialUnknown: Check = ({ figures }) =>
  figures.unknownMaterial === null
    ? []
    : [
        {
          level: 'note',
          code: 'material-unknown',
          at: '',
          message: `"${figures.unknownMaterial.slice(0, 60)}" is not in the table of materials: mass and springback are left open. Name one of the table, or give density, modulus and yield stress in the part document.`,
          source: 'table of materials',
        },
      ];
