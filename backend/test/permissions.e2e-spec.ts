import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { type Role, ROLES, startServer, type TestServer } from './harness.js';

/** Who may do what, written out here on its own so that a slip in the server's own map shows. */
const LOOKING: Role[] = ['admin', 'designer', 'librarian', 'purchaser', 'viewer'];
const HOLDERS: Record<string, Role[]> = {
  'parts.read': LOOKING,
  'briefs.read': LOOKING,
  'trains.read': LOOKING,
  'audit.read': LOOKING,
  'rules.read': LOOKING,
  'calc.use': LOOKING,
  'signed-in': LOOKING,
  'parts.edit': ['admin', 'librarian'],
  'briefs.edit': ['admin', 'designer'],
  'trains.edit': ['admin', 'designer'],
  'bom.export': ['admin', 'designer', 'librarian', 'purchaser'],
  'prices.read': ['admin', 'designer', 'librarian', 'purchaser'],
  'prices.edit': ['admin', 'librarian', 'purchaser'],
  'offers.choose': ['admin', 'designer', 'purchaser'],
  'stock.read': LOOKING,
  'stock.book': ['admin', 'librarian', 'purchaser'],
  'people.manage': ['admin'],
};

const OPEN = [
  'GET /api/auth/welcome',
  'GET /api/health',
  'POST /api/auth/first-admin',
  'POST /api/auth/sign-in',
];

interface Route {
  method: string;
  path: string;
  permission: unknown;
}

let server: TestServer;
let routes: Route[];
beforeAll(async () => {
  server = await startServer();
  routes = Object.entries(server.document.paths).flatMap(([path, item]) =>
    Object.entries(item as Record<string, Record<string, unknown>>).map(([method, operation]) => ({
      method: method.toUpperCase(),
      path: path.replace(/\{[^}]+\}/g, '0'),
      permission: operation['x-permission'],
    })),
  );
});
afterAll(() => server.close());

/** A request that reaches the check of permissions, and changes nothing when it passes: it has no content. */
function knock(client: Awaited<ReturnType<TestServer['as']>>, { method, path }: Route) {
  return client.send<{ code: string }>(
    method,
    path,
    method === 'GET' || method === 'DELETE' ? {} : { body: {} },
  );
}

describe('every route', () => {
  it('declares who may call it, in the document too', () => {
    expect(routes.length).toBeGreaterThan(10);
    const known = new Set(['public', ...Object.keys(HOLDERS)]);
    expect(routes.filter(({ permission }) => !known.has(String(permission)))).toEqual([]);
  });

  it('is closed to people who are not signed in, but for the few that let them in', async () => {
    const open = routes.filter(({ permission }) => permission === 'public');
    expect(open.map(({ method, path }) => `${method} ${path}`).sort()).toEqual(OPEN);
    for (const route of routes.filter(({ permission }) => permission !== 'public')) {
      const { status } = await knock(server.anonymous(), route);
      expect([route.method, route.path, status]).toEqual([route.method, route.path, 401]);
    }
  });

  it.each(ROLES)('lets a %s do what the role may, and nothing else', async (role) => {
    const client = await server.as(role);
    for (const route of routes.filter(({ permission }) => permission !== 'public')) {
      // Its own test ends a session; here it would sign the shared person out.
      if (route.path === '/api/auth/sign-out') continue;
      const { status, body } = await knock(client, route);
      const mayCall = HOLDERS[String(route.permission)]?.includes(role) ?? false;
      const refused = status === 403 && body.code === 'forbidden';
      expect({ ...route, refused, status }).toMatchObject({ refused: !mayCall });
      expect(status).not.toBe(401);
      expect([route.method, route.path, status < 500]).toEqual([route.method, route.path, true]);
    }
  });
});
