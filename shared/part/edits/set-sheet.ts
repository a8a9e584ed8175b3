/** What is said of the sheet as a whole: thickness, width, material, grain. */
import type { Expression, Grain, Material, PartDocument } from '../document';

export function setThickness(document: PartDocument, thickness: Expression): PartDocument {
  return document.thickness === thickness ? document : { ...document, thickness };
}

/** The length of the bend lines; none when it is not decided. */
export function setWidth(document: PartDocument, width: Expression | undefined): PartDocument {
  if (document.width === width) return document;
  const { width: _former, ...rest } = document;
  return width === undefined ? rest : { ...rest, width };
}

export function setMaterial(document: PartDocument, material: string | Material | undefined): PartDocument {
  if (document.material === material) return document;
  const { material: _former, ...rest } = document;
  return material === undefined ? rest : { ...rest, material };
}

export function setGrain(document: PartDocument, grain: Grain | undefined): PartDocument {
  if (document.grain === grain) return document;
  const { grain: _former, ...rest } = document;
  return grain === undefined ? rest : { ...rest, grain };
}
