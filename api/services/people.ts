/** People of the shop: found for a session, checked at sign-in, added by a command. */
import { randomUUID } from 'node:crypto';
import type { Transaction } from 'sequelize';
import type { Person, Role } from '../../shared/contracts/session';
import type { Database } from '../models/database';
import { passwordMatches } from './password';

interface StoredPerson {
  id: string;
  email: string;
  name: string;
  /** As JSON text: raw rows are not parsed. */
  roles: string | Role[];
  passwordHash: string;
}

const PERSON_COLUMNS = ['id', 'email', 'name', 'roles'];

const toPerson = ({ id, email, name, roles }: StoredPerson): Person => ({
  id,
  email,
  name,
  roles: typeof roles === 'string' ? (JSON.parse(roles) as Role[]) : roles,
});

/** One small query: it runs on every request. */
export async function personById(database: Database, id: string): Promise<Person | null> {
  const row = await database.people.findOne({ where: { id, active: true }, attributes: PERSON_COLUMNS, raw: true });
  return row ? toPerson(row as unknown as StoredPerson) : null;
}

export async function personByPassword(database: Database, email: string, password: string): Promise<Person | null> {
  const row = await database.people.findOne({
    // NUL would end the text of the query early; no address has one.
    where: { email: email.toLowerCase().replaceAll('\0', ' '), active: true },
    attributes: [...PERSON_COLUMNS, 'passwordHash'],
    raw: true,
  });
  const matches = await passwordMatches(password, row?.passwordHash ?? null);
  return row && matches ? toPerson(row as unknown as StoredPerson) : null;
}

export interface NewPerson {
  readonly email: string;
  readonly name: string;
  readonly roles: Role[];
  readonly passwordHash: string;
}

export async function addPerson(
  database: Database,
  person: NewPerson,
  now: Date,
  transaction: Transaction,
): Promise<Person> {
  const row = await database.people.create(
    { ...person, id: randomUUID(), email: person.email.toLowerCase(), createdAt: now.toISOString() },
    { transaction },
  );
  return toPerson(row.get({ plain: true }));
}

/** Names by id, for showing who did something. */
export async function namesOf(
  database: Database,
  ids: Iterable<string>,
  transaction?: Transaction,
): Promise<Map<string, string>> {
  const rows = await database.people.findAll({
    where: { id: [...new Set(ids)] },
    attributes: ['id', 'name'],
    raw: true,
    transaction,
  });
  return new Map(rows.map((row) => [row.id, row.name]));
}
