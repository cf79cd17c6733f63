import { demoPassword } from '../src/demo/people.js';
import { addPerson } from './support/people.js';
import { TestApp } from './support/test-app.js';

const address = 'ada.merrow@brackwater.example';

describe('A change asked for by a page', () => {
  let app: TestApp;

  beforeAll(async () => {
    app = await TestApp.start({ settings: { url: 'https://steelyard.example' } });
    await addPerson(app, address);
  });

  afterAll(() => app.close());

  const signIn = (headers: Record<string, string>) =>
    app.request('post', '/api/session').set(headers).send({ email: address, password: demoPassword });

  const foreign: [string, Record<string, string>][] = [
    ['another origin', { Origin: 'https://elsewhere.example' }],
    ['the same host on another port', { Host: '127.0.0.1:4310', Origin: 'http://127.0.0.1:9999' }],
    ['an origin the browser hides', { Origin: 'null' }],
    ['another site', { 'Sec-Fetch-Site': 'cross-site' }],
    ['a neighbour of the same site', { 'Sec-Fetch-Site': 'same-site' }],
    [
      'its own address, with a foreign origin',
      { 'Sec-Fetch-Site': 'same-origin', Origin: 'https://elsewhere.example' },
    ],
  ];

  test.each(foreign)('of %s is refused', async (_, headers) => {
    const response = await signIn(headers);
    expect(response.status).toBe(403);
    expect(response.type).toBe('application/problem+json');
    expect(response.body).toMatchObject({ code: 'forbidden' });
    expect(response.headers['set-cookie']).toBeUndefined();
  });

  test('is refused to a person who is signed in, and their session stays', async () => {
    const cookie = await app.signIn(address);
    const response = await app
      .request('delete', '/api/session', cookie)
      .set('Origin', 'https://elsewhere.example');
    expect(response.status).toBe(403);
    expect((await app.get('/api/session', cookie)).status).toBe(200);
  });

  const own: [string, Record<string, string>][] = [
    [
      'of its own host',
      { Host: '127.0.0.1:4310', Origin: 'http://127.0.0.1:4310', 'Sec-Fetch-Site': 'same-origin' },
    ],
    ['of the address in the settings', { Host: '127.0.0.1:4310', Origin: 'https://steelyard.example' }],
    ['of no browser', {}],
  ];

  test.each(own)('%s is accepted', async (_, headers) => {
    expect((await signIn(headers)).status).toBe(201);
  });

  test('is no matter where nothing changes', async () => {
    const response = await app.get('/api/health').set('Origin', 'https://elsewhere.example');
    expect(response.status).toBe(200);
    expect(response.headers['access-control-allow-origin']).toBeUndefined();
  });
});
