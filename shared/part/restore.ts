/** The one gate for documents from outside: storage, files, requests, the clipboard. */
import type * as z from 'zod';
import type { FieldError, Refused } from '../result';
import type { PartDocument } from './document';
import { expectedAt } from './expected';
import { bendSchema, frameSchema, joggleSchema, legSchema } from './schema';

export const MOST_BENDS = 200;
/** A chain of 200 bends has 401 entries; a longer list is refused before it is read. */
const LONGEST_CHAIN = 2 * MOST_BENDS + 1;
/** Rows spread out: more would be a sieve, and its result too large to keep. */
const MOST_HOLES = 2000;
/** All variables together: past this no person wrote them, and working them out would keep others waiting. */
const VARIABLES_LENGTH = 200_000;
const MOST_ERRORS = 50;
/** Of a name in a path or a message: an answer never grows with what was sent. */
const LONGEST_NAME = 60;

export type Restored = { readonly ok: true; readonly document: PartDocument } | Refused;

/**
 * A part document from a value of unknown origin. Shape only: expressions are judged when they are evaluated.
 *
 * @param value anything at all, e.g. the outcome of JSON.parse; never changed
 * @returns the document, or every error with the path of its field
 * @example restore(null).ok // false
 */
export function restore(value: unknown): Restored {
  if (typeof value !== 'object' || value === null || Array.isArray(value)) {
    return refused([{ path: '', message: 'Expected a part document: a JSON object.' }]);
  }
  const { chain, ...frame } = value as Record<string, unknown>;
  const errors: FieldError[] = [];
  if (Object.hasOwn(value, '__proto__')) errors.push({ path: '__proto__', message: 'There is no field of this name.' });
  const dashNumbers = frame['dashNumbers'];
  errors.push(...prototypeVariable('', frame));
  if (Array.isArray(dashNumbers)) {
    errors.push(...dashNumbers.flatMap((dash, i) => prototypeVariable(`dashNumbers/${i}/`, dash)));
  }
  if (errors.length > 0) return refused(errors);
  const framed = frameSchema.safeParse(frame, { jitless: true });
  if (!framed.success) errors.push(...worded(framed.error, []));
  errors.push(...chainErrors(chain));
  if (errors.length > 0) return refused(errors);
  const document = { ...framed.data, chain } as PartDocument;
  const rest = [...doubledIds(document), ...sizeErrors(document)];
  return rest.length > 0 ? refused(rest) : { ok: true, document };
}

/** The schema's reading of a record drops this name without a word, so it is refused before. */
function prototypeVariable(path: string, holder: unknown): FieldError[] {
  const variables =
    typeof holder === 'object' && holder !== null ? (holder as { variables?: unknown }).variables : null;
  if (typeof variables !== 'object' || variables === null || !Object.hasOwn(variables, '__proto__')) return [];
  return [{ path: `${path}variables/__proto__`, message: "This name can't be given to a variable." }];
}

function refused(errors: readonly FieldError[]): Refused {
  return { ok: false, errors: errors.slice(0, MOST_ERRORS) };
}

function chainErrors(chain: unknown): FieldError[] {
  if (!Array.isArray(chain)) return [{ path: 'chain', message: expectedAt(['chain']) }];
  if (chain.length === 0) return [{ path: 'chain', message: 'The chain is empty: it needs one leg at least.' }];
  if (chain.length > LONGEST_CHAIN) {
    return [{ path: 'chain', message: `A chain has ${MOST_BENDS} bends at most (${LONGEST_CHAIN} entries).` }];
  }
  const errors: FieldError[] = [];
  let bends = 0;
  // Not chain.forEach: a list with gaps is no chain, and forEach would step over them.
  Array.from<unknown>(chain).forEach((entry, i) => {
    const kind = kindOf(entry);
    if (kind === null) {
      errors.push({ path: `chain/${i}`, message: 'Expected a leg, a bend or a joggle.' });
      return;
    }
    const parsed = KINDS[kind].safeParse(entry, { jitless: true });
    if (!parsed.success) errors.push(...worded(parsed.error, ['chain', i]));
    if (kind !== 'leg') bends += kind === 'bend' ? 1 : 2;
    const wanted = i % 2 === 0;
    if (wanted !== (kind === 'leg')) {
      const message = wanted
        ? 'A leg must stand here: the chain begins with a leg, and one follows every bend or joggle.'
        : 'A bend or a joggle must stand between two legs.';
      errors.push({ path: `chain/${i}`, message });
    }
  });
  if (chain.length % 2 === 0)
    errors.push({ path: `chain/${chain.length - 1}`, message: 'The chain must end with a leg.' });
  if (bends > MOST_BENDS) {
    errors.push({
      path: 'chain',
      message: `A chain has ${MOST_BENDS} bends at most; a joggle counts two. This one has ${bends}.`,
    });
  }
  return errors;
}

const KINDS = { leg: legSchema, bend: bendSchema, joggle: joggleSchema } as const;

function kindOf(entry: unknown): keyof typeof KINDS | null {
  if (typeof entry !== 'object' || entry === null || Array.isArray(entry)) return null;
  const kinds = (['leg', 'bend', 'joggle'] as const).filter((kind) => Object.hasOwn(entry, kind));
  if (kinds.length === 1) return kinds[0]!;
  // Neither or several: tell by the other fields which one was meant, so that the message fits.
  if (kinds.length > 1) return null;
  if (Object.hasOwn(entry, 'run')) return 'joggle';
  if (Object.hasOwn(entry, 'radius') || Object.hasOwn(entry, 'turn')) return 'bend';
  return Object.hasOwn(entry, 'measure') || Object.hasOwn(entry, 'name') ? 'leg' : null;
}

/** The schema's issues as sentences at their fields. */
function worded(error: z.ZodError, base: readonly PropertyKey[]): FieldError[] {
  return error.issues.flatMap((issue): FieldError[] => {
    const path = [...base, ...issue.path];
    if (issue.code === 'unrecognized_keys') {
      return issue.keys.slice(0, MOST_ERRORS).map((key) => ({
        path: pathOf([...path, key]),
        message: `There is no field "${cut(key)}" here.`,
      }));
    }
    return [{ path: pathOf(path), message: expectedAt(path) }];
  });
}

const pathOf = (path: readonly PropertyKey[]): string => path.map((step) => cut(String(step))).join('/');

/** Never through the middle of a character. */
const cut = (name: string): string => name.slice(0, LONGEST_NAME).replace(/[\uD800-\uDBFF]$/, '');

function sizeErrors({ holes = [], variables = {} }: PartDocument): FieldError[] {
  const errors: FieldError[] = [];
  const spread = holes.reduce((sum, hole) => sum + (hole.count ?? 1), 0);
  if (spread > MOST_HOLES)
    errors.push({ path: 'holes', message: `A part has ${MOST_HOLES} holes at most; this one has ${spread}.` });
  const length = Object.entries(variables).reduce((sum, [name, value]) => sum + name.length + String(value).length, 0);
  if (length > VARIABLES_LENGTH) {
    errors.push({ path: 'variables', message: `All variables together have ${VARIABLES_LENGTH} characters at most.` });
  }
  return errors;
}

function doubledIds(document: PartDocument): FieldError[] {
  const seen = new Set<string>();
  const errors: FieldError[] = [];
  const look = (list: readonly { readonly id?: string }[], name: string): void =>
    list.forEach(({ id }, i) => {
      if (id === undefined) return;
      if (seen.has(id)) errors.push({ path: `${name}/${i}/id`, message: `The id "${id}" is given twice.` });
      seen.add(id);
    });
  look(document.chain, 'chain');
  look(document.holes ?? [], 'holes');
  return errors;
}
