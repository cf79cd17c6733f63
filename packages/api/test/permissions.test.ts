import { randomUUID } from 'node:crypto';
import { Study } from '../src/studies/study.entity.js';
import { addPerson, email } from './support/people.js';
import { TestApp } from './support/test-app.js';

const rooms = ['', '/planning-values', '/costs', '/design-set', '/weigh'];

describe('What each person may see', () => {
  let app: TestApp;
  let stillfoot: string;

  beforeAll(async () => {
    app = await TestApp.start({ seeded: true });
    await addPerson(app, 'ada@merrow.example');
    const study = await app.em.fork().findOneOrFail(Study, { name: 'Stillfoot' });
    stillfoot = study.id;
  });

  afterAll(() => app.close());

  const listed = (cookie: string) => app.get('/api/studies', cookie);
  const part = (role: string, mayOpen: boolean) => [{ name: 'Stillfoot', role, mayOpen }];

  const people: [who: string, address: string, studies: object[], status: number][] = [
    ['the methodologist sees all of the draft', email('arrivel'), part('methodologist', true), 200],
    ['the investigator sees all of the draft', email('quennell'), part('investigator', true), 200],
    ['a reader sees all of the draft', email('brannick'), part('reader', true), 200],
    [
      'the funder sees that there is a study, and none of its draft',
      email('venn'),
      part('funder', false),
      404,
    ],
    ['an administrator sees no study', email('wexley'), [], 404],
    ['a person without a part sees no study', 'ada@merrow.example', [], 404],
  ];

  test.each(people)('%s', async (_, address, studies, status) => {
    const cookie = await app.signIn(address);
    const list = await listed(cookie);
    expect(list.status).toBe(200);
    expect(list.body.studies).toHaveLength(studies.length);
    expect(list.body.studies).toMatchObject(studies);
    for (const room of rooms) {
      const response = await app.get(`/api/studies/${stillfoot}${room}`, cookie);
      expect([room, response.status]).toEqual([room, status]);
      if (status === 404) expect(response.body.detail).toBe('There is no such study.');
    }
  });

  test('a member of another study is told that there is none', async () => {
    const cookie = await app.signIn(email('oyelaran'));
    const [{ id }] = (await listed(cookie)).body.studies;
    expect((await app.get(`/api/studies/${id}`, cookie)).status).toBe(200);
    for (const room of rooms) {
      expect((await app.get(`/api/studies/${stillfoot}${room}`, cookie)).status).toBe(404);
    }
  });

  test('a study that does not exist answers as one that may not be seen', async () => {
    const cookie = await app.signIn(email('venn'));
    const hidden = await app.get(`/api/studies/${stillfoot}`, cookie);
    for (const id of [randomUUID(), 'no-id', '%00', "' or 1 = 1"]) {
      const none = await app.get(`/api/studies/${encodeURIComponent(id)}`, cookie);
      expect(none.status).toBe(404);
      expect(none.body).toEqual(hidden.body);
    }
  });
});
