/** Parts: the register and its rows. */
import * as z from 'zod';
import { materialNameSchema, PLAIN_LINE } from '../part/schema';
import { documentJson, revisionSchema } from './revisions';

export const PART_SORTS = ['number', '-number', 'changed', '-changed', 'title', '-title'] as const;

/** Letters, digits and the marks that drawing numbers use; upper case by custom, kept as typed. */
export const partNumberSchema = z
  .string()
  .trim()
  // "SP 1" and "SP  1" look alike on paper: they are one number.
  .overwrite((number) => number.replace(/\s+/g, ' '))
  .min(1, 'Give the part a number.')
  .max(40, 'A part number has 40 characters at most.')
  .regex(/^[A-Za-z0-9][A-Za-z0-9 ./_-]*$/, 'Use letters, digits, spaces and - . / _ and start with a letter or digit.');

export const partTitleSchema = z
  .string()
  .trim()
  .min(1, 'Give the part a title.')
  .max(120, 'A title has 120 characters at most.')
  .regex(PLAIN_LINE, 'A title is one line of plain text.');

export const listPartsSchema = z.strictObject({
  search: z.string().trim().max(100).optional(),
  material: materialNameSchema.optional(),
  unit: z.enum(['in', 'mm']).optional(),
  sort: z.enum(PART_SORTS).default('-changed'),
  /** Keyset cursor: `next` of the page before. */
  after: z.string().max(400).optional(),
  limit: z.coerce.number().int().min(1).max(200).default(50),
});
export type ListParts = z.input<typeof listPartsSchema>;

export const partRowSchema = z.object({
  id: z.string(),
  number: z.string(),
  title: z.string(),
  /** Newest revision. */
  revision: z.string(),
  state: z.enum(['draft']),
  unit: z.enum(['in', 'mm']),
  thickness: z.number().nullable(),
  material: z.string().nullable(),
  blankLength: z.number().nullable(),
  blankWidth: z.number().nullable(),
  bends: z.number().int(),
  stops: z.number().int(),
  /** Outline of the formed section (shared/formed/outline): an SVG path, y up, and its box; null when it can't be drawn. */
  outline: z.object({ path: z.string(), box: z.tuple([z.number(), z.number(), z.number(), z.number()]) }).nullable(),
  changedAt: z.string(),
  changedBy: z.string(),
});
export type PartRow = z.infer<typeof partRowSchema>;

export const partListSchema = z.object({
  parts: z.array(partRowSchema),
  next: z.string().nullable(),
  total: z.number().int(),
  /** Every material in the register, for the filter. */
  materials: z.array(z.string()),
});
export type PartList = z.infer<typeof partListSchema>;

export const createPartSchema = z.strictObject({
  number: partNumberSchema,
  title: partTitleSchema,
  document: documentJson,
});
export type CreatePart = z.input<typeof createPartSchema>;

export const changePartSchema = z.strictObject({
  /** Of the part, as the change started from it. */
  version: z.number().int().min(1),
  number: partNumberSchema.optional(),
  title: partTitleSchema.optional(),
});
export type ChangePart = z.input<typeof changePartSchema>;

export const partSchema = z.object({
  id: z.string(),
  number: z.string(),
  title: z.string(),
  /** Rises by one whenever number or title change; such a change names the version it started from. */
  version: z.number().int(),
  createdAt: z.string(),
  createdBy: z.string(),
  revision: revisionSchema,
});
export type Part = z.infer<typeof partSchema>;
