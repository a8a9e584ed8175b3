/** The API's own description, made from the records that mount it. */
import { z } from 'zod';
import { describeApi } from '../openapi/describe-api';
import { type Operation, operation } from '../operation';

export const openapiRoutes = (others: readonly Operation[], version: string): Operation[] => {
  const self = operation({
    method: 'get',
    path: '/api/openapi.json',
    access: 'anybody',
    summary: 'This description.',
    answer: { status: 200, says: 'An OpenAPI 3.1 document.', schema: z.looseObject({ openapi: z.string() }) },
    handle({ response }) {
      response.json(description);
    },
  });
  const description = describeApi([...others, self], version);
  return [self];
};
