/** The engine over HTTP: one document in, its result out. */
import { solveAnswerSchema, solveRequestSchema } from '../../shared/contracts/solve';
import { solveRequest } from '../../shared/solve-request';
import { type Operation, operation } from '../operation';

export const solveRoutes = (): Operation[] => [
  operation({
    method: 'post',
    path: '/api/solve',
    access: 'signed-in',
    summary: 'Compute a part document. Nothing is kept.',
    body: solveRequestSchema,
    answer: {
      status: 200,
      says: 'The figures; or, with `ok` false, the fields for which the document was refused.',
      schema: solveAnswerSchema,
    },
    handle({ body, response }) {
      response.json(solveRequest(body));
    },
  }),
];
