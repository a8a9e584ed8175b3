/** The shape of a part document. Judged by `restore`; described to others by the API's own description. */
import * as z from 'zod';
import { DOCUMENT_FORMAT } from './document';

// In a browser under a strict content security policy no code may be made from text; without this, zod tries at once.
z.config({ jitless: true });

const LARGEST_COUNT = 1000;

/**
 * Text for people, in any writing: one line that shows as it is. No control characters, no halves of a character, and no marks
 * that turn the direction of the writing around (a number after one reads backwards).
 */
export const PLAIN_LINE = /^[^\p{Cc}\p{Cs}\u202A-\u202E\u2066-\u2069]*$/u;

const label = z.string().max(200).regex(PLAIN_LINE);
const idSchema = z.string().min(1).max(100);

export const expressionSchema = z.union([z.number(), z.string()]).meta({
  description: 'A number, or an expression such as "1 1/8", "W/2 - 1/16" or "25 mm".',
});

export const turnSchema = z.enum(['up', 'down']);
export const handSchema = z.enum(['as-drawn', 'opposite']);
export const measureKindSchema = z.enum(['mold-line', 'outside-edge', 'inside', 'flat']);
export const measureSchema = z.union([measureKindSchema, z.tuple([measureKindSchema, measureKindSchema])]);

export const allowanceSchema = z.discriminatedUnion('method', [
  z.strictObject({ method: z.literal('k-factor'), k: expressionSchema }),
  z.strictObject({ method: z.literal('handbook') }),
  z.strictObject({ method: z.literal('din-6935') }),
  z.strictObject({ method: z.literal('rule-90'), hardness: z.enum(['soft', 'medium', 'hard']) }),
  z.strictObject({ method: z.literal('shop'), k: expressionSchema, figure: idSchema.optional() }),
  z.strictObject({ method: z.literal('measured'), allowance: expressionSchema }),
]);

export const noseSchema = z.strictObject({ radius: expressionSchema });

export const legSchema = z.strictObject({
  id: idSchema.optional(),
  leg: expressionSchema,
  name: label.optional(),
  measure: measureSchema.optional(),
});

export const bendSchema = z.strictObject({
  id: idSchema.optional(),
  bend: expressionSchema,
  turn: turnSchema,
  radius: expressionSchema,
  name: label.optional(),
  allowance: allowanceSchema.optional(),
  nose: noseSchema.optional(),
});

export const joggleSchema = z.strictObject({
  id: idSchema.optional(),
  joggle: expressionSchema,
  run: expressionSchema,
  turn: turnSchema,
  radius: expressionSchema,
  name: label.optional(),
  allowance: allowanceSchema.optional(),
  nose: noseSchema.optional(),
});

export const holeSchema = z.strictObject({
  id: idSchema.optional(),
  leg: z.number().int().min(0),
  diameter: expressionSchema,
  from: z.enum(['start', 'end', 'mold-start', 'mold-end']),
  at: expressionSchema,
  across: expressionSchema,
  count: z.number().int().min(1).max(LARGEST_COUNT).optional(),
  pitch: expressionSchema.optional(),
  name: label.optional(),
});

/** In a document and where parts are looked for by it. */
export const materialNameSchema = z
  .string()
  .trim()
  .min(1, 'Give the material a name.')
  .max(100, 'The name of a material has 100 characters at most.')
  .regex(PLAIN_LINE, 'The name of a material is one line of plain text.');

export const materialSchema = z.union([
  materialNameSchema,
  z.strictObject({
    name: materialNameSchema,
    density: z.number().positive().optional(),
    modulus: z.number().positive().optional(),
    yield: z.number().positive().optional(),
  }),
]);

const toleranceSchema = z.tuple([expressionSchema, expressionSchema]);

export const variablesSchema = z.record(z.string(), expressionSchema);

const dashNumberSchema = z.strictObject({
  dash: z.string().min(1).max(20).regex(PLAIN_LINE),
  variables: variablesSchema.optional(),
  hand: handSchema.optional(),
  title: label.optional(),
});

/** Everything but the chain, whose entries are judged one by one so that each error names its own field. */
export const frameSchema = z.strictObject({
  format: z.literal(DOCUMENT_FORMAT),
  unit: z.enum(['in', 'mm']),
  thickness: expressionSchema,
  material: materialSchema.optional(),
  width: expressionSchema.optional(),
  grain: z.enum(['along', 'across']).optional(),
  allowance: allowanceSchema,
  variables: variablesSchema.optional(),
  holes: z.array(holeSchema).max(LARGEST_COUNT).optional(),
  seat: z.number().int().min(0).optional(),
  nose: noseSchema.optional(),
  trim: z.strictObject({ start: expressionSchema.optional(), end: expressionSchema.optional() }).optional(),
  tolerances: z
    .strictObject({
      length: toleranceSchema.optional(),
      angle: toleranceSchema.optional(),
      radius: toleranceSchema.optional(),
      k: toleranceSchema.optional(),
      cut: toleranceSchema.optional(),
      thickness: toleranceSchema.optional(),
    })
    .optional(),
  hand: handSchema.optional(),
  dashNumbers: z.array(dashNumberSchema).max(200).optional(),
});

export const chainEntrySchema = z.union([legSchema, bendSchema, joggleSchema]);

export const documentSchema = z.strictObject({ ...frameSchema.shape, chain: z.array(chainEntrySchema).min(1) }).meta({
  id: 'PartDocument',
  description: 'A part: legs, bends and joggles in order, and what is needed to lay them out.',
});
