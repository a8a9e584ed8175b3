/** Revisions of a part: for now each part has one, a draft. */
import * as z from 'zod';
import type { PartDocument } from '../part/document';
import type { Solved } from '../result';

/** In a request: described as a part document, judged by the engine's own gate (part/restore), which words the errors. */
export const documentJson = z.unknown().meta({ documents: 'PartDocument' });

export const revisionSchema = z.object({
  id: z.string(),
  letter: z.string(),
  state: z.enum(['draft']),
  /** Rises by one with every save; a save names the version it started from. */
  version: z.number().int(),
  document: z.custom<PartDocument>().meta({ documents: 'PartDocument' }),
  /** As the server computed it when the document was saved. */
  result: z.custom<Solved>(),
  engineVersion: z.string(),
  changedAt: z.string(),
  changedBy: z.string(),
  /** Everybody who has edited this revision, in the order of their first edit. */
  editors: z.array(z.string()),
});
export type Revision = z.infer<typeof revisionSchema>;

export const saveRevisionSchema = z.strictObject({
  version: z.number().int().min(1),
  document: documentJson,
});
export type SaveRevision = { version: number; document: PartDocument };
