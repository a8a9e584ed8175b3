/** Where a page of the register ended. Opaque to the caller; a key and an id, so that a page costs the same however far down. */
import { z } from 'zod';
import { PART_SORTS } from '../../shared/contracts/parts';

const key = z
  .string()
  .max(400)
  .regex(/^\P{Cc}*$/u);
const cursorSchema = z.tuple([z.enum(PART_SORTS), key, key]);

export interface Cursor {
  readonly key: string;
  readonly id: string;
}

export const writeCursor = (sort: string, { key, id }: Cursor): string =>
  Buffer.from(JSON.stringify([sort, key, id])).toString('base64url');

/** Null for anything that `writeCursor` did not make for this sort. */
export function readCursor(sort: string, text: string): Cursor | null {
  try {
    const [madeFor, at, id] = cursorSchema.parse(JSON.parse(Buffer.from(text, 'base64url').toString('utf8')));
    return madeFor === sort ? { key: at, id } : null;
  } catch {
    return null;
  }
}
