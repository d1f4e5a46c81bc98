import { HTTP_CODE_METADATA, METHOD_METADATA, PATH_METADATA } from '@nestjs/common/constants.js';
import { RequestMethod } from '@nestjs/common';
import { DiscoveryService, MetadataScanner, ModulesContainer } from '@nestjs/core';
import type { OpenAPIObject } from '@nestjs/swagger';
import { ROLES } from '@rivetside/shared';
import supertest from 'supertest';
import { startTestApp, type TestApp } from '../../testing/start-test-app.js';

type Operation = NonNullable<OpenAPIObject['paths'][string]['get']> & { 'x-roles'?: string[] };
interface Named {
  readonly name: string;
  readonly method: string;
  readonly path: string;
  readonly operation: Operation;
}
interface Route {
  readonly name: string;
  readonly status: number;
}

const METHODS = ['get', 'post', 'put', 'patch', 'delete'];

describe('the OpenAPI document', () => {
  let test: TestApp;
  let document: OpenAPIObject;
  let operations: Named[];
  beforeAll(async () => {
    test = await startTestApp();
    const { body } = await test.guest.get('/docs-json').expect(200);
    document = body as OpenAPIObject;
    operations = Object.entries(document.paths).flatMap(([path, item]) =>
      Object.entries(item)
        .filter(([method]) => METHODS.includes(method))
        .map(([method, operation]) => ({
          name: `${method.toUpperCase()} ${path}`,
          method,
          path,
          operation: operation as Operation,
        })),
    );
  });
  afterAll(() => test.stop());

  /** Those operations for which it does not hold: a refusal names them. */
  const failing = (holds: (one: Named) => boolean) =>
    operations.filter((one) => !holds(one)).map(({ name }) => name);

  it('is one of OpenAPI 3.1', () => {
    expect(document.openapi).toBe('3.1.0');
    expect(document.info).toMatchObject({ title: 'Rivetside' });
    expect(operations.length).toBeGreaterThan(10);
  });

  it('has every route there is, with the status that it answers with', () => {
    const routes = routesOf(test);
    const documented = operations.map(({ name }) => name).sort();
    expect(documented).toEqual(routes.map(({ name }) => name).sort());
    const wrong = routes.filter(({ name, status }) => {
      const { operation } = operations.find((one) => one.name === name)!;
      return !operation.responses[status];
    });
    expect(wrong).toEqual([]);
  });

  it('says of every operation who may', () => {
    const known = new Set<string>([...ROLES, 'authenticated']);
    expect(
      failing(({ operation }) => {
        const roles = operation['x-roles'] ?? [];
        return roles.length > 0 && roles.every((role) => known.has(role));
      }),
    ).toEqual([]);
  });

  it('asks for a token wherever guests may not', () => {
    expect(
      failing(
        ({ operation }) => !!operation.security?.length !== (operation['x-roles'] ?? []).includes('guest'),
      ),
    ).toEqual([]);
  });

  it('has a schema for every answer that has a body', () => {
    expect(
      failing(({ operation }) =>
        Object.entries(operation.responses)
          .filter(([status]) => status < '300' && status !== '204' && status !== '202')
          .every(
            ([, response]) => Object.values((response as { content?: object }).content ?? {}).length > 0,
          ),
      ),
    ).toEqual([]);
  });

  it('has a problem for every refusal', () => {
    const problem = { $ref: '#/components/schemas/Problem' };
    expect(
      failing(({ operation, method }) =>
        ['400', '401', '403', '404', '429', ...(method === 'get' ? [] : ['409', '413', '415', '507'])].every(
          (status) => {
            const { content } = (operation.responses[status] ?? {}) as { content?: Record<string, unknown> };
            return (
              JSON.stringify(content?.['application/problem+json']) === JSON.stringify({ schema: problem })
            );
          },
        ),
      ),
    ).toEqual([]);
  });

  it('has a schema for every body that is sent', () => {
    expect(
      failing(({ operation }) => {
        const body = operation.requestBody as { content?: Record<string, { schema?: object }> } | undefined;
        return body === undefined || Object.values(body.content ?? {}).some(({ schema }) => schema);
      }),
    ).toEqual([]);
  });

  it('names every part of a path', () => {
    expect(
      failing(({ path, operation }) => {
        const inPath = [...path.matchAll(/\{(\w+)\}/g)].map(([, name]) => name);
        const told = (operation.parameters ?? []).flatMap((one) =>
          'in' in one && one.in === 'path' && one.required ? one.name : [],
        );
        return inPath.sort().join() === told.sort().join();
      }),
    ).toEqual([]);
  });

  it('tells of the Idempotency-Key at every write of somebody signed in', () => {
    const takesKey = ({ operation }: Named) =>
      (operation.parameters ?? []).some((one) => 'name' in one && one.name === 'Idempotency-Key');
    expect(
      failing((one) => {
        const expected = one.method !== 'get' && !one.operation['x-roles']?.includes('guest');
        return takesKey(one) === expected;
      }),
    ).toEqual([]);
  });

  it('has one name for each operation', () => {
    const names = operations.map(({ operation }) => operation.operationId);
    expect(new Set(names).size).toBe(operations.length);
  });

  it('refers to nothing that it does not hold', () => {
    const schemas = Object.keys(document.components?.schemas ?? {});
    const referred = [...JSON.stringify(document).matchAll(/"\$ref":"#\/components\/schemas\/([^"]+)"/g)];
    expect(referred.length).toBeGreaterThan(10);
    expect(referred.map(([, name]) => name!).filter((name) => !schemas.includes(name))).toEqual([]);
    expect([...JSON.stringify(document).matchAll(/"\$ref":"(?!#\/components\/schemas\/)/g)]).toEqual([]);
  });

  it('is read by people on a page that alone may style itself', async () => {
    const { text, headers } = await supertest(test.server).get('/api/docs').expect(200);
    expect(text).toContain('<title>Rivetside API</title>');
    expect(headers['content-security-policy']).toMatch(/style-src 'self' 'unsafe-inline'/);
    expect(headers['content-security-policy']).not.toMatch(/script-src[^;]*unsafe/);
    // With no script inline the policy holds.
    expect(text).not.toMatch(/<script(?![^>]*src=)/);
    for (const [, file] of text.matchAll(/(?:src|href)="\.\/(docs\/[^"]+)"/g))
      await supertest(test.server).get(`/api/${file}`).expect(200);
  });
});

/** What the controllers declare, but for those that are hidden on purpose. */
function routesOf(test: TestApp): Route[] {
  const discovery = new DiscoveryService(test.app.get(ModulesContainer));
  const scanner = new MetadataScanner();
  return discovery.getControllers().flatMap(({ instance, metatype }) => {
    const base = String(Reflect.getMetadata(PATH_METADATA, metatype as object));
    if (base.startsWith('dev/')) return [];
    const prototype = Object.getPrototypeOf(instance as object) as Record<string, object>;
    return scanner.getAllMethodNames(prototype).flatMap((key) => {
      const handler = prototype[key]!;
      const method = Reflect.getMetadata(METHOD_METADATA, handler) as RequestMethod | undefined;
      if (method === undefined) return [];
      const path = [base, String(Reflect.getMetadata(PATH_METADATA, handler))]
        .flatMap((part) => part.split('/'))
        .filter((part) => part !== '')
        .map((part) => part.replace(/^:(\w+)$/, '{$1}'));
      const status = Reflect.getMetadata(HTTP_CODE_METADATA, handler) as number | undefined;
      return {
        name: `${RequestMethod[method]} /api/${path.join('/')}`,
        status: status ?? (method === RequestMethod.POST ? 201 : 200),
      };
    });
  });
}
