import { DemoSeeder } from '../src/demo/demo-seeder.js';
import { demoPassword, demoPeople } from '../src/demo/people.js';
import { Person } from '../src/people/person.entity.js';
import { Study } from '../src/studies/study.entity.js';
import { addPerson, email } from './support/people.js';
import { TestApp } from './support/test-app.js';
import { day } from './support/test-clock.js';

describe('Seeding the demo', () => {
  let app: TestApp;
  let seeder: DemoSeeder;

  beforeEach(async () => {
    app = await TestApp.start();
    seeder = app.nest.get(DemoSeeder);
  });

  afterEach(() => app.close());

  const studyNames = async () => (await app.em.fork().findAll(Study)).map(({ name }) => name).toSorted();

  test('gives three fictional studies, each with a methodologist, an investigator, a funder and a reader', async () => {
    await seeder.seed();
    expect(await studyNames()).toEqual(['Greenkettle', 'Nimblegrip', 'Stillfoot']);
    for (const key of ['arrivel', 'oyelaran', 'aalderink'] as const) {
      const cookie = await app.signIn(email(key));
      const [summary] = (await app.get('/api/studies', cookie)).body.studies;
      const study = (await app.get(`/api/studies/${summary.id}`, cookie)).body;
      expect(study).toMatchObject({ fictional: true, version: 1, role: 'methodologist' });
      expect(study.members.map(({ role }: { role: string }) => role)).toEqual([
        'methodologist',
        'investigator',
        'funder',
        'reader',
      ]);
    }
  });

  test('lists its accounts with their parts for the sign-in page', async () => {
    await seeder.seed();
    const { body } = await app.get('/api/access');
    expect(body.firstVisit).toBe(false);
    expect(body.demo.password).toBe(demoPassword);
    expect(body.demo.accounts).toHaveLength(Object.keys(demoPeople).length);
    expect(body.demo.accounts).toContainEqual({
      name: 'Tomas Arrivel',
      email: 'tomas.arrivel@brackwater.example',
      part: 'Methodologist, Stillfoot',
    });
  });

  test('spreads its entries over the weeks before it', async () => {
    await seeder.seed();
    const now = app.clock.now().getTime();
    const cookie = await app.signIn(email('arrivel'));
    const [summary] = (await app.get('/api/studies', cookie)).body.studies;
    const { values } = (await app.get(`/api/studies/${summary.id}/planning-values`, cookie)).body;
    const ages = values.map(({ setAt }: { setAt: string }) => (now - Date.parse(setAt)) / day);
    expect(Math.max(...ages)).toBeLessThan(60);
    expect(Math.min(...ages)).toBeGreaterThan(14);
    expect(new Set(ages.map(Math.round)).size).toBeGreaterThanOrEqual(4);
    expect(summary.changedAt).toMatch(/^2026-02-28T(0[89]|1[0-7]):/);
  });

  test('keeps each planning value’s source, author and range', async () => {
    await seeder.seed();
    const cookie = await app.signIn(email('brannick'));
    const [summary] = (await app.get('/api/studies', cookie)).body.studies;
    const { values } = (await app.get(`/api/studies/${summary.id}/planning-values`, cookie)).body;
    expect(values.map(({ key, family, value }: Record<string, unknown>) => [key, family, value])).toEqual([
      ['sd', null, 2.1],
      ['baselineCorrelation', null, 0.55],
      ['withinPersonCorrelation', null, 0.6],
      ['attrition', null, 0.12],
      ['attrition', 'crossover', 0.2],
    ]);
    expect(values[0]).toMatchObject({
      version: 1,
      source: 'Pilot of 30: 1.9, taken up to its upper limit',
      setBy: 'Tomas Arrivel',
    });
    expect(values[2]).toMatchObject({ low: 0.4, high: 0.75 });
  });

  test('is needed by an empty database, and by none that has people', async () => {
    expect(await seeder.isNeeded()).toBe(true);
    await addPerson(app, 'ada@merrow.example');
    expect(await seeder.isNeeded()).toBe(false);
  });

  test('is done again where it was cut short', async () => {
    await seeder.seed();
    expect(await seeder.isNeeded()).toBe(false);
    await app.em.fork().execute('pragma user_version = 1');
    expect(await seeder.isNeeded()).toBe(true);
    await seeder.seed();
    expect(await seeder.isNeeded()).toBe(false);
    expect(await studyNames()).toHaveLength(3);
  });

  test('again empties what there was: sessions, people and studies', async () => {
    await seeder.seed();
    await addPerson(app, 'ada@merrow.example');
    const cookie = await app.signIn('ada@merrow.example');
    await seeder.seed();
    expect((await app.get('/api/session', cookie)).status).toBe(401);
    expect(await app.em.fork().count(Person)).toBe(Object.keys(demoPeople).length);
    expect(await studyNames()).toHaveLength(3);
  });

  test('may not empty a database that people other than the demo’s began', async () => {
    expect(await seeder.mayEmpty()).toBe(true);
    await addPerson(app, 'ada@merrow.example', true);
    expect(await seeder.mayEmpty()).toBe(false);
  });

  test('shows no accounts where the database was not seeded', async () => {
    await addPerson(app, 'ada@merrow.example', true);
    expect((await app.get('/api/access')).body).toEqual({ firstVisit: false, demo: null });
  });
});
