import { createApiDocument } from '../src/api-document';
import { TestApp } from './create-test-app';

const ID = '3f3c7a4e-58a9-4e0e-8f5e-6c1c5b1d2a10';
const METHODS = ['get', 'post', 'put', 'patch', 'delete'] as const;
type Method = (typeof METHODS)[number];

/** Everything that answers people who are not signed in; whoever adds to it adds a way in. */
const PUBLIC: readonly string[] = [
  'get /api/health',
  'get /api/session',
  'post /api/session',
  'delete /api/session',
  'post /api/session/demo',
  'post /api/setup',
  'get /api/one-time-links/{token}',
  'post /api/one-time-links/{token}',
];

describe('every route of the API', () => {
  let testApp: TestApp;
  let routes: { method: Method; path: string }[];

  beforeAll(async () => {
    testApp = await TestApp.create();
    routes = Object.entries(createApiDocument(testApp.app).paths).flatMap(([path, item]) =>
      METHODS.filter((method) => item[method] !== undefined).map((method) => ({ method, path })),
    );
  });
  afterAll(() => testApp.close());

  const address = (path: string) => path.replace(/\{\w+\}/g, ID);
  const name = ({ method, path }: { method: Method; path: string }) => `${method} ${path}`;

  it('is refused without a session, but for those that are meant to be open', async () => {
    expect(routes.length).toBeGreaterThan(30);
    const open: string[] = [];
    for (const route of routes) {
      const { status } = await testApp.anonymous()[route.method](address(route.path)).send({});
      if (status !== 401) open.push(name(route));
    }
    expect(open.sort()).toEqual([...PUBLIC].sort());
  });

  it('is refused without the header when it writes, even to an administrator', async () => {
    const { agent } = await testApp.signedIn(['admin', 'designer', 'lead', 'buyer']);
    for (const route of routes.filter(({ method }) => method !== 'get')) {
      const response = await agent[route.method](address(route.path)).set('X-Requested-With', '').send({});
      expect({ route: name(route), status: response.status, code: response.body.code }).toEqual({
        route: name(route),
        status: 403,
        code: 'csrf_header_missing',
      });
    }
  });

  it('is refused to the session of somebody who has been deactivated', async () => {
    const { agent, user } = await testApp.signedIn(['designer', 'lead']);
    const { agent: admin } = await testApp.signedIn('admin');
    await admin.patch(`/api/users/${user.id}`).send({ version: 1, active: false }).expect(200);
    for (const route of routes.filter((candidate) => !PUBLIC.includes(name(candidate)))) {
      const { status } = await agent[route.method](address(route.path)).send({});
      expect({ route: name(route), status }).toEqual({ route: name(route), status: 401 });
    }
  });

  it('has an address of its own: no two differ only in a parameter’s name', () => {
    const shapes = routes.map(({ method, path }) => `${method} ${path.replace(/\{\w+\}/g, '{}')}`);
    expect(new Set(shapes).size).toBe(shapes.length);
  });
});
