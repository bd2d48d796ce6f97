import { Validator } from '@seriousme/openapi-schema-validator';
import { describe, expect, it } from 'vitest';
import { openApiDocument } from '~/server/openapi/document';
import { operations } from '~/server/openapi/operations';
import { routes } from '../support/call-api';

const document = openApiDocument('http://127.0.0.1:4321', '0.1.0') as {
  openapi: string;
  paths: Record<string, Record<string, Record<string, unknown>>>;
  components: { schemas: Record<string, unknown> };
};
const verbs = ['GET', 'POST', 'PUT', 'PATCH', 'DELETE'];

describe('the OpenAPI document', () => {
  it('is accepted by a validator of OpenAPI 3.1', async () => {
    const result = await new Validator().validate(JSON.parse(JSON.stringify(document)));
    expect(result.errors).toBeUndefined();
    expect(result.valid).toBe(true);
    expect(document.openapi).toBe('3.1.0');
  });

  it('would not be accepted with a fault in it', async () => {
    const broken = JSON.parse(JSON.stringify(document));
    broken.paths['/healthz'].get.responses = 'none';
    expect((await new Validator().validate(broken)).valid).toBe(false);
  });

  it('has every method of every route, and no other', () => {
    const fromRoutes = Object.entries(routes)
      .filter(([address]) => address !== '/api/{path}')
      .flatMap(([address, route]) =>
        verbs.filter((verb) => verb in route).map((verb) => `${verb} ${address}`),
      );
    const fromTable = operations.map(({ method, path }) => `${method} ${path}`);
    expect([...fromRoutes].sort()).toEqual([...fromTable].sort());
    const fromDocument = Object.entries(document.paths).flatMap(([path, methods]) =>
      Object.keys(methods).map((method) => `${method.toUpperCase()} ${path}`),
    );
    expect([...fromDocument].sort()).toEqual([...fromTable].sort());
  });

  it('lets every route answer the methods it lacks', () => {
    for (const [address, route] of Object.entries(routes))
      expect(route, address).toHaveProperty('ALL');
  });

  it('names every operation once', () => {
    const ids = operations.map(({ id }) => id);
    expect(new Set(ids).size).toBe(ids.length);
  });

  it('refers only to shapes that it holds', () => {
    const references = [...JSON.stringify(document).matchAll(/"\$ref":"([^"]+)"/g)].map(
      (match) => match[1]!,
    );
    expect(references.length).toBeGreaterThan(20);
    for (const reference of references) {
      expect(reference).toMatch(/^#\/components\/schemas\//);
      expect(document.components.schemas).toHaveProperty(reference.split('/').at(-1)!);
    }
  });

  it('describes a query as numbers, and which of it is needed', () => {
    const depth = document.paths['/api/v1/revisions/{id}/depth']!['get']!;
    expect(depth['parameters']).toContainEqual({
      name: 'volumeL',
      in: 'query',
      required: true,
      schema: expect.objectContaining({ type: 'number' }),
    });
  });
});
