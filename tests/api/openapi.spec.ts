import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { ROUTES } from '../../server/routes';
import { openApiPath } from '../../server/openapi/describe-api';
import { startTestApplication, type TestApplication } from '../builders/test-application';

interface Operation {
  readonly operationId: string;
  readonly summary: string;
  readonly security: readonly unknown[];
  readonly parameters: readonly { readonly name: string; readonly in: string }[];
  readonly requestBody?: { readonly content: Readonly<Record<string, { schema: object }>> };
  readonly responses: Readonly<Record<string, unknown>>;
}

interface Description {
  readonly openapi: string;
  readonly paths: Readonly<Record<string, Readonly<Record<string, Operation>>>>;
}

let application: TestApplication;
let description: Description;

beforeAll(async () => {
  application = await startTestApplication();
  const browser = await application.browser();
  description = (await browser.get('/api/openapi.json')).body as Description;
});

afterAll(async () => {
  await application.close();
  expect(application.bugs).toEqual([]);
});

interface RouterLayer {
  readonly route?: { readonly path: string; readonly methods: Readonly<Record<string, boolean>> };
}

/** Every method and path that Express itself would answer below /api. */
function servedByExpress(): readonly string[] {
  const { stack } = application.app.router as unknown as { stack: readonly RouterLayer[] };
  return stack.flatMap(({ route }) =>
    route === undefined
      ? []
      : Object.keys(route.methods).map((method) => `${method} ${openApiPath(route.path)}`),
  );
}

describe('the description of the API', () => {
  it('describes exactly what Express serves', () => {
    const described = Object.entries(description.paths).flatMap(([path, operations]) =>
      Object.keys(operations).map((method) => `${method} ${path}`),
    );
    expect(description.openapi).toBe('3.1.0');
    expect([...described].sort()).toEqual([...servedByExpress()].sort());
    expect(described).toHaveLength(ROUTES.length);
  });

  it('gives each operation an id of its own', () => {
    const ids = Object.values(description.paths).flatMap((operations) =>
      Object.values(operations).map(({ operationId }) => operationId),
    );
    expect(new Set(ids).size).toBe(ids.length);
  });

  it.each(ROUTES.map((route) => ({ name: `${route.method} ${route.path}`, route })))(
    'says what $name takes and gives',
    ({ route }) => {
      const operation = description.paths[openApiPath(route.path)]![route.method]!;
      expect(operation.summary).toMatch(/^[A-Z].*\.$/);
      expect(operation.security.length > 0).toBe(route.access.kind !== 'public');
      const named = [...route.path.matchAll(/:(\w+)/g)].map(([, name]) => name);
      const inPath = operation.parameters.filter((parameter) => parameter.in === 'path');
      expect(inPath.map(({ name }) => name)).toEqual(named);
      expect(operation.requestBody !== undefined).toBe(
        route.body !== null || route.upload !== null,
      );
      const status = route.reply.kind === 'file' ? 200 : route.reply.status;
      expect(Object.keys(operation.responses)).toContain(String(status));
      expect(Object.keys(operation.responses)).toContain('default');
    },
  );
});
