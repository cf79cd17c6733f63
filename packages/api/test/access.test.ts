import { createHash } from 'node:crypto';
import { Session } from '../src/auth/session.entity.js';
import { demoPassword } from '../src/demo/people.js';
import { Person } from '../src/people/person.entity.js';
import { addPerson } from './support/people.js';
import { cookieOf, setCookieOf, TestApp } from './support/test-app.js';
import { day, minute } from './support/test-clock.js';

const address = 'ada.merrow@brackwater.example';

describe('Signing in and out', () => {
  let app: TestApp;

  beforeEach(async () => {
    app = await TestApp.start();
    await addPerson(app, address);
  });

  afterEach(() => app.close());

  const signIn = (body: object) => app.request('post', '/api/session').send(body);

  test('a right password answers with the person and a cookie that no script can read', async () => {
    const response = await signIn({ email: ' Ada.Merrow@Brackwater.example ', password: demoPassword });
    expect(response.status).toBe(201);
    expect(response.body).toEqual({
      id: expect.any(String),
      name: 'Ada Merrow',
      email: address,
      administrator: false,
    });
    expect(setCookieOf(response)).toMatch(
      /^steelyard_session=[\w-]{43}; Path=\/; Expires=Wed, 01 Apr 2026 09:00:00 GMT; HttpOnly; SameSite=Lax$/,
    );
  });

  test('behind TLS the cookie is sent over TLS alone, and the browser is told to stay there', async () => {
    const secure = await TestApp.start({ settings: { secureCookies: true } });
    await addPerson(secure, address);
    const response = await secure
      .request('post', '/api/session')
      .send({ email: address, password: demoPassword });
    expect(setCookieOf(response)).toContain('; Secure');
    expect(response.headers['strict-transport-security']).toMatch(/^max-age=\d+/);
    await secure.close();
  });

  test('a wrong password and an unknown address get the same answer', async () => {
    const wrong = await signIn({ email: address, password: 'not the password' });
    const unknown = await signIn({ email: 'nobody@brackwater.example', password: demoPassword });
    expect(wrong.status).toBe(401);
    expect(wrong.body).toEqual({
      type: 'about:blank',
      title: 'Unauthorized',
      status: 401,
      code: 'signed-out',
      detail: 'The e-mail address or the password is not right.',
    });
    expect(unknown.status).toBe(401);
    expect(unknown.body).toEqual(wrong.body);
    expect(setCookieOf(unknown)).toBe('');
  });

  test('what is missing from a sign-in is named by its field', async () => {
    const response = await signIn({ email: 'ada', password: '', remember: true });
    expect(response.status).toBe(422);
    expect(response.body.issues.map(({ path }: { path: string }) => path).toSorted()).toEqual([
      'email',
      'password',
      'remember',
    ]);
  });

  test('the session tells who is signed in until they sign out', async () => {
    const cookie = await app.signIn(address);
    const current = await app.get('/api/session', cookie);
    expect(current.status).toBe(200);
    expect(current.body.email).toBe(address);

    const signedOut = await app.request('delete', '/api/session', cookie);
    expect(signedOut.status).toBe(204);
    expect(setCookieOf(signedOut)).toContain('steelyard_session=; Path=/; Expires=Thu, 01 Jan 1970');
    expect((await app.get('/api/session', cookie)).status).toBe(401);
    expect(await app.em.fork().count(Session)).toBe(0);
  });

  test('signing in again ends the session that was open in the same browser', async () => {
    const former = await app.signIn(address);
    const response = await app
      .request('post', '/api/session', former)
      .send({ email: address, password: demoPassword });
    expect(cookieOf(response)).not.toBe(former);
    expect((await app.get('/api/session', former)).status).toBe(401);
    expect((await app.get('/api/session', cookieOf(response))).status).toBe(200);
  });

  test('a session ends after 30 days, however busy', async () => {
    const cookie = await app.signIn(address);
    for (let days = 0; days < 29; days += 1) {
      app.clock.advance(day);
      expect((await app.get('/api/session', cookie)).status).toBe(200);
    }
    app.clock.advance(day - 1);
    expect((await app.get('/api/session', cookie)).status).toBe(200);
    app.clock.advance(1);
    expect((await app.get('/api/session', cookie)).status).toBe(401);
  });

  test('a session ends after 7 days without a request', async () => {
    const cookie = await app.signIn(address);
    app.clock.advance(7 * day - minute);
    expect((await app.get('/api/session', cookie)).status).toBe(200);
    app.clock.advance(7 * day);
    expect((await app.get('/api/session', cookie)).status).toBe(401);
  });

  test('sessions that have ended are forgotten at the next sign-in', async () => {
    await app.signIn(address);
    app.clock.advance(8 * day);
    await app.signIn(address);
    expect(await app.em.fork().count(Session)).toBe(1);
  });

  test('the database holds neither a password nor a token', async () => {
    const cookie = await app.signIn(address);
    const token = cookie.replace('steelyard_session=', '');
    const person = await app.em.fork().findOneOrFail(Person, { email: address });
    const [session] = await app.em.fork().findAll(Session);
    expect(person.passwordHash).toMatch(/^\$argon2id\$v=19\$m=19456,t=2,p=1\$/);
    expect(session?.id).toBe(createHash('sha256').update(token).digest('hex'));
  });

  test('a made-up token opens nothing', async () => {
    expect((await app.get('/api/session', 'steelyard_session=made-up')).status).toBe(401);
  });
});
