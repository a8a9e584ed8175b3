import type { Unit } from '@shared/part/document';
import { STARTING_SECTIONS } from '@shared/part/starting-sections';
import { evaluate } from '@shared/units/expression';
import { convertLength } from '@shared/units/length';
import { type NewPartForm, type NewPartValues, SHEET_STARTS } from './new-part-form';

/** Digits that keep every 1/64 in exact in millimetres and back. */
const DIGITS = 9;

/**
 * A length box after the unit has changed: a start value becomes the other unit's start value, a figure stays the same
 * length, and what can't be read is left as it was typed.
 */
export function lengthIn(text: string, start: Readonly<Record<Unit, string>>, from: Unit, to: Unit): string {
  if (text === start[from]) return start[to];
  const figure = evaluate(text, 'length', { unit: from, scope: new Map() });
  return figure.ok ? String(Number(convertLength(figure.value, from, to).toPrecision(DIGITS))) : text;
}

/** Brings every length of the form into the new unit. The typed chain is text of its own and stays as typed. */
export function changeUnit(form: NewPartForm, from: Unit, to: Unit): void {
  const { thickness, radius, width, sizes } = form.getRawValue();
  const changed: NewPartValues['sizes'] = {};
  for (const section of STARTING_SECTIONS) {
    const group: Record<string, string> = {};
    for (const size of section.sizes) {
      const text = sizes[section.id]?.[size.key] ?? '';
      group[size.key] = size.angle ? text : lengthIn(text, size.initial, from, to);
    }
    changed[section.id] = group;
  }
  form.patchValue({
    unit: to,
    thickness: lengthIn(thickness, SHEET_STARTS.thickness, from, to),
    radius: lengthIn(radius, SHEET_STARTS.radius, from, to),
    width: lengthIn(width, SHEET_STARTS.width, from, to),
    sizes: changed,
  });
}
