/** One document to compute, and the answer. */
import * as z from 'zod';
import { fieldErrorSchema } from './problem';

/** A bare part document, or one with what the shop knows. Judged by the engine, which words the errors. */
export const solveRequestSchema = z.unknown().meta({
  description: 'A part document, or { "document": a part document, "shop": what the shop knows }.',
});

export const solveAnswerSchema = z.union([
  z
    .looseObject({ ok: z.literal(true), unit: z.enum(['in', 'mm']), developedLength: z.number().nullable() })
    .meta({ description: 'Every figure of the part.' }),
  z.object({ ok: z.literal(false), errors: z.array(fieldErrorSchema) }),
]);
