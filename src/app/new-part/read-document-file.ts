import { restore } from '@shared/part/restore';
import type { PartDocument } from '@shared/part/document';
import type { FieldError } from '@shared/result';

export type DocumentFile =
  | { readonly ok: true; readonly name: string; readonly document: PartDocument }
  | { readonly ok: false; readonly name: string; readonly errors: readonly FieldError[] };

/** The server takes requests of up to 1 MB; a document of 200 bends is a tenth of that. */
export const LARGEST_FILE = 900_000;

/** Reads a part document from a file somebody picked; nothing in it is trusted before the engine's gate. */
export async function readDocumentFile(file: File): Promise<DocumentFile> {
  const refuse = (message: string): DocumentFile => ({ ok: false, name: file.name, errors: [{ path: '', message }] });
  if (file.size > LARGEST_FILE) return refuse('This file is too large for a part document.');
  let text: string;
  try {
    text = await file.text();
  } catch {
    return refuse("This file can't be read. Perhaps it was moved or is still open elsewhere.");
  }
  let value: unknown;
  try {
    value = JSON.parse(text);
  } catch {
    return refuse('This is no part document: the file is not JSON.');
  }
  const restored = restore(unwrapped(value));
  return restored.ok
    ? { ok: true, name: file.name, document: restored.document }
    : { ok: false, name: file.name, errors: restored.errors };
}

/** Every door takes a bare document or one beside its shop context: `{ "document": …, "shop": … }`. */
function unwrapped(value: unknown): unknown {
  if (typeof value !== 'object' || value === null || 'format' in value || !('document' in value)) return value;
  return value.document;
}
