/** Parts: created with their first draft, read, and given another number or title. */
import { randomUUID } from 'node:crypto';
import { literal, Op, type Transaction, where } from 'sequelize';
import type { Part } from '../../shared/contracts/parts';
import type { Person } from '../../shared/contracts/session';
import type { Database } from '../models/database';
import { done, NOT_FOUND, type Outcome, type Refusal } from './outcome';
import { namesOf } from './people';
import { partKeys } from './register-keys';
import { readRevision, recordEdit } from './revisions';
import { solveDocument } from './solved-document';

const FIRST_LETTER = 'A';

export async function readPart(database: Database, id: string, transaction?: Transaction): Promise<Part | null> {
  const record = await database.parts.findByPk(id, { raw: true, transaction });
  if (!record) return null;
  const revision = await readRevision(database, id, record.revision, transaction);
  if (!revision) throw new Error(`Part ${id} has no revision ${record.revision}.`);
  const names = await namesOf(database, [record.createdBy], transaction);
  return {
    id: record.id,
    number: record.number,
    title: record.title,
    version: record.version,
    createdAt: record.createdAt,
    createdBy: names.get(record.createdBy) ?? '',
    revision,
  };
}

export interface NewPart {
  readonly number: string;
  readonly title: string;
  readonly document: unknown;
}

export async function createPart(database: Database, part: NewPart, person: Person, now: Date): Promise<Outcome<Part>> {
  const solved = solveDocument(part.document);
  // Paths are the engine's own, as for a save: the form shows both in the same places.
  if (!solved.ok) return { ok: false, reason: 'refused', errors: solved.errors };
  return database.write(async (transaction) => {
    const taken = await numberTaken(database, part.number, null, transaction);
    if (taken) return taken;
    const id = randomUUID();
    const revisionId = randomUUID();
    const at = now.toISOString();
    const written = { createdAt: at, createdBy: person.id, changedAt: at, changedBy: person.id };
    const { number, title } = part;
    const keys = partKeys({ number, title, material: solved.summary.material });
    await database.parts.create(
      { id, number, title, ...keys, ...written, ...solved.summary, revision: FIRST_LETTER, state: 'draft' },
      { transaction },
    );
    await database.revisions.create(
      { id: revisionId, partId: id, letter: FIRST_LETTER, state: 'draft', version: 1, ...solved.kept, ...written },
      { transaction },
    );
    await recordEdit(database, revisionId, person, now, transaction);
    const created = await readPart(database, id, transaction);
    return created ? done(created) : NOT_FOUND;
  });
}

export interface PartChange {
  /** The version that the change started from. */
  readonly version: number;
  readonly number?: string | undefined;
  readonly title?: string | undefined;
}

export async function changePart(
  database: Database,
  id: string,
  change: PartChange,
  person: Person,
  now: Date,
): Promise<Outcome<Part>> {
  return database.write(async (transaction) => {
    const record = await database.parts.findByPk(id, { raw: true, transaction });
    if (!record) return NOT_FOUND;
    const { number = record.number, title = record.title } = change;
    // What is wanted is there already, as when the answer to the same change was lost.
    if (number === record.number && title === record.title) return found(await readPart(database, id, transaction));
    if (record.version !== change.version) {
      const current = await readPart(database, id, transaction);
      return current ? { ok: false, reason: 'stale', current } : NOT_FOUND;
    }
    const taken = await numberTaken(database, number, id, transaction);
    if (taken) return taken;
    const keys = partKeys({ number, title, material: record.material });
    const changed = { changedAt: now.toISOString(), changedBy: person.id, version: record.version + 1 };
    await database.parts.update({ number, title, ...keys, ...changed }, { where: { id }, transaction });
    const revision = await database.revisions.findOne({
      where: { partId: id, letter: record.revision },
      attributes: ['id'],
      transaction,
    });
    if (revision) await recordEdit(database, revision.id, person, now, transaction);
    return found(await readPart(database, id, transaction));
  });
}

const found = (part: Part | null): Outcome<Part> => (part ? done(part) : NOT_FOUND);

async function numberTaken(
  database: Database,
  number: string,
  except: string | null,
  transaction: Transaction,
): Promise<Refusal | null> {
  const same = where(literal('number COLLATE NOCASE'), number);
  const others = except === null ? [same] : [same, { id: { [Op.ne]: except } }];
  if ((await database.parts.count({ where: { [Op.and]: others }, transaction })) === 0) return null;
  return {
    ok: false,
    reason: 'taken',
    errors: [{ path: 'number', message: `There is a part ${number} already.` }],
  };
}
