/** The first administrator of a shop of one's own; who comes after is invited by somebody signed in. */
import { z } from 'zod';
import type { Person, Role } from '../../shared/contracts/session';
import { PLAIN_LINE } from '../../shared/part/schema';
import type { Database } from '../models/database';
import { hashPassword, passwordFault } from './password';
import { addPerson } from './people';
import { readShop } from './shop';

export interface NewAdministrator {
  readonly email: string;
  readonly name: string;
  readonly password: string;
  /** Wanted though there is one already. */
  readonly another: boolean;
  /** Roles besides: whoever begins alone also draws. */
  readonly also: readonly Role[];
}

const personal = z.object({
  email: z
    .string()
    .trim()
    .pipe(z.email('That is not an e-mail address.').max(254, 'That is too long for an e-mail address.')),
  name: z
    .string()
    .trim()
    .min(1, 'Give a name.')
    .max(100, 'A name has 100 characters at most.')
    .regex(PLAIN_LINE, 'A name is one line of plain text.'),
});

export const NO_DEMO = 'A demo shop has its demo people and no others.';

/** Null, or what is wrong with the address or the name; to be asked before anything is made. */
export function personalFault(wanted: Pick<NewAdministrator, 'email' | 'name'>): string | null {
  const checked = personal.safeParse(wanted);
  return checked.success ? null : (checked.error.issues[0]?.message ?? 'That is not complete.');
}

export type Added = { readonly ok: true; readonly person: Person } | { readonly ok: false; readonly message: string };

const no = (message: string): Added => ({ ok: false, message });

export async function addAdministrator(database: Database, wanted: NewAdministrator, now: Date): Promise<Added> {
  if ((await readShop(database))?.kind !== 'own') return no(NO_DEMO);
  const fault = personalFault(wanted) ?? passwordFault(wanted.password);
  if (fault !== null) return no(fault);
  const { email, name } = personal.parse(wanted);
  const passwordHash = await hashPassword(wanted.password);
  return database.write(async (transaction) => {
    const people = await database.people.findAll({ transaction });
    if (people.some((person) => person.email === email.toLowerCase())) return no(`${email} is somebody’s already.`);
    const another = people.some((person) => person.active && person.roles.includes('administrator'));
    if (another && !wanted.another) return no('There is an administrator already. Add --another if you want one more.');
    const roles = [...new Set<Role>(['administrator', ...wanted.also])];
    return { ok: true, person: await addPerson(database, { email, name, roles, passwordHash }, now, transaction) };
  });
}
