/** A change of number or title names the version that it started from, as a save does. */
export const partVersion = {
  name: '0002-part-version',
  statements: ['ALTER TABLE parts ADD COLUMN version INTEGER NOT NULL DEFAULT 1'],
};
