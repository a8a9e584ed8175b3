/** Revisions: read, and saved against the version that the editor started from. */
import type { Transaction } from 'sequelize';
import type { Revision } from '../../shared/contracts/revisions';
import type { Person } from '../../shared/contracts/session';
import type { PartDocument } from '../../shared/part/document';
import type { Solved } from '../../shared/result';
import type { Database } from '../models/database';
import type { RevisionRecord } from '../models/revisions';
import { done, NOT_FOUND, type Outcome } from './outcome';
import { namesOf } from './people';
import { partKeys } from './register-keys';
import { solveDocument } from './solved-document';

export async function readRevision(
  database: Database,
  partId: string,
  letter: string,
  transaction?: Transaction,
): Promise<Revision | null> {
  const record = await database.revisions.findOne({ where: { partId, letter }, raw: true, transaction });
  return record && describeRevision(database, record, transaction);
}

async function describeRevision(
  database: Database,
  record: RevisionRecord,
  transaction?: Transaction,
): Promise<Revision> {
  const editors = await database.revisionEditors.findAll({
    where: { revisionId: record.id },
    order: [
      ['firstEditAt', 'ASC'],
      ['personId', 'ASC'],
    ],
    raw: true,
    transaction,
  });
  const names = await namesOf(database, [record.changedBy, ...editors.map((editor) => editor.personId)], transaction);
  return {
    id: record.id,
    letter: record.letter,
    state: record.state,
    version: record.version,
    document: JSON.parse(record.document) as PartDocument,
    result: JSON.parse(record.result) as Solved,
    engineVersion: record.engineVersion,
    changedAt: record.changedAt,
    changedBy: names.get(record.changedBy) ?? '',
    editors: editors.map((editor) => names.get(editor.personId) ?? ''),
  };
}

export interface Save {
  readonly partId: string;
  readonly letter: string;
  /** The version that the editor started from. */
  readonly version: number;
  readonly document: unknown;
}

export async function saveRevision(
  database: Database,
  save: Save,
  person: Person,
  now: Date,
): Promise<Outcome<Revision>> {
  const solved = solveDocument(save.document);
  const { partId, letter } = save;
  return database.write(async (transaction) => {
    const stored = await database.revisions.findOne({ where: { partId, letter }, raw: true, transaction });
    if (!stored) return NOT_FOUND;
    if (!solved.ok) return { ok: false, reason: 'refused', errors: solved.errors };
    if (stored.version !== save.version) {
      const current = await describeRevision(database, stored, transaction);
      // The same save again, because its answer was lost on the way: it is done already.
      const repeated =
        stored.version === save.version + 1 &&
        stored.changedBy === person.id &&
        stored.document === solved.kept.document;
      return repeated ? done(current) : { ok: false, reason: 'stale', current };
    }
    const changed = { changedAt: now.toISOString(), changedBy: person.id };
    await database.revisions.update(
      { ...solved.kept, ...changed, version: stored.version + 1 },
      { where: { id: stored.id }, transaction },
    );
    const part = await database.parts.findByPk(partId, { attributes: ['number', 'title'], transaction });
    if (!part) throw new Error(`Revision ${stored.id} has no part.`);
    const keys = partKeys({ number: part.number, title: part.title, material: solved.summary.material });
    await database.parts.update({ ...solved.summary, ...changed, ...keys }, { where: { id: partId }, transaction });
    await recordEdit(database, stored.id, person, now, transaction);
    const saved = await readRevision(database, partId, letter, transaction);
    return saved ? done(saved) : NOT_FOUND;
  });
}

/** Nobody who has edited a revision may later be the one who lets it go to the shop; so every editor is kept. */
export async function recordEdit(
  database: Database,
  revisionId: string,
  person: Person,
  now: Date,
  transaction: Transaction,
): Promise<void> {
  const at = now.toISOString();
  const where = { revisionId, personId: person.id };
  const [known] = await database.revisionEditors.update({ lastEditAt: at }, { where, transaction });
  if (known === 0) {
    await database.revisionEditors.create({ ...where, firstEditAt: at, lastEditAt: at }, { transaction });
  }
}
