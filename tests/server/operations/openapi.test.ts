import { rateLimits } from '@/server/http/rate-limit';
import { allRoutes } from '@/server/routes';
import { aProduct, type Product } from '../../support/app';

type Described = {
  operationId: string;
  parameters?: { in: string; name: string; required?: boolean }[];
  requestBody?: unknown;
  responses: Record<string, { content?: Record<string, unknown> }>;
};

let product: Product;
let paths: Record<string, Record<string, Described>>;
let version: string;

beforeAll(async () => {
  product = await aProduct('openapi');
  const { body } = await (await product.stranger()).get('/openapi.json');
  paths = body.paths;
  version = body.openapi;
});
afterAll(() => product.close());

describe('the OpenAPI document', () => {
  it('is of version 3.1 and describes every route under its name', () => {
    expect(version).toMatch(/^3\.1\./);
    const described = Object.values(paths).flatMap((methods) =>
      Object.values(methods).map((each) => each.operationId),
    );
    const routes = allRoutes(product.deps, rateLimits(product.deps.pool)).map(
      (route) => route.operation.name,
    );
    expect(described.sort()).toEqual(routes.sort());
  });

  it('describes every parameter of a path, and the key of every keyed change', () => {
    for (const { operation } of allRoutes(product.deps, rateLimits(product.deps.pool))) {
      const path = `/api${operation.path.replace(/:([A-Za-z]+)/g, '{$1}')}`;
      const described = paths[path]?.[operation.method.toLowerCase()];
      const names = (described?.parameters ?? []).map((parameter) => `${parameter.in} ${parameter.name}`);
      const wanted = [...operation.path.matchAll(/:([A-Za-z]+)/g)].map((match) => `path ${match[1]}`);
      if (operation.keyed && operation.method !== 'GET') wanted.push('header Idempotency-Key');
      expect([operation.name, wanted.filter((name) => !names.includes(name))]).toEqual([operation.name, []]);
    }
  });

  it('shows the shape of a problem with its closed list of codes', () => {
    const health = paths['/api/health']?.get;
    expect(JSON.stringify(health?.responses.default)).toContain('#/components/schemas/Problem');
  });
});
