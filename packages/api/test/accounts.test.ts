import { WelcomeLink } from '../src/auth/welcome-link.entity.js';
import type { AccountView } from '../src/contract/people.js';
import { demoPassword } from '../src/demo/people.js';
import { addPerson } from './support/people.js';
import { cookieOf, TestApp } from './support/test-app.js';
import { day } from './support/test-clock.js';

const administrator = 'sable@merrow.example';
const member = 'ada@merrow.example';
const next = 'a kitchen garden';

describe('Accounts', () => {
  let app: TestApp;
  let admin: string;
  let cookie: string;

  beforeEach(async () => {
    app = await TestApp.start();
    await addPerson(app, administrator, true);
    await addPerson(app, member);
    admin = await app.signIn(administrator);
    cookie = await app.signIn(member);
  });

  afterEach(() => app.close());

  const invite = (account: object = { name: 'Noor Hale', email: 'noor@merrow.example' }) =>
    app.request('post', '/api/people', admin).send(account);
  const people = async (): Promise<AccountView[]> => (await app.get('/api/people', admin)).body.people;
  const welcome = (link: string) => app.get(`/api${link}`);
  const enter = (link: string, password = next) => app.request('post', `/api${link}`).send({ password });

  test('are opened by a link that works once', async () => {
    const invited = await invite();
    expect(invited.status).toBe(201);
    const { link, person } = invited.body;
    expect(link).toMatch(/^\/welcome\/[\w-]{43}$/);
    expect(person).toMatchObject({
      name: 'Noor Hale',
      administrator: false,
      linkExpiresAt: '2026-03-09T09:00:00.000Z',
    });
    expect((await welcome(link)).body).toEqual({ name: 'Noor Hale', email: 'noor@merrow.example' });
    expect((await enter(link, 'too short')).body.issues).toMatchObject([{ path: 'password' }]);
    const entered = await enter(link);
    expect(entered.status).toBe(201);
    expect((await app.get('/api/session', cookieOf(entered))).body.name).toBe('Noor Hale');
    expect((await enter(link)).status).toBe(404);
    expect((await welcome(link)).status).toBe(404);
    await app.signIn('noor@merrow.example', next);
    expect((await people()).find(({ id }) => id === person.id)?.linkExpiresAt).toBeNull();
  });

  test('opened by two at once open for one', async () => {
    const { link } = (await invite()).body;
    const both = await Promise.all([enter(link), enter(link, 'another password')]);
    expect(both.map(({ status }) => status).toSorted()).toEqual([201, 404]);
  });

  test('stay closed after seven days, until there is another link', async () => {
    const { link, person } = (await invite()).body;
    app.clock.advance(7 * day - 1000);
    expect((await welcome(link)).status).toBe(200);
    app.clock.advance(1000);
    expect((await welcome(link)).status).toBe(404);
    expect((await enter(link)).status).toBe(404);
    admin = await app.signIn(administrator);
    const again = await app.request('post', `/api/people/${person.id}/link`, admin);
    expect(again.status).toBe(201);
    const newest = await app.request('post', `/api/people/${person.id}/link`, admin);
    expect((await enter(again.body.link)).status).toBe(404);
    expect((await enter(newest.body.link)).status).toBe(201);
  });

  test('keep no link that could be read from the database', async () => {
    const { link } = (await invite()).body;
    const [stored] = await app.em.fork().findAll(WelcomeLink);
    expect(stored?.id).toMatch(/^[0-9a-f]{64}$/);
    expect(link).not.toContain(stored?.id);
  });

  test('have one address each', async () => {
    expect((await invite({ name: 'Ada', email: member.toUpperCase() })).body.issues).toMatchObject([
      { path: 'email' },
    ]);
    expect((await invite({ name: '', email: 'x' })).body.issues).toMatchObject([
      { path: 'name' },
      { path: 'email' },
    ]);
    expect((await app.request('post', '/api/people/no-id/link', admin)).status).toBe(404);
  });

  test('are told of in the audit of the site, passwords left out', async () => {
    const { link } = (await invite()).body;
    await enter(link);
    const { entries } = (await app.get('/api/audit', admin)).body;
    expect(entries.slice(0, 2)).toMatchObject([
      { action: 'welcomed', by: 'Noor Hale', what: 'account of Noor Hale <noor@merrow.example>' },
      { action: 'added', by: 'Ada Merrow', after: { email: 'noor@merrow.example', administrator: false } },
    ]);
    expect(JSON.stringify(entries)).not.toMatch(/argon2|kitchen/);
  });

  test('change their name, by version', async () => {
    const { version } = (await app.get('/api/profile', cookie)).body;
    const put = (name: string) => app.request('put', '/api/profile', cookie).send({ version, name });
    expect((await put('Ada Merrow-Hale')).body).toMatchObject({
      name: 'Ada Merrow-Hale',
      version: version + 1,
    });
    expect((await app.get('/api/session', cookie)).body.name).toBe('Ada Merrow-Hale');
    expect((await put('Ada')).body).toMatchObject({ status: 409, current: { name: 'Ada Merrow-Hale' } });
    expect((await put(' ')).body.issues).toMatchObject([{ path: 'name' }]);
  });

  test('change their password by the one they have, which signs out everywhere else', async () => {
    const elsewhere = await app.signIn(member);
    const put = (body: object) => app.request('put', '/api/profile/password', cookie).send(body);
    expect((await put({ current: 'not this one', next })).body.issues).toMatchObject([{ path: 'current' }]);
    expect((await put({ current: demoPassword, next: 'short' })).body.issues).toMatchObject([
      { path: 'next' },
    ]);
    expect((await put({ current: demoPassword, next })).status).toBe(204);
    expect((await app.get('/api/session', cookie)).status).toBe(200);
    expect((await app.get('/api/session', elsewhere)).status).toBe(401);
    await app.signIn(member, next);
  });

  test('sign out everywhere at once', async () => {
    const elsewhere = await app.signIn(member);
    const response = await app.request('delete', '/api/sessions', cookie);
    expect(response.status).toBe(204);
    for (const session of [cookie, elsewhere])
      expect((await app.get('/api/session', session)).status).toBe(401);
    expect((await app.get('/api/session', admin)).status).toBe(200);
  });
});
