/** For whoever watches the server: it answers, and its database does. */
import { z } from 'zod';
import type { Database } from '../models/database';
import { type Operation, operation } from '../operation';

export const healthRoutes = (database: Database): Operation[] => [
  operation({
    method: 'get',
    path: '/healthz',
    access: 'anybody',
    summary: 'Whether the server and its database answer.',
    answer: { status: 200, says: 'They do.', schema: z.object({ ok: z.literal(true) }) },
    refuses: ['unavailable'],
    async handle({ response }) {
      await database.sequelize.query('SELECT 1');
      response.setHeader('Cache-Control', 'no-store');
      response.json({ ok: true });
    },
  }),
];
