/** What every paper of a revision says, from what is kept: the figures of a paper are those of the save, never newer ones. */
import type { Database } from '../models/database';
import type { BlankPaperInput } from '../papers/blank-paper-input';
import { readRevision } from './revisions';
import { readShop } from './shop';

export type RevisionPaper = Pick<BlankPaperInput, 'part' | 'revision' | 'document' | 'result' | 'shop'>;

export async function revisionPaper(database: Database, partId: string, letter: string): Promise<RevisionPaper | null> {
  const part = await database.parts.findByPk(partId, { attributes: ['number', 'title'], raw: true });
  const revision = part && (await readRevision(database, partId, letter));
  if (!part || !revision) return null;
  const { document, result, version, state, changedAt, changedBy } = revision;
  const shop = (await readShop(database))?.name ?? '';
  return { part, revision: { letter, state, version, changedAt, changedBy }, document, result, shop };
}
