import { ModulesContainer } from '@nestjs/core';
import { caseActions } from '@weighhouse/shared/access/actions';
import { ACCESS, generalActions } from '@weighhouse/server/platform/http/access.decorator';
import { openApiDocument } from '@weighhouse/server/platform/http/open-api';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { type RunningApp, startApp } from '../setup/app.js';

/** Nest's own keys of a route's metadata, and the kinds of argument that come from outside. */
const routePath = 'path';
const routeMethod = 'method';
const routeArguments = '__routeArguments__';
const serializing = 'class_serializer:options';
const responses = 'swagger/apiResponse';
const fromOutside: Record<number, string> = { 3: 'body', 4: 'query', 5: 'param' };

interface Route {
  name: string;
  access: unknown;
  answers: boolean;
  argumentsWithoutSchema: string[];
}

type Controller = new (...parts: never[]) => object;

function routesOf(controller: Controller): Route[] {
  const prototype = controller.prototype as Record<string, unknown>;
  return Object.getOwnPropertyNames(prototype)
    .map((name) => ({ name, handler: prototype[name] }))
    .filter(({ handler }) => typeof handler === 'function' && Reflect.hasMetadata(routeMethod, handler))
    .map(({ name, handler }) => {
      const method = handler as object;
      const args = (Reflect.getMetadata(routeArguments, controller, name) ?? {}) as Record<
        string,
        { schema?: unknown }
      >;
      const file = Object.values(
        (Reflect.getMetadata(responses, method) ?? {}) as Record<string, { content?: unknown }>,
      );
      const serialized = Reflect.getMetadata(serializing, method) as { schema?: unknown } | undefined;
      return {
        name: `${controller.name}.${name} (${String(Reflect.getMetadata(routePath, method))})`,
        access: (Reflect.getMetadata(ACCESS, method) ?? Reflect.getMetadata(ACCESS, controller)) as unknown,
        answers: serialized?.schema !== undefined || file.some((response) => response.content !== undefined),
        argumentsWithoutSchema: Object.entries(args)
          .filter(
            ([key, value]) =>
              fromOutside[Number(key.split(':')[0])] !== undefined && value.schema === undefined,
          )
          .map(([key]) => fromOutside[Number(key.split(':')[0])] ?? key),
      };
    });
}

describe('every route', () => {
  let running: RunningApp;
  let routes: Route[];
  let document: ReturnType<typeof openApiDocument>;

  beforeAll(async () => {
    running = await startApp();
    const modules = [...running.app.get(ModulesContainer).values()];
    const controllers = modules.flatMap((module) =>
      [...module.controllers.values()].map((item) => item.metatype as Controller),
    );
    routes = controllers.flatMap(routesOf);
    document = openApiDocument(running.app);
  });
  afterAll(() => running.close());

  it('is found by the walk', () => {
    expect(routes.length).toBeGreaterThan(40);
  });

  it('declares its access with an action that exists', () => {
    const known = new Set<unknown>([...caseActions, ...Object.keys(generalActions)]);
    expect(routes.filter((route) => !known.has(route.access)).map((route) => route.name)).toEqual([]);
  });

  it('answers through a schema or declares a file', () => {
    expect(routes.filter((route) => !route.answers).map((route) => route.name)).toEqual([]);
  });

  it('takes nothing from outside without a schema', () => {
    const bare = routes.filter((route) => route.argumentsWithoutSchema.length > 0);
    expect(bare.map((route) => `${route.name}: ${route.argumentsWithoutSchema.join()}`)).toEqual([]);
  });

  it('stands in the OpenAPI document with the schema of its answer and, where it takes one, of its body', () => {
    const operations = Object.entries(document.paths).flatMap(([path, item]) =>
      Object.entries(item).map(([method, operation]) => ({
        path,
        method,
        operation: operation as OperationLike,
      })),
    );
    expect(operations.length).toBe(routes.length);
    const bare = operations.filter(({ operation }) => {
      const good = Object.entries(operation.responses).find(([status]) => status.startsWith('2'))?.[1];
      const answered = Object.values(good?.content ?? {}).some((content) => content.schema !== undefined);
      const bodies = Object.values(operation.requestBody?.content ?? {});
      return !answered || bodies.some((content) => content.schema === undefined);
    });
    expect(bare.map(({ method, path }) => `${method} ${path}`)).toEqual([]);
  });

  it.each(pinned())('is at its pinned place: %s %s', (method, path) => {
    const names = (text: string): string => text.replace(/\{[^}]+\}/g, '{}');
    const item = Object.entries(document.paths).find(([known]) => names(known) === names(path))?.[1];
    expect(item && method.toLowerCase() in item, `${method} ${path}`).toBe(true);
  });
});

interface OperationLike {
  responses: Record<string, { content?: Record<string, { schema?: unknown }> }>;
  requestBody?: { content?: Record<string, { schema?: unknown }> };
}

/** The routes that other programs rely on; they never move. */
function pinned(): [string, string][] {
  const lines = `
    POST GET DELETE /api/session
    POST GET /api/cases
    GET PATCH /api/cases/{}
    POST /api/cases/{}/submit
    POST /api/cases/{}/return
    POST /api/cases/{}/decline
    POST /api/cases/{}/accept
    POST /api/cases/{}/withdraw
    POST /api/cases/{}/reopen
    PUT /api/cases/{}/team
    PATCH /api/cases/{}/settings
    POST GET /api/cases/{}/reports
    GET /api/reports/{}/content
    POST GET /api/cases/{}/candidates
    POST /api/candidates/{}/retire
    POST /api/cases/{}/findings
    PATCH /api/findings/{}
    POST /api/findings/{}/entered-in-error
    POST /api/cases/{}/rounds
    POST /api/rounds/{}/hand-in
    POST /api/rounds/{}/unseal
    POST /api/rounds/{}/close
    PUT /api/cases/{}/judgement/prior
    PUT /api/cases/{}/judgement/findings/{}
    GET /api/cases/{}/differential
    GET /api/cases/{}/panel
    PUT /api/cases/{}/plan
    POST /api/cases/{}/dissent
    POST /api/cases/{}/conclude
    GET PUT /api/cases/{}/summary
    POST /api/cases/{}/summary/approve
    POST /api/cases/{}/summary/told
    POST /api/cases/{}/outcome
    GET /api/cases/{}/trail
    GET /api/cases/{}/export
    GET POST /api/people
    GET /api/health
    GET /api/ready`;
  return lines
    .trim()
    .split('\n')
    .flatMap((line) => {
      const words = line.trim().split(' ');
      const path = words.pop() ?? '';
      return words.map((method): [string, string] => [method, path]);
    });
}
