import type { AccessRule } from '../../src/common/access.decorator';
import { createOpenApi } from '../../src/openapi';
import type { TestApp } from '../test-app';

const METHODS = ['get', 'post', 'put', 'patch', 'delete'] as const;
type Method = (typeof METHODS)[number];

export interface Route {
  /** as in `EXPECTED_ACCESS`: `GET /health` */
  name: string;
  method: Method;
  /** below /api, with parameters in braces */
  path: string;
  rule: AccessRule | undefined;
}

/** Every route of the API as its description says it; a new route is in the list by itself. */
export function listRoutes(test: TestApp): Route[] {
  return Object.entries(createOpenApi(test.app).paths).flatMap(([full, operations]) =>
    METHODS.flatMap((method) => {
      const operation = operations[method] as { 'x-access'?: AccessRule } | undefined;
      if (!operation) return [];
      const path = full.replace(/^\/api/, '');
      return [{ name: `${method.toUpperCase()} ${path}`, method, path, rule: operation['x-access'] }];
    }),
  );
}

export function fillPath(path: string, parameters: Record<string, string>): string {
  return path.replace(/\{(\w+)\}/g, (_whole, name: string) => {
    const value = parameters[name];
    if (!value) throw new Error(`the world has nothing for {${name}} in ${path}`);
    return value;
  });
}
