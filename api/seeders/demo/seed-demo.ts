/** Fills a new demo shop: its people, and its parts by the same way that everybody's parts are saved. */
import type { Database } from '../../models/database';
import { createPart } from '../../services/parts';
import { hashPassword } from '../../services/password';
import { addPerson } from '../../services/people';
import { DEMO_PARTS } from './demo-parts';
import { DEMO_PASSWORD, DEMO_PEOPLE } from './demo-people';

const MINUTE = 60 * 1000;

export async function seedDemo(database: Database, now: Date, hash = hashPassword): Promise<void> {
  // One hash for all of them: the password is printed at the start anyway.
  const passwordHash = await hash(DEMO_PASSWORD);
  const people = await database.write(async (transaction) => {
    // A start that was cut short has left people or parts behind; they stay as they are.
    const known = await database.people.count({ transaction });
    if (known > 0) return null;
    const added = [];
    for (const { email, name, roles } of DEMO_PEOPLE) {
      added.push(await addPerson(database, { email, name, roles: [...roles], passwordHash }, now, transaction));
    }
    return added;
  });
  const designer = people?.find((person) => person.roles.includes('designer'));
  if (!designer) return;
  for (const [i, part] of DEMO_PARTS.entries()) {
    // A minute apart, the last one newest: the register sorts by it.
    const at = new Date(now.getTime() - (DEMO_PARTS.length - i) * MINUTE);
    const outcome = await createPart(database, part, designer, at);
    if (!outcome.ok) throw new Error(`Demo part ${part.number} is refused: ${JSON.stringify(outcome)}`);
  }
}
