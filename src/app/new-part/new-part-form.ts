import { inject } from '@angular/core';
import { type FormControl, type FormGroup, NonNullableFormBuilder, type ValidatorFn } from '@angular/forms';
import { partNumberSchema, partTitleSchema } from '@shared/contracts/parts';
import type { Hardness, Unit } from '@shared/part/document';
import { STARTING_SECTIONS } from '@shared/part/starting-sections';
import type { StartMethod } from './allowance-words';

/** How the chain comes about. */
export type Way = 'section' | 'chain' | 'document';

/** What a sheet starts with, by unit: until somebody types there, these follow the unit. */
export const SHEET_STARTS = {
  thickness: { in: '0.040', mm: '1' },
  radius: { in: '0.16', mm: '4' },
  width: { in: '', mm: '' },
} as const satisfies Record<string, Record<Unit, string>>;

const FIRST_SECTION = 'channel';

export type SizeGroup = FormGroup<Record<string, FormControl<string>>>;

/** Everything typed on the page, kept for all three ways at once: changing one's mind loses nothing. */
export function newPartForm() {
  const form = inject(NonNullableFormBuilder);
  const sizes: Record<string, SizeGroup> = {};
  for (const section of STARTING_SECTIONS) {
    const group: Record<string, FormControl<string>> = {};
    for (const size of section.sizes) group[size.key] = form.control<string>(size.initial.in);
    sizes[section.id] = form.group(group);
  }
  return form.group({
    number: form.control('', { validators: [accepts(partNumberSchema)] }),
    title: form.control('', { validators: [accepts(partTitleSchema)] }),
    way: form.control<Way>('section'),
    unit: form.control<Unit>('in'),
    thickness: form.control<string>(SHEET_STARTS.thickness.in),
    radius: form.control<string>(SHEET_STARTS.radius.in),
    width: form.control<string>(SHEET_STARTS.width.in),
    material: form.control('', { validators: [tooLong(60)] }),
    method: form.control<StartMethod>('handbook'),
    k: form.control('0.44'),
    hardness: form.control<Hardness>('medium'),
    section: form.control(FIRST_SECTION),
    sizes: form.group(sizes),
    chain: form.control(''),
  });
}

export type NewPartForm = ReturnType<typeof newPartForm>;
export type NewPartValues = ReturnType<NewPartForm['getRawValue']>;

interface Schema {
  safeParse(value: unknown): { success: true } | { success: false; error: { issues: readonly { message: string }[] } };
}

/** The same schema that the server checks with, so that both say the same. */
function accepts(schema: Schema): ValidatorFn {
  return (control) => {
    const parsed = schema.safeParse(control.value);
    return parsed.success ? null : { words: parsed.error.issues[0]?.message ?? "This can't be used." };
  };
}

function tooLong(most: number): ValidatorFn {
  return (control) =>
    String(control.value).length > most ? { words: `A material has ${most} characters at most here.` } : null;
}
