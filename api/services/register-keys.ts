/** How the register sorts and searches: keys made when a part is written, so that reading compares plain text. */

/** Lower case and without accents: "Spänn" is found by "spann". */
export const folded = (text: string): string =>
  text
    .normalize('NFKD')
    .replace(/\p{Mn}/gu, '')
    .toLowerCase();

/** Longer than any run of digits in a part number. */
const DIGITS = 40;

/** Runs of digits filled up with noughts: HC-9 sorts before HC-10, as a person would file them. */
export const numberKey = (number: string): string =>
  folded(number).replace(/\d+/g, (digits) => digits.padStart(DIGITS, '0'));

export const searchText = (part: { number: string; title: string; material: string | null }): string =>
  folded([part.number, part.title, part.material ?? ''].join('\n'));

/** The words of a search; each must be somewhere in the text. */
export const searchWords = (search: string): string[] =>
  folded(search)
    .split(/\s+/)
    .filter((word) => word !== '');

/** The columns that hang on number, title and material together. */
export const partKeys = (part: { number: string; title: string; material: string | null }) => ({
  numberKey: numberKey(part.number),
  titleKey: folded(part.title),
  searchText: searchText(part),
});
