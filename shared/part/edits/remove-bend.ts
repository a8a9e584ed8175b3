import type { Expression, Leg, PartDocument } from '../document';
import { isLeg } from '../document';
import { measureEnds } from '../measure';
import { legNumberAt, renumberLegs } from './entry';

function sum(a: Expression, b: Expression): Expression {
  // Twelve decimals: the sum of two typed decimals without the dust that binary fractions leave.
  if (typeof a === 'number' && typeof b === 'number') return Number((a + b).toFixed(12));
  return `${a} + ${b}`;
}

function join(first: Leg, second: Leg): Leg {
  const start = measureEnds(first)[0];
  const end = measureEnds(second)[1];
  const name = first.name ?? second.name;
  const id = first.id ?? second.id;
  return {
    ...(id === undefined ? {} : { id }),
    leg: sum(first.leg, second.leg),
    ...(name === undefined ? {} : { name }),
    ...(start === end ? (start === 'mold-line' ? {} : { measure: start }) : { measure: [start, end] as const }),
  };
}

/** Why the bend or joggle at `index` can't be taken out, or null when it can. */
export function whyBendStays(document: PartDocument, index: number): string | null {
  const entry = document.chain[index];
  if (!entry || isLeg(entry)) return 'Only a bend or a joggle can be taken out.';
  const number = legNumberAt(document, index);
  // A hole is dimensioned from an end of its leg; when that end goes, nobody has said where the hole should be.
  const holed = document.holes?.some((hole) => hole.leg === number - 1 || hole.leg === number) ?? false;
  return holed ? 'A hole lies on one of the legs that would be joined.' : null;
}

/** Takes out a bend or a joggle and joins the legs before and after it: their dimensions are added as they are typed. */
export function removeBend(document: PartDocument, index: number): PartDocument {
  const before = document.chain[index - 1];
  const after = document.chain[index + 1];
  if (whyBendStays(document, index) !== null || !before || !after || !isLeg(before) || !isLeg(after)) return document;
  const chain = [...document.chain.slice(0, index - 1), join(before, after), ...document.chain.slice(index + 2)];
  const number = legNumberAt(document, index);
  return renumberLegs({ ...document, chain }, (leg) => (leg >= number ? leg - 1 : leg));
}
