/** The command behind `npm run administrator`. */
import { parseArgs } from 'node:util';
import { type Role, ROLES } from '../../shared/contracts/session';
import { readConfig } from '../config';
import type { Database } from '../models/database';
import { openShopDatabase } from '../open-shop-database';
import { addAdministrator, NO_DEMO, personalFault } from '../services/first-administrator';
import { passwordFault } from '../services/password';
import { OtherShop } from '../services/shop';
import { askPassword } from './ask-password';

const USAGE = `npm run administrator -- --email ADDRESS --name "NAME" [--also ROLE] [--another]

Adds an administrator to a shop of your own (SHOP=own, DATA_DIR as for the server).
--also gives one more role, ${ROLES.filter((role) => role !== 'administrator').join(', ')}, and may be given several times.
The password is asked for, or read from standard input when that is piped.
`;

function roleNamed(name: string): Role {
  const role = ROLES.find((known) => known === name);
  if (role === undefined) throw new Error(`There is no role "${name}". Roles are ${ROLES.join(', ')}.`);
  return role;
}

const rest = (roles: readonly Role[]): string =>
  roles
    .filter((role) => role !== 'administrator')
    .map((role) => `, and ${role}`)
    .join('');

function refuse(fault: string | null): void {
  if (fault !== null) throw new Error(fault);
}

/** The command is for shops of one's own: it founds one where there is none, once everything else is known to be in order. */
async function openOwnShop(): Promise<Database> {
  const config = readConfig(process.env, 'own');
  const demo = `${NO_DEMO} Give the DATA_DIR of a shop of your own`;
  if (config.shop === 'demo') throw new Error(`${demo}, and leave SHOP out.`);
  try {
    return await openShopDatabase(config);
  } catch (error) {
    throw error instanceof OtherShop ? new Error(`${demo}; ${config.dataDir} holds a demo shop.`) : error;
  }
}

async function main(): Promise<void> {
  // Until it is done: a process that runs out of things to do has added nobody.
  process.exitCode = 1;
  const { values } = parseArgs({
    options: {
      email: { type: 'string' },
      name: { type: 'string' },
      also: { type: 'string', multiple: true, default: [] },
      another: { type: 'boolean', default: false },
      help: { type: 'boolean', default: false },
    },
  });
  const { email, name, another } = values;
  if (values.help || email === undefined || name === undefined) {
    (values.help ? process.stdout : process.stderr).write(USAGE);
    if (values.help) process.exitCode = 0;
    return;
  }
  refuse(personalFault({ email, name }));
  const also = values.also.map(roleNamed);
  const password = await askPassword();
  refuse(passwordFault(password));
  const database = await openOwnShop();
  try {
    const added = await addAdministrator(database, { email, name, another, also, password }, new Date());
    if (!added.ok) throw new Error(added.message);
    process.stdout.write(
      `${added.person.name} (${added.person.email}) is an administrator now${rest(added.person.roles)}.\n`,
    );
    process.exitCode = 0;
  } finally {
    await database.close();
  }
}

main().catch((error: unknown) => {
  process.stderr.write(`${error instanceof Error ? error.message : String(error)}\n`);
  process.exitCode = 1;
});
