/** The one way a document gets into the database: through the engine's gate and through the engine, here on the server. */
import { outlineOf } from '../../shared/formed/outline';
import { seated } from '../../shared/formed/seated';
import type { PartDocument } from '../../shared/part/document';
import { restore } from '../../shared/part/restore';
import type { Refused, Solved } from '../../shared/result';
import { ENGINE_VERSION, solve } from '../../shared/solve';

/** A document that the engine accepts, in the columns that keep it and that the register shows of it. */
export interface SolvedDocument {
  readonly ok: true;
  readonly kept: { document: string; result: string; outline: string | null; engineVersion: string };
  readonly summary: Summary;
}

export interface Summary {
  readonly unit: PartDocument['unit'];
  readonly thickness: number;
  readonly material: string | null;
  readonly blankLength: number | null;
  readonly blankWidth: number | null;
  readonly bends: number;
  readonly stops: number;
}

export function solveDocument(value: unknown): SolvedDocument | Refused {
  const restored = restore(value);
  if (!restored.ok) return restored;
  const result = solve(restored.document);
  if (!result.ok) return result;
  const faces = seated(result);
  const outline = faces ? outlineOf(faces) : null;
  return {
    ok: true,
    kept: {
      document: JSON.stringify(restored.document),
      result: JSON.stringify(result),
      outline: outline && JSON.stringify(outline),
      engineVersion: ENGINE_VERSION,
    },
    summary: summaryOf(restored.document, result),
  };
}

function summaryOf(document: PartDocument, result: Solved): Summary {
  const { material } = document;
  return {
    unit: document.unit,
    thickness: result.thickness,
    material: typeof material === 'object' ? material.name : (material ?? null),
    blankLength: result.blank.length,
    blankWidth: result.blank.width,
    bends: result.bends.length,
    stops: result.findings.filter((finding) => finding.level === 'stop').length,
  };
}
