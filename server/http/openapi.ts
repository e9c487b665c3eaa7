import { z } from 'zod';
import { createDocument, type ZodOpenApiOperationObject, type ZodOpenApiPathsObject } from 'zod-openapi';
import { problemAnswer } from '@/shared/problems/problems';
import type { Route } from './route';

const problem = problemAnswer.meta({
  id: 'Problem',
  description: 'What went wrong: a code of a closed list, with data',
});
const keyHeader = z.object({
  'Idempotency-Key': z
    .string()
    .meta({ description: 'Made by the client, kept for retries: the same request has one effect' }),
});

/** OpenAPI 3.1 from the contracts. */
export function openApiOf(routes: readonly Route[]) {
  const paths: ZodOpenApiPathsObject = {};
  for (const { operation, ability } of routes) {
    const path = `/api${operation.path.replace(/:([A-Za-z]+)/g, '{$1}')}`;
    paths[path] = { ...paths[path], [operation.method.toLowerCase()]: describe(operation, ability) };
  }
  return createDocument({
    openapi: '3.1.0',
    info: {
      title: 'Tarekeep',
      version: '0.1.0',
      description:
        'Sign in with POST /api/session; changing requests carry the token of GET /api/session in x-csrf-token, and an Idempotency-Key where named.',
    },
    paths,
  });
}

function describe(operation: Route['operation'], ability: Route['ability']): ZodOpenApiOperationObject {
  const form = z.object({
    body: z.string().optional(),
    files: z.array(z.string().meta({ format: 'binary' })),
  });
  const sent =
    operation.sends === 'files'
      ? { 'multipart/form-data': { schema: form } }
      : { 'application/json': { schema: operation.body as z.ZodType } };
  const answered =
    operation.answers === 'file'
      ? { 'application/octet-stream': { schema: z.string().meta({ format: 'binary' }) } }
      : { 'application/json': { schema: operation.answer } };
  return {
    operationId: operation.name,
    tags: [operation.resource],
    summary: operation.summary,
    description: ability ? `Needs the ability “${ability}”.` : 'Open to everyone.',
    requestParams: {
      ...(operation.params ? { path: operation.params as z.ZodObject } : {}),
      ...(operation.query ? { query: operation.query as z.ZodObject } : {}),
      ...(operation.keyed && operation.method !== 'GET' ? { header: keyHeader } : {}),
    },
    ...(operation.body || operation.sends === 'files' ? { requestBody: { content: sent } } : {}),
    responses: {
      '200': { description: 'Done', content: answered },
      default: { description: 'A problem', content: { 'application/json': { schema: problem } } },
    },
  };
}
