/** Parts: the register, a new part, and a part's number and title. */
import {
  changePartSchema,
  createPartSchema,
  listPartsSchema,
  partListSchema,
  partSchema,
} from '../../shared/contracts/parts';
import { personOf } from '../middleware/access';
import { ProblemError } from '../middleware/problem';
import type { Database } from '../models/database';
import { changePart, createPart, readPart } from '../services/parts';
import { listParts } from '../services/register';
import { type Operation, operation } from '../operation';
import { valueOf } from './outcome-answer';

export const partRoutes = (database: Database, now: () => Date): Operation[] => [
  operation({
    method: 'get',
    path: '/api/parts',
    access: 'signed-in',
    summary: 'The parts register, a page at a time.',
    query: listPartsSchema,
    answer: { status: 200, says: 'A page, and where the next one starts.', schema: partListSchema },
    async handle({ query, response }) {
      response.json(valueOf(await listParts(database, query)));
    },
  }),
  operation({
    method: 'post',
    path: '/api/parts',
    access: ['designer'],
    summary: 'A new part with its first draft.',
    body: createPartSchema,
    answer: { status: 201, says: 'The part as created.', schema: partSchema },
    refuses: ['taken'],
    async handle({ body, request, response }) {
      const part = valueOf(await createPart(database, body, personOf(request), now()));
      response.status(201).location(`/api/parts/${part.id}`).json(part);
    },
  }),
  operation({
    method: 'get',
    path: '/api/parts/:id',
    access: 'signed-in',
    summary: 'A part with its newest revision.',
    answer: { status: 200, says: 'The part.', schema: partSchema },
    refuses: ['notFound'],
    async handle({ params, response }) {
      const part = await readPart(database, params['id'] ?? '');
      if (!part) throw new ProblemError('notFound');
      response.json(part);
    },
  }),
  operation({
    method: 'patch',
    path: '/api/parts/:id',
    access: ['designer'],
    summary: 'Another number or title for a part; refused when somebody changed them in between.',
    body: changePartSchema,
    answer: { status: 200, says: 'The part as changed.', schema: partSchema },
    refuses: ['notFound', 'taken', 'stale'],
    async handle({ params, body, request, response }) {
      response.json(valueOf(await changePart(database, params['id'] ?? '', body, personOf(request), now())));
    },
  }),
];
