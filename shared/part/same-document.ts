/** Whether two values of JSON say the same; the order in which an object names its fields says nothing. */
export function sameDocument(one: unknown, other: unknown): boolean {
  if (one === other) return true;
  if (typeof one !== 'object' || typeof other !== 'object' || one === null || other === null) return false;
  if (Array.isArray(one) !== Array.isArray(other)) return false;
  const [mine, theirs] = [fieldsOf(one), fieldsOf(other)];
  return mine.size === theirs.size && [...mine].every(([key, value]) => sameDocument(value, theirs.get(key)));
}

/** A field that is undefined is not there: JSON has none. */
const fieldsOf = (value: object): Map<string, unknown> =>
  new Map(Object.entries(value).filter(([, field]) => field !== undefined));
