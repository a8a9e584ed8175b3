/** The command behind `npm run administrator`. */
import { parseArgs } from 'node:util';
import { readConfig } from '../config';
import { openShopDatabase } from '../open-shop-database';
import { addAdministrator } from '../services/first-administrator';
import { askPassword } from './ask-password';

const USAGE = `npm run administrator -- --email ADDRESS --name "NAME" [--another]

Adds an administrator to a shop of your own (SHOP=own, DATA_DIR as for the server).
The password is asked for, or read from standard input when that is piped.
`;

async function main(): Promise<void> {
  const { values } = parseArgs({
    options: {
      email: { type: 'string' },
      name: { type: 'string' },
      another: { type: 'boolean', default: false },
      help: { type: 'boolean', default: false },
    },
  });
  if (values.help || values.email === undefined || values.name === undefined) {
    (values.help ? process.stdout : process.stderr).write(USAGE);
    process.exitCode = values.help ? 0 : 1;
    return;
  }
  // The command is for shops of one's own, so it founds one where there is none; a demo shop is refused with the reason.
  const database = await openShopDatabase({ ...readConfig({ ...process.env, SHOP: process.env['SHOP'] ?? 'own' }) });
  try {
    const { email, name, another } = values;
    const added = await addAdministrator(database, { email, name, another, password: await askPassword() }, new Date());
    if (!added.ok) throw new Error(added.message);
    process.stdout.write(`${added.person.name} (${added.person.email}) is an administrator now.\n`);
  } finally {
    await database.close();
  }
}

main().catch((error: unknown) => {
  process.stderr.write(`${error instanceof Error ? error.message : String(error)}\n`);
  process.exitCode = 1;
});
