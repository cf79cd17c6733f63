import { EntityManager } from '@mikro-orm/sqlite';
import { addPerson } from './support/people.js';
import { TestApp } from './support/test-app.js';

const address = 'ada.merrow@brackwater.example';

describe('Problems', () => {
  let app: TestApp;
  let cookie: string;

  beforeAll(async () => {
    app = await TestApp.start();
    await addPerson(app, address);
    cookie = await app.signIn(address);
  });

  afterAll(() => app.close());

  const appraise = (body: string | object) =>
    app.request('post', '/api/appraisals', cookie).set('Content-Type', 'application/json').send(body);

  const request = {
    outcome: { kind: 'continuous', difference: 1, sd: 2.1 },
    test: { hypothesis: 'superiority', alpha: 0.05, sides: 2 },
    design: { family: 'parallel' },
    aim: { find: 'size', power: 0.9 },
  };

  test('a path that nobody serves is not found, as a problem', async () => {
    for (const path of ['/api', '/api/nowhere', '/api/studies/x/nowhere', '/missing.js']) {
      const response = await app.get(path, cookie);
      expect([path, response.status, response.type]).toEqual([path, 404, 'application/problem+json']);
      expect(response.body).toEqual({
        type: 'about:blank',
        title: 'Not Found',
        status: 404,
        code: 'not-found',
        detail: 'There is nothing at this address.',
      });
    }
  });

  test('a body that is no JSON is unreadable', async () => {
    const response = await appraise('{"outcome": ');
    expect(response.status).toBe(400);
    expect(response.type).toBe('application/problem+json');
    expect(response.body).toMatchObject({ status: 400, code: 'unreadable' });
  });

  test('the character NUL is refused in a body and in a path', async () => {
    const response = await appraise(JSON.stringify({ outcome: 'a\0b' }));
    expect(response.body).toMatchObject({ status: 400, code: 'unreadable' });
    expect((await app.get('/api/studies/a%00b', cookie)).status).toBe(404);
  });

  test('a body beyond the limit is refused', async () => {
    const response = await appraise(JSON.stringify({ padding: 'x'.repeat(200_000) }));
    expect(response.status).toBe(413);
    expect(response.body).toMatchObject({ status: 413, code: 'unreadable' });
  });

  test('a request that calc refuses names the field at fault', async () => {
    const response = await appraise({ ...request, outcome: { ...request.outcome, sd: -1 } });
    expect(response.status).toBe(422);
    expect(response.body).toMatchObject({ code: 'invalid', issues: [{ path: 'outcome.sd' }] });
    expect(response.body.issues[0].message).toBe(response.body.detail);
  });

  test('a request without a body is refused', async () => {
    const response = await app.request('post', '/api/appraisals', cookie);
    expect(response.status).toBe(422);
    expect(response.body.code).toBe('invalid');
  });

  test('an appraisal answers with status 200', async () => {
    const response = await appraise(request);
    expect(response.status).toBe(200);
    // Two arms of 94: the demo's parallel option, computed in R.
    expect(response.body).toMatchObject({ feasible: true, participants: 188 });
  });

  test('an error nobody foresaw is told by its correlation id alone', async () => {
    const broken = await TestApp.start();
    await broken.nest.get(EntityManager).getConnection().execute('drop table person');
    const response = await broken.get('/api/access');
    expect(response.status).toBe(500);
    expect(response.type).toBe('application/problem+json');
    expect(response.body).toEqual({
      type: 'about:blank',
      title: 'Internal Server Error',
      status: 500,
      code: 'internal',
      detail: 'Something went wrong on the server. Its log names the cause under this correlation id.',
      correlationId: expect.stringMatching(/^[0-9a-f-]{36}$/),
    });
    expect(response.text).not.toMatch(/person|select|at /i);
    await broken.close();
  });
});
