/** Operations as an OpenAPI 3.1 document. Its schemas are the very ones that check the requests. */
import { z } from 'zod';
import { problemSchema } from '../../shared/contracts/problem';
import { documentSchema } from '../../shared/part/schema';
import { CSRF_HEADER } from '../middleware/csrf';
import { problem, type ProblemKind } from '../middleware/problem';
import { SESSION_COOKIE } from '../middleware/session';
import { changes, type Operation } from '../operation';

type Json = Record<string, unknown>;

const DOCUMENT = { $ref: '#/components/schemas/PartDocument' };

/** Part documents stand in the contracts as "anything", since the engine's gate judges them; described they are what that gate wants. */
function jsonSchema(schema: z.ZodType, io: 'input' | 'output'): Json {
  const described = z.toJSONSchema(schema, {
    io,
    unrepresentable: 'any',
    override: ({ zodSchema, jsonSchema: target }) => {
      // "Anything" has no keywords of its own to get in the way.
      if (z.globalRegistry.get(zodSchema)?.['documents'] !== 'PartDocument') return;
      delete (target as Json)['documents'];
      Object.assign(target, DOCUMENT);
    },
  }) as Json;
  const { $schema: _, $defs, ...bare } = described;
  // A schema with a name of its own comes as a reference to it; the place it stands in has the name already.
  return Object.values(($defs ?? {}) as Record<string, Json>)[0] ?? bare;
}

function refusals(operation: Operation): ProblemKind[] {
  return [
    ...(operation.access === 'anybody' ? [] : (['signedOut'] as const)),
    ...(Array.isArray(operation.access) ? (['forbidden'] as const) : []),
    ...(changes(operation.method) ? (['csrf'] as const) : []),
    ...(operation.body ? (['badRequest', 'tooLarge', 'unsupported', 'invalid'] as const) : []),
    ...(operation.query ? (['invalid'] as const) : []),
    ...(operation.refuses ?? []),
  ];
}

function responses(operation: Operation): Json {
  const { status, says, schema, type = 'application/json' } = operation.answer;
  const body = schema ? { schema: jsonSchema(schema, 'output') } : {};
  const answers: Record<string, Json> = { [status]: { description: says, content: { [type]: body } } };
  for (const kind of refusals(operation)) {
    const { status: code, title } = problem(kind);
    const known = answers[code]?.['description'];
    answers[code] = {
      description: known === undefined || known === title ? title : `${String(known)} / ${title}`,
      content: { 'application/problem+json': { schema: { $ref: '#/components/schemas/Problem' } } },
    };
  }
  return answers;
}

function parameters(operation: Operation): Json[] {
  const inPath = [...operation.path.matchAll(/:(\w+)/g)].map(([, name]) => ({
    name,
    in: 'path',
    required: true,
    schema: { type: 'string' },
  }));
  const query = operation.query ? jsonSchema(operation.query, 'input') : {};
  const inQuery = Object.entries((query['properties'] ?? {}) as Json).map(([name, schema]) => ({
    name,
    in: 'query',
    required: ((query['required'] ?? []) as string[]).includes(name),
    schema,
  }));
  const token = { name: CSRF_HEADER, in: 'header', required: true, schema: { type: 'string' } };
  return [...inPath, ...inQuery, ...(changes(operation.method) ? [token] : [])];
}

const describeOperation = (operation: Operation): Json => ({
  summary: operation.summary,
  ...(operation.access === 'anybody' ? { security: [] } : {}),
  ...(Array.isArray(operation.access) ? { description: `For: ${operation.access.join(', ')}.` } : {}),
  parameters: parameters(operation),
  ...(operation.body
    ? {
        requestBody: {
          required: true,
          content: { 'application/json': { schema: jsonSchema(operation.body, 'input') } },
        },
      }
    : {}),
  responses: responses(operation),
});

export const openapiPath = (path: string): string => path.replace(/:(\w+)/g, '{$1}');

export function describeApi(operations: readonly Operation[], version: string): Json {
  const paths: Record<string, Json> = {};
  for (const operation of operations) {
    (paths[openapiPath(operation.path)] ??= {})[operation.method] = describeOperation(operation);
  }
  return {
    openapi: '3.1.0',
    info: { title: 'Leafwright', version, description: 'Multi-bend sheet-metal parts: documents, figures, papers.' },
    servers: [{ url: '/' }],
    security: [{ session: [] }],
    paths,
    components: {
      securitySchemes: { session: { type: 'apiKey', in: 'cookie', name: SESSION_COOKIE } },
      schemas: { PartDocument: jsonSchema(documentSchema, 'input'), Problem: jsonSchema(problemSchema, 'output') },
    },
  };
}
