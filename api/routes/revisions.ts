/** Revisions: read, saved against a version, and the paper of the blank. */
import { blankPaperSchema } from '../../shared/contracts/papers';
import { revisionSchema, saveRevisionSchema } from '../../shared/contracts/revisions';
import { personOf } from '../middleware/access';
import { ProblemError } from '../middleware/problem';
import type { Database } from '../models/database';
import { blankPaper } from '../papers/blank-paper';
import { readRevision, saveRevision } from '../services/revisions';
import { revisionPaper } from '../services/revision-paper';
import { type Operation, operation } from '../operation';
import { valueOf } from './outcome-answer';

const PATH = '/api/parts/:id/revisions/:letter';

export const revisionRoutes = (database: Database, now: () => Date): Operation[] => [
  operation({
    method: 'get',
    path: PATH,
    access: 'signed-in',
    summary: 'A revision: the document and what the server computed from it.',
    answer: { status: 200, says: 'The revision.', schema: revisionSchema },
    refuses: ['notFound'],
    async handle({ params, response }) {
      const revision = await readRevision(database, params['id'] ?? '', params['letter'] ?? '');
      if (!revision) throw new ProblemError('notFound');
      response.json(revision);
    },
  }),
  operation({
    method: 'put',
    path: PATH,
    access: ['designer'],
    summary:
      'Save a draft. The server computes it again; a save that did not start from the newest version is refused.',
    body: saveRevisionSchema,
    answer: { status: 200, says: 'The revision as saved.', schema: revisionSchema },
    refuses: ['notFound', 'stale'],
    async handle({ params, body, request, response }) {
      const save = { partId: params['id'] ?? '', letter: params['letter'] ?? '', ...body };
      response.json(valueOf(await saveRevision(database, save, personOf(request), now())));
    },
  }),
  operation({
    method: 'get',
    path: `${PATH}/blank.pdf`,
    access: 'signed-in',
    summary: 'The dimensioned drawing of the blank.',
    query: blankPaperSchema,
    answer: { status: 200, says: 'The drawing.', type: 'application/pdf' },
    refuses: ['notFound'],
    async handle({ params, query, request, response }) {
      const person = personOf(request);
      const paper = await revisionPaper(database, params['id'] ?? '', params['letter'] ?? '');
      if (!paper) throw new ProblemError('notFound');
      const bytes = await blankPaper({ ...paper, size: query.size, issuedAt: now(), issuedBy: person.name });
      const name = `${paper.part.number} ${paper.revision.letter} blank.pdf`.replace(/[^A-Za-z0-9._-]+/g, '-');
      response.setHeader('Content-Disposition', `attachment; filename="${name}"`);
      response.setHeader('Cache-Control', 'private, no-store');
      response.type('application/pdf').send(Buffer.from(bytes));
    },
  }),
];
