import type { Allowance, ChainEntry, PartDocument } from '@shared/part/document';
import { DOCUMENT_FORMAT } from '@shared/part/document';
import { STARTING_SECTIONS } from '@shared/part/starting-sections';
import { MATERIALS } from '@shared/reference/materials';
import { parseTypedChain } from '@shared/part/typed-chain';
import type { Solved } from '@shared/result';
import { solve } from '@shared/solve';
import { evaluate } from '@shared/units/expression';
import { typedExpression } from '../ui/typed-expression';
import type { NewPartValues } from './new-part-form';

/** Messages by field: `thickness`, `size/web`, `chain`, `document`; what belongs to no field stands under `section`. */
export type Messages = Readonly<Record<string, string>>;

export interface ChainError {
  readonly start: number;
  readonly end: number;
  readonly message: string;
}

export interface Draft {
  /** Null while something is broken or missing. */
  readonly document: PartDocument | null;
  readonly solved: Solved | null;
  readonly messages: Messages;
  readonly chainErrors: readonly ChainError[];
}

/** What stands in the form as a part document, judged by the engine. */
export function draftFrom(values: NewPartValues, imported: PartDocument | null): Draft {
  const messages: Record<string, string> = {};
  const chainErrors: ChainError[] = [];
  const document = values.way === 'document' ? imported : composed(values, messages, chainErrors);
  if (document === null) return { document: null, solved: null, messages, chainErrors };
  const result = solve(document);
  if (result.ok && Object.keys(messages).length === 0) return { document, solved: result, messages, chainErrors };
  if (!result.ok) for (const error of result.errors) place(error.path, error.message, values, messages);
  return { document: null, solved: null, messages, chainErrors };
}

function composed(
  values: NewPartValues,
  messages: Record<string, string>,
  chainErrors: ChainError[],
): PartDocument | null {
  const chain = values.way === 'chain' ? typed(values, messages, chainErrors) : started(values, messages);
  if (chain === null) return null;
  const material = materialNamed(values.material.trim());
  return {
    format: DOCUMENT_FORMAT,
    unit: values.unit,
    thickness: typedExpression(values.thickness),
    ...(material === '' ? {} : { material }),
    ...(values.width.trim() === '' ? {} : { width: typedExpression(values.width) }),
    allowance: allowanceOf(values),
    chain,
    ...seatOf(values),
  };
}

/** "7075-t6" is the table's 7075-T6; a name that the table doesn't have stays as typed. */
function materialNamed(typed: string): string {
  return MATERIALS.find(({ name }) => name.toLowerCase() === typed.toLowerCase())?.name ?? typed;
}

function allowanceOf({ method, k, hardness }: NewPartValues): Allowance {
  if (method === 'k-factor') return { method, k };
  if (method === 'rule-90') return { method, hardness };
  return { method };
}

/** A typed chain says nothing of how the part lies; the engine chooses. */
function seatOf({ way, section }: NewPartValues): { seat?: number } {
  const seat = way === 'section' ? STARTING_SECTIONS.find(({ id }) => id === section)?.seat : undefined;
  return seat === undefined ? {} : { seat };
}

function typed(
  values: NewPartValues,
  messages: Record<string, string>,
  chainErrors: ChainError[],
): ChainEntry[] | null {
  if (values.chain.trim() === '') {
    messages['chain'] = 'Type the chain: lengths of the legs with the bends between them.';
    return null;
  }
  const parsed = parseTypedChain(values.chain);
  if (parsed.ok) return [...parsed.chain];
  chainErrors.push(...parsed.errors);
  messages['chain'] = parsed.errors[0]?.message ?? "This chain can't be read.";
  return null;
}

/** Each size is judged by itself first, so that the message stands at the box it was typed in. */
function started(values: NewPartValues, messages: Record<string, string>): ChainEntry[] | null {
  const section = STARTING_SECTIONS.find((entry) => entry.id === values.section);
  if (section === undefined) return null;
  const sizes = Object.fromEntries(
    Object.entries(values.sizes[section.id] ?? {}).map(([key, text]) => [key, String(typedExpression(text))]),
  );
  const context = { unit: values.unit, scope: new Map() };
  for (const size of section.sizes) {
    const figure = evaluate(sizes[size.key] ?? '', size.angle ? 'angle' : 'length', context);
    if (!figure.ok) messages[`size/${size.key}`] = figure.message;
    else if (figure.value <= 0) messages[`size/${size.key}`] = 'This must be more than zero.';
  }
  const radius = evaluate(typedExpression(values.radius), 'length', context);
  if (!radius.ok) messages['radius'] = radius.message;
  else if (radius.value < 0) messages['radius'] = "The bend radius can't be less than zero.";
  return [...section.make(sizes, String(typedExpression(values.radius)))];
}

/** The engine's path to the field of this form; the first message at a field stays. */
function place(path: string, message: string, values: NewPartValues, messages: Record<string, string>): void {
  const [head = '', , last] = path.split('/');
  const shown = values.way === 'document' ? 'document' : fieldOf(head, last, path, values);
  if (shown === 'section' && Object.keys(messages).some((key) => key.startsWith('size/') || key === 'radius')) return;
  messages[shown] ??= values.way === 'document' && path !== '' ? `${path}: ${message}` : message;
}

function fieldOf(head: string, last: string | undefined, path: string, values: NewPartValues): string {
  if (head === 'chain') {
    if (values.way === 'chain') return 'chain';
    return last === 'radius' ? 'radius' : 'section';
  }
  if (path === 'allowance/k') return 'k';
  return ['thickness', 'width', 'material'].includes(head) ? head : 'section';
}
