import type { Unit } from '../part/document';
import { convertLength } from './length';

/** Places behind the point that a shop reads: thousandths of an inch, hundredths of a millimetre. */
export const PLACES: Readonly<Record<Unit, number>> = { in: 3, mm: 2 };

/**
 * A length for a person to read, rounded once, here; the unit is not appended.
 *
 * @param value length in `unit` @param unit unit of the value @param places digits behind the point
 * @returns e.g. "0.800"; never "-0.000"
 * @example formatLength(0.8, 'in') // '0.800'
 */
export function formatLength(value: number, unit: Unit, places: number = PLACES[unit]): string {
  return fixed(value, places);
}

/**
 * An angle in degrees with its sign, at most two places, no trailing zeros.
 *
 * @param degrees any finite angle
 * @example formatAngle(22.5) // '22.5°'
 */
export function formatAngle(degrees: number): string {
  return `${Number(fixed(degrees, 2))}°`;
}

/**
 * A figure inside a sentence: so many significant digits, no trailing zeros, no unit.
 *
 * @param value any finite figure @param digits 1 to 100
 * @example significant(0.279072) // '0.27907'
 */
export const significant = (value: number, digits = 5): string => String(Number(value.toPrecision(digits)));

/** A nearest sixty-fourth: how it is written, and how far it is from the true length. */
export interface Sixtyfourth {
  /** E.g. "51/64", "3 3/4", "0". */
  readonly text: string;
  /** Fraction − true length, inches, within ±1/128. */
  readonly error: number;
}

/**
 * The nearest 1/64 inch in lowest terms, halves away from zero.
 *
 * @param inches any finite length in inches
 * @returns the fraction and its miss (fraction − length)
 * @example nearest64(0.8).text // '51/64'
 */
export function nearest64(inches: number): Sixtyfourth {
  const sign = inches < 0 ? -1 : 1;
  const count = Math.round(Math.abs(inches) * 64);
  const whole = Math.floor(count / 64);
  let over = count % 64;
  let under = 64;
  while (over > 0 && over % 2 === 0) {
    over /= 2;
    under /= 2;
  }
  const fraction = over === 0 ? '' : `${over}/${under}`;
  const parts = [whole === 0 && fraction !== '' ? '' : String(whole), fraction].filter((part) => part !== '');
  const minus = sign < 0 && count > 0 ? '−' : '';
  return { text: minus + parts.join(' '), error: (sign * count) / 64 - inches };
}

/**
 * How far a sixty-fourth lies from the true length: "+0.007" beyond it, "−0.003" before it, "±0.000" on it.
 *
 * @param error of `nearest64`, inches
 * @example missText(nearest64(0.8).error) // '−0.003'
 */
export function missText(error: number): string {
  const miss = fixed(Math.abs(error), PLACES.in);
  const sign = Number(miss) === 0 ? '±' : error > 0 ? '+' : '−';
  return `${sign}${miss}`;
}

/**
 * A length of either unit as the nearest sixty-fourth of an inch.
 *
 * @example nearest64Of(25.4, 'mm').text // '1'
 */
export function nearest64Of(value: number, unit: Unit): Sixtyfourth {
  return nearest64(convertLength(value, unit, 'in'));
}

/** Fixed places, halves away from zero in decimal (0.0625 → "0.063"), and no negative zero. */
function fixed(value: number, places: number): string {
  const scale = 10 ** places;
  const scaled = Math.abs(value) * scale;
  // A figure that is a half in decimal may lie a few ulps under it in binary (1.005); lift it over.
  const rounded = Math.round(scaled * (1 + 4 * Number.EPSILON)) / scale;
  const text = rounded.toFixed(places);
  return value < 0 && Number(text) !== 0 ? `-${text}` : text;
}
