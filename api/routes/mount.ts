/** Puts operations on a router: who is it, did the request come from our page, is it what the schema says, then the work. */
import { Router, type RequestHandler } from 'express';
import { requireAccess } from '../middleware/access';
import { checked } from '../middleware/checked';
import { jsonBody } from '../middleware/json-body';
import { ProblemError } from '../middleware/problem';
import { changes, type Operation } from '../operation';

const checkBody =
  (operation: Operation): RequestHandler =>
  (request, _response, next) => {
    if (operation.body) request.body = checked(operation.body, request.body) as unknown;
    next();
  };

const perform =
  (operation: Operation): RequestHandler =>
  async (request, response) => {
    const query = operation.query ? checked(operation.query, { ...request.query }) : undefined;
    const params = request.params as Record<string, string>;
    await operation.handle({ request, response, params, query, body: request.body as unknown });
  };

export function mount(operations: readonly Operation[], csrfCheck: RequestHandler): Router {
  const router = Router({ caseSensitive: true });
  for (const operation of operations) {
    router[operation.method](
      operation.path,
      requireAccess(operation.access),
      ...(changes(operation.method) ? [csrfCheck] : []),
      ...(operation.body ? [jsonBody(operation.bodyLimit), checkBody(operation)] : []),
      perform(operation),
    );
  }
  for (const path of new Set(operations.map((operation) => operation.path))) {
    const methods = operations.filter((operation) => operation.path === path).map(({ method }) => method.toUpperCase());
    router.all(path, (_request, response) => {
      response.setHeader('Allow', methods.includes('GET') ? ['HEAD', ...methods] : methods);
      throw new ProblemError('methodNotAllowed');
    });
  }
  return router;
}
