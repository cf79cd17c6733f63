import type { IRouter } from 'express';
import { TestApp } from './support/test-app.js';

/** These and the files of the documentation answer people who have not signed in; whoever adds one adds it here. */
const open = [
  'GET /api/access',
  'GET /api/docs',
  'GET /api/health',
  'GET /api/openapi.json',
  'GET /api/welcome/:token',
  'POST /api/first-visit',
  'POST /api/session',
  'POST /api/welcome/:token',
];

const isOpen = (route: string) => open.includes(route) || route.startsWith('GET /api/docs/');

describe('Every route', () => {
  let app: TestApp;

  beforeAll(async () => {
    app = await TestApp.start();
  });

  afterAll(() => app.close());

  /** Read from the running router, so that no way in is overlooked. */
  const routes = () => {
    const { stack }: IRouter = app.nest.getHttpAdapter().getInstance().router;
    return stack.flatMap(({ route }) =>
      (route?.stack ?? []).map(({ method }) => `${method.toUpperCase()} ${route?.path}`),
    );
  };

  const ask = (route: string) => {
    const [method = '', path = ''] = route.split(' ');
    return app.request(
      method.toLowerCase() as 'get' | 'post' | 'delete' | 'put' | 'patch',
      path.replaceAll(/:\w+/g, 'any'),
    );
  };

  test('is closed to people who have not signed in, or listed as open', async () => {
    const closed = routes().filter((route) => !isOpen(route));
    expect(closed.length).toBeGreaterThanOrEqual(9);
    for (const route of closed) {
      const response = await ask(route);
      expect([route, response.status]).toEqual([route, 401]);
      expect(response.type).toBe('application/problem+json');
      expect(response.body.code).toBe('signed-out');
    }
  });

  test('that is listed as open exists and asks nobody to sign in', async () => {
    expect(
      routes()
        .filter((route) => open.includes(route))
        .toSorted(),
    ).toEqual(open.toSorted());
    for (const route of open) {
      const { status, body } = await ask(route);
      expect([route, status]).not.toEqual([route, 401]);
      expect([route, body.detail]).not.toEqual([route, 'There is nothing at this address.']);
    }
  });
});
