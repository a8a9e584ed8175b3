/** Fills a new demo shop: its people, and its parts by the same way that everybody's parts are saved. */
import type { Transaction } from 'sequelize';
import type { Person } from '../../../shared/contracts/session';
import { DEMO_PASSWORD, DEMO_PEOPLE } from '../../demo-shop';
import type { Database } from '../../models/database';
import { createPart } from '../../services/parts';
import { hashPassword } from '../../services/password';
import { addPerson } from '../../services/people';
import { DEMO_PARTS } from './demo-parts';

const MINUTE = 60 * 1000;

export async function seedDemo(database: Database, now: Date, hash = hashPassword): Promise<void> {
  // One hash for all of them: the password is printed at the start anyway.
  const passwordHash = await hash(DEMO_PASSWORD);
  const people = await database.write((transaction) => demoPeople(database, passwordHash, now, transaction));
  const designer = people.find((person) => person.roles.includes('designer'));
  if (!designer) throw new Error('The demo shop has no designer.');
  for (const [i, part] of DEMO_PARTS.entries()) {
    // A minute apart, the last one newest: the register sorts by it.
    const at = new Date(now.getTime() - (DEMO_PARTS.length - i) * MINUTE);
    const outcome = await createPart(database, part, designer, at);
    // Taken: a start that was cut short has made it already.
    if (!outcome.ok && outcome.reason !== 'taken')
      throw new Error(`Demo part ${part.number} is refused: ${JSON.stringify(outcome)}`);
  }
}

/** All or none of them. */
async function demoPeople(
  database: Database,
  passwordHash: string,
  now: Date,
  transaction: Transaction,
): Promise<Person[]> {
  const known = await database.people.findAll({ transaction });
  if (known.length > 0) return known.map(({ id, email, name, roles }) => ({ id, email, name, roles }));
  const added: Person[] = [];
  for (const { email, name, roles } of DEMO_PEOPLE) {
    added.push(await addPerson(database, { email, name, roles: [...roles], passwordHash }, now, transaction));
  }
  return added;
}
