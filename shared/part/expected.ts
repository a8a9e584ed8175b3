/** What each field of a document wants, in words, for the message at a field that holds something else. */

const EXPRESSION = 'a number or an expression such as 1 1/8 or 25 mm';

const lineOf = (length: string): string =>
  `one line of plain text of ${length} characters, without control characters and marks that turn the writing around`;

const EXPECTED: ReadonlyMap<string, string> = new Map([
  ['format', '"leafwright/1"'],
  ['unit', '"in" or "mm"'],
  ['thickness', EXPRESSION],
  ['width', EXPRESSION],
  ['leg', EXPRESSION],
  ['bend', 'an angle in degrees: a number or an expression'],
  ['joggle', EXPRESSION],
  ['run', EXPRESSION],
  ['radius', EXPRESSION],
  ['diameter', EXPRESSION],
  ['at', EXPRESSION],
  ['across', EXPRESSION],
  ['pitch', EXPRESSION],
  ['start', EXPRESSION],
  ['end', EXPRESSION],
  ['k', 'a K-factor above 0 and at most 1'],
  ['turn', '"up" or "down"'],
  ['grain', '"along" or "across"'],
  ['hand', '"as-drawn" or "opposite"'],
  ['hardness', '"soft", "medium" or "hard"'],
  ['method', '"k-factor", "handbook", "din-6935", "rule-90", "shop" or "measured"'],
  ['measure', '"mold-line", "outside-edge", "inside" or "flat", or two of them for the two ends'],
  ['from', '"start", "end", "mold-start" or "mold-end"'],
  ['count', 'a whole number from 1 to 1000'],
  ['seat', 'the index of a leg, counted from 0'],
  ['name', lineOf('at most 200')],
  ['title', lineOf('at most 200')],
  ['dash', lineOf('1 to 20')],
  ['material/name', lineOf('1 to 100')],
  ['id', 'a text of 1 to 100 characters'],
  ['material', `a name, ${lineOf('1 to 100')}; or { name, density, modulus, yield }`],
  ['density', 'a density in kg/m³ above 0'],
  ['modulus', 'a modulus in MPa above 0'],
  ['yield', 'a yield stress in MPa above 0'],
  ['allowance', 'an allowance method'],
  ['variables', 'names with figures or expressions'],
  ['chain', 'a list that begins and ends with a leg'],
  ['holes', 'a list of holes'],
  ['nose', '{ radius }'],
  ['trim', '{ start, end }'],
  ['tolerances', 'tolerances as [minus, plus]'],
  ['dashNumbers', 'a list of dash numbers'],
]);

/**
 * @param path of the field, as the document spells it
 * @returns e.g. `Expected "in" or "mm".`
 */
export function expectedAt(path: readonly PropertyKey[]): string {
  // A material's name is shorter than that of a leg.
  const own = EXPECTED.get(path.map(String).join('/'));
  if (own !== undefined) return `Expected ${own}.`;
  for (let i = path.length - 1; i >= 0; i -= 1) {
    const words = EXPECTED.get(String(path[i]));
    if (words !== undefined) return `Expected ${words}.`;
    if (typeof path[i] === 'string') break;
  }
  return 'This field does not hold what it should.';
}
