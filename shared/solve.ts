/** The one door of the engine: a part document in, every figure of it out. */
import { runChecks } from './checks/run-checks';
import { crossingsOf } from './formed/crossings';
import { envelopeOf } from './formed/envelope';
import { facesOf, moldPoint } from './formed/faces';
import { heightsOf } from './formed/heights';
import { formSolids, type Solid } from './formed/solid';
import { holesOf } from './layout/holes';
import { layOut, type Layout } from './layout/lay-out';
import { evaluateDocument } from './part/evaluate';
import type { PartFigures } from './part/figures';
import { restore } from './part/restore';
import type { Blank, Formed, HoleResult, Refused, SolveResult } from './result';
import { massOf } from './section/mass';
import { sectionOf } from './section/section';
import { restoreShop } from './shop/context';

/** Rises with every change that can move a figure; kept beside each stored result. */
export const ENGINE_VERSION = '0.1.0';

/**
 * Lays out, forms and checks one part.
 *
 * @param document a part document of any origin (see part/document)
 * @param shop the shop context: the shop's choices and limits (shop/context); left out, the defaults hold
 * @returns every figure (lengths in the part's unit, angles in degrees) with its findings; or `ok: false` with the path of
 *   each field that is wrong. A stop leaves `ok` true: figures that rest on a broken one are null. Never throws on bad input.
 * @source see each step's own file
 * @example solve({ format: 'leafwright/1', unit: 'in', thickness: 0.04, allowance: { method: 'handbook' }, chain: [{ leg: 1 }] }).ok // true
 */
export function solve(document: unknown, shop?: unknown): SolveResult {
  const restored = restore(document);
  const context = restoreShop(shop);
  if (!restored.ok) return restored;
  if (!context.ok) return context;
  const evaluated = evaluateDocument(restored.document);
  if (!evaluated.ok) return evaluated;
  const { figures } = evaluated;
  const layout = layOut(figures);
  const solids = layout.pieces === null ? null : formSolids(layout.pieces, figures.thickness);
  const crossings = solids === null ? [] : crossingsOf(solids, figures.thickness);
  const holes = holesOf(figures, layout);
  const result = {
    ok: true as const,
    unit: figures.unit,
    thickness: figures.thickness,
    developedLength: layout.developedLength,
    blank: blankOf(figures, layout, holes),
    legs: layout.legs,
    bends: layout.bends,
    joggles: layout.joggles,
    formed: solids === null ? null : formedOf(solids, figures, layout),
    section: solids === null || crossings.length > 0 ? null : sectionOf(solids, figures.thickness),
    holes,
    findings: runChecks({ figures, layout, crossings, holes, rules: context.rules }),
  };
  return isFinite(result) ? result : OVERFLOW;
}

const OVERFLOW: Refused = {
  ok: false,
  errors: [{ path: '', message: 'These figures are too large or too small against each other to be laid out.' }],
};

/** No figure of an answer may be NaN or infinite; sizes apart by hundreds of powers of ten can make one. */
function isFinite(value: unknown): boolean {
  if (typeof value === 'number') return Number.isFinite(value);
  if (typeof value !== 'object' || value === null) return true;
  // Walked without making lists of values: this sees every figure of every answer.
  if (Array.isArray(value)) {
    for (const entry of value) if (!isFinite(entry)) return false;
    return true;
  }
  for (const key in value) if (!isFinite((value as Record<string, unknown>)[key])) return false;
  return true;
}

function blankOf(figures: PartFigures, layout: Layout, holes: readonly HoleResult[]): Blank {
  const { developedLength: length } = layout;
  const { width, trim, material, thickness, unit } = figures;
  const drilled = holes.reduce((sum, hole) => sum + (Math.PI / 4) * hole.diameter ** 2, 0);
  const net = length === null || width === null ? null : length * width - drilled;
  // More holes than blank: no figure is better than a negative one.
  const area = net === null || net <= 0 ? null : net;
  const density = material?.density;
  return {
    length,
    width,
    area,
    mass: area === null || density === undefined ? null : massOf(area, thickness, density, unit),
    roughLength: length === null ? null : length + trim.start + trim.end,
    trim,
  };
}

function formedOf(solids: readonly Solid[], figures: PartFigures, layout: Layout): Formed {
  const { thickness } = figures;
  return {
    envelope: envelopeOf(solids, thickness, layout.legs, figures.seat),
    moldPoints: solids.flatMap((solid) => (solid.kind === 'sector' ? [moldPoint(solid)] : [])),
    faces: facesOf(solids, thickness),
    heights: heightsOf(solids, thickness),
  };
}
