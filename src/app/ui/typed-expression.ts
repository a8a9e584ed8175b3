import type { Expression } from '@shared/part/document';

/** One comma between figures and nothing else is the point of a decimal… */
const DECIMAL_COMMA = /^-?\d*,\d+$/;
/** …but for "1,200", which may be one and a fifth or twelve hundred: that is left for the engine to refuse. */
const THOUSANDS = /^-?[1-9]\d{0,2},\d{3}$/;

/**
 * What was typed in a box, as the document keeps it: a figure when it reads back as exactly the same text, else the text
 * ("1 3/16", "0.750", "W/2", also what can't be read), so that the box always shows what somebody typed. The comma of a
 * plain figure becomes a point; in an expression it stays for the engine to judge.
 */
export function typedExpression(text: string): Expression {
  const trimmed = text.trim();
  const pointed = DECIMAL_COMMA.test(trimmed) && !THOUSANDS.test(trimmed) ? trimmed.replace(',', '.') : trimmed;
  const value = Number(pointed);
  return pointed !== '' && Number.isFinite(value) && String(value) === pointed ? value : pointed;
}

/** Whether anybody in a shop reads it at sight: "1 3/16" is, "W/2" is not. */
export const isFraction = (expression: Expression): boolean =>
  typeof expression === 'string' && /^(?:\d+ )?\d+\/\d+$/.test(expression);

/** Whether what it comes to is worth showing beside it. */
export const needsReading = (expression: Expression): boolean =>
  typeof expression === 'string' && expression !== '' && !/^\d*\.?\d+$/.test(expression);
