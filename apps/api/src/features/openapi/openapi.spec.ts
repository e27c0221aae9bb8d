import { format } from 'prettier';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { servedRoutes } from '../../testing/served-routes';
import type { TestServer } from '../../testing/test-server';
import { startTestServer } from '../../testing/test-server';
import { openApiDocument } from './openapi-document';

const document = openApiDocument() as {
  readonly paths: Readonly<Record<string, Readonly<Record<string, Operation>>>>;
  readonly components: { readonly schemas: Readonly<Record<string, unknown>> };
};

interface Operation {
  readonly operationId: string;
  readonly parameters?: readonly { readonly name: string; readonly in: string; readonly required: boolean }[];
  readonly responses: Readonly<Record<string, unknown>>;
}

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer();
});
afterAll(() => server.close());

const servedOperations = (): readonly string[] =>
  servedRoutes(server.app).map((route) => route.replace(/:(\w+)/g, '{$1}'));

const everyReference = (value: unknown): readonly string[] => {
  if (typeof value !== 'object' || value === null) return [];
  return Object.entries(value).flatMap(([key, inner]) =>
    key === '$ref' && typeof inner === 'string' ? [inner] : everyReference(inner),
  );
};

describe('the description of the API', () => {
  it('lists every route that is served, and no other', () => {
    const described = Object.entries(document.paths).flatMap(([path, operations]) =>
      Object.keys(operations).map((method) => `${method} ${path}`),
    );
    expect([...described].sort()).toEqual([...servedOperations()].sort());
  });

  it('refers to nothing that is not there, and describes nothing that is not referred to', () => {
    const named = Object.keys(document.components.schemas).map((id) => `#/components/schemas/${id}`);
    expect([...new Set(everyReference(document))].sort()).toEqual(named.sort());
  });

  it('requires what the contract requires', () => {
    const { parameters = [] } = document.paths['/api/v1/refrigerants/{id}/saturation']?.['get'] ?? {};
    expect(parameters.filter(({ required }) => required).map(({ name }) => name)).toEqual(['id', 'unit']);
    expect(document.components.schemas['EvaluationRequest']).toMatchObject({ required: ['setup'] });
    expect(document.components.schemas['Setup']).toMatchObject({ required: ['refrigerant', 'meteringDevice'] });
    expect(document.components.schemas['TemperatureReading']).toMatchObject({ required: ['value', 'unit'] });
  });

  it('lets clients send what a newer contract has', () => {
    expect(JSON.stringify(document)).not.toContain('additionalProperties');
  });

  it('is as committed: a change of the contract shows in review', async () => {
    const golden = new URL('./openapi.golden.json', import.meta.url).pathname;
    const text = await format(JSON.stringify(document), { parser: 'json', printWidth: 120 });
    await expect(text).toMatchFileSnapshot(golden);
  });
});
