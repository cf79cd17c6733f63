import type { OpenAPIObject } from '@nestjs/swagger';
import type { IRouter } from 'express';
import { TestApp } from './support/test-app.js';

type Operation = NonNullable<OpenAPIObject['paths'][string]['get']>;

/** They say everything with their path. */
const withoutBody = /\/(duplicate|link)$/;

describe('The description of the API', () => {
  let app: TestApp;
  let document: OpenAPIObject;

  beforeAll(async () => {
    app = await TestApp.start();
    const response = await app.get('/api/openapi.json');
    expect(response.status).toBe(200);
    expect(response.type).toBe('application/json');
    document = response.body;
  });

  afterAll(() => app.close());

  const operations = (): [string, Operation][] =>
    Object.entries(document.paths).flatMap(([path, methods]) =>
      Object.entries(methods as Record<string, Operation>).map(([method, operation]): [string, Operation] => [
        `${method.toUpperCase()} ${path}`,
        operation,
      ]),
    );

  test('states its version of OpenAPI and the version of the product', () => {
    expect(document.openapi).toBe('3.1.0');
    expect(document.info).toMatchObject({
      title: 'Steelyard API',
      version: expect.stringMatching(/^\d+\.\d+\.\d+$/),
    });
  });

  test('covers every route that answers with data', () => {
    const { stack }: IRouter = app.nest.getHttpAdapter().getInstance().router;
    const routes = stack.flatMap(({ route }) =>
      (route?.stack ?? []).map(
        ({ method }) => `${method.toUpperCase()} ${route?.path.replaceAll(/:(\w+)/g, '{$1}')}`,
      ),
    );
    const own = routes.filter((route) => !/\/api\/(docs|openapi)/.test(route));
    expect(
      operations()
        .map(([name]) => name)
        .toSorted(),
    ).toEqual(own.toSorted());
  });

  test('sums up every operation, names it once, and states its success and its problems', () => {
    const names = operations().map(([, { operationId }]) => operationId);
    expect(new Set(names).size).toBe(names.length);
    for (const [, { summary, tags, responses }] of operations()) {
      expect(summary).toMatch(/^[A-Z].{6,}/);
      expect(tags).toHaveLength(1);
      expect(Object.keys(responses)).toEqual([expect.stringMatching(/^20[014]$/), 'default']);
      expect(responses.default).toMatchObject({
        content: { 'application/problem+json': { schema: { $ref: '#/components/schemas/Problem' } } },
      });
    }
  });

  test('gives a schema for every body and every answer', () => {
    for (const [name, { requestBody, responses }] of operations()) {
      if (/^(POST|PUT)/.test(name) && !withoutBody.test(name))
        expect(requestBody).toHaveProperty(['content', 'application/json', 'schema']);
      const [status, success] = Object.entries(responses)[0] ?? [];
      if (status !== '204') expect(success).toHaveProperty(['content', 'application/json', 'schema']);
    }
  });

  test('refers to nothing that it does not hold', () => {
    const references = [...JSON.stringify(document).matchAll(/"\$ref":"#\/([^"]+)"/g)].map(
      ([, path]) => path ?? '',
    );
    expect(references.length).toBeGreaterThan(20);
    for (const path of new Set(references)) expect(document).toHaveProperty(path.split('/'));
  });

  test('declares every parameter of every path', () => {
    for (const [name, { parameters }] of operations()) {
      const declared = (parameters ?? []).flatMap((parameter) =>
        'name' in parameter && parameter.in === 'path' ? [parameter.name] : [],
      );
      expect(declared).toEqual([...name.matchAll(/\{(\w+)\}/g)].map(([, parameter]) => parameter));
    }
  });

  test('is readable at /api/docs, which brings everything it shows', async () => {
    const page = await app.get('/api/docs');
    expect(page.status).toBe(200);
    expect(page.text).toContain('<title>Steelyard API</title>');
    const files = [...page.text.matchAll(/(?:src|href)=["']([^"']+)["']/g)].map(([, file]) => file ?? '');
    expect(files.length).toBeGreaterThanOrEqual(4);
    for (const file of files) {
      const { pathname, host } = new URL(file, 'http://own.example/api/docs');
      expect(host).toBe('own.example');
      expect((await app.get(pathname)).status).toBe(200);
    }
  });
});
