import { FirstVisitCode } from '../src/auth/first-visit-code.js';
import { Person } from '../src/people/person.entity.js';
import { cookieOf, TestApp } from './support/test-app.js';

describe('The first visit', () => {
  let app: TestApp;
  let code: string;

  beforeEach(async () => {
    app = await TestApp.start({ settings: { demo: false } });
    code = app.nest.get(FirstVisitCode).code;
  });

  afterEach(() => app.close());

  const visit = (given: object) =>
    app.request('post', '/api/first-visit').send({
      code,
      name: 'Ada Merrow',
      email: 'ada@merrow.example',
      password: 'a kitchen garden',
      ...given,
    });

  test('is announced while nobody has an account', async () => {
    expect((await app.get('/api/access')).body).toEqual({ firstVisit: true, demo: null });
  });

  test('makes whoever knows the code the administrator, signed in', async () => {
    const response = await visit({});
    expect(response.status).toBe(201);
    expect(response.body).toMatchObject({ name: 'Ada Merrow', administrator: true });
    const current = await app.get('/api/session', cookieOf(response));
    expect(current.body).toEqual(response.body);
    expect((await app.get('/api/access')).body).toEqual({ firstVisit: false, demo: null });
  });

  test('refuses another code at its field', async () => {
    const response = await visit({ code: `${code}x` });
    expect(response.status).toBe(422);
    expect(response.body.issues).toEqual([
      { path: 'code', message: 'This is not the code printed on the server’s console.' },
    ]);
    expect(await app.em.fork().count(Person)).toBe(0);
  });

  test('refuses a short password at its field', async () => {
    const response = await visit({ password: 'too short' });
    expect(response.status).toBe(422);
    expect(response.body.issues).toEqual([
      { path: 'password', message: 'Choose a password of 12 characters or more.' },
    ]);
  });

  test('happens once, also when two come together', async () => {
    const both = await Promise.all([visit({}), visit({ email: 'another@merrow.example' })]);
    expect(both.map(({ status }) => status).toSorted()).toEqual([201, 404]);
    expect((await visit({ email: 'a.third@merrow.example' })).status).toBe(404);
    expect(await app.em.fork().count(Person)).toBe(1);
  });

  test('has another code at the next start', async () => {
    const next = await TestApp.start({ settings: { demo: false } });
    expect(next.nest.get(FirstVisitCode).code).not.toBe(code);
    await next.close();
  });
});
