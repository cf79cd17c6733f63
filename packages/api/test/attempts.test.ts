import { addPerson } from './support/people.js';
import { TestApp } from './support/test-app.js';

describe('Attempts to get in', () => {
  let app: TestApp;

  beforeEach(async () => {
    app = await TestApp.start();
  });

  afterEach(() => app.close());

  const attempt = (email: string) =>
    app.request('post', '/api/session').send({ email, password: 'a wild guess' });

  const expectTooMany = (response: Awaited<ReturnType<typeof attempt>>) => {
    expect(response.status).toBe(429);
    expect(response.type).toBe('application/problem+json');
    expect(response.body).toMatchObject({ status: 429, code: 'too-many-attempts' });
    const seconds = response.body.retryAfterSeconds;
    expect(seconds).toBeGreaterThanOrEqual(1);
    expect(seconds).toBeLessThanOrEqual(60);
    expect(response.headers['retry-after']).toBe(String(seconds));
  };

  test('the eleventh within a minute at one account is refused, the right password included', async () => {
    const address = 'ada.merrow@brackwater.example';
    await addPerson(app, address);
    for (let attempts = 0; attempts < 10; attempts += 1) {
      expect((await attempt(attempts % 2 ? address : address.toUpperCase())).status).toBe(401);
    }
    expectTooMany(await attempt(address));
    expect((await attempt('somebody.else@brackwater.example')).status).toBe(401);
  });

  test('the hundred and first within a minute from one address is refused, whatever the accounts', async () => {
    for (let attempts = 0; attempts < 100; attempts += 1) {
      expect((await attempt(`not an address ${attempts}`)).status).toBe(422);
    }
    expectTooMany(await attempt('somebody.else@brackwater.example'));
  });

  test('guesses of the first visit’s code are counted too', async () => {
    const visit = {
      code: 'guess',
      name: 'Ada Merrow',
      email: 'ada@merrow.example',
      password: 'long enough for all',
    };
    for (let attempts = 0; attempts < 10; attempts += 1) {
      expect((await app.request('post', '/api/first-visit').send(visit)).status).toBe(422);
    }
    expectTooMany(await app.request('post', '/api/first-visit').send(visit));
  });
});
