import type { Check } from './check';

/** Sheet bends best square to its grain. Once a part. Source: the airframe handbook's advice. */
export const grainAlongBend: Check = ({ figures, layout }) => {
  const [first] = layout.bends;
  if (figures.grain !== 'along' || first === undefined) return [];
  return [
    {
      level: 'caution',
      code: 'grain-along-bend',
      at: `chain/${first.chain}`,
      message:
        'The grain runs along the bend lines, where sheet cracks first. Lay the blank the other way on the sheet, or use a larger radius and try a bend from this lot.',
      source: 'FAA-H-8083-31 ch. 4: lay out so that bends run across the grain',
    },
  ];
};
