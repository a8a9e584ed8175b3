import { type Check, shown } from './check';
import { rulingRadius } from './ruling-radius';

/** No table speaks of this sheet: a silence that must not be taken for approval. Once a part. */
export const radiusNotChecked: Check = (input) => {
  const { figures, layout } = input;
  const [first] = layout.bends;
  if (first === undefined || rulingRadius(input) !== null) return [];
  const material = figures.material?.name ?? figures.unknownMaterial;
  const why =
    material === null || material === undefined
      ? 'no material is named'
      : `no table row speaks of ${material.slice(0, 60)} at ${shown(figures.thickness)} ${figures.unit}`;
  return [
    {
      level: 'note',
      code: 'radius-not-checked',
      at: '',
      message: `The least radius was not checked: ${why}. Try a bend from this lot, or look the radius up in approved data.`,
      source: 'tables of minimum radii: AC 43.13-1B table 4-6, Aluminum Association table 3-1',
    },
  ];
};
