import { mkdtemp, readdir, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { MikroORM } from '@mikro-orm/sqlite';
import { Membership } from '../src/studies/membership.entity.js';
import { Study } from '../src/studies/study.entity.js';
import { email } from './support/people.js';
import { TestApp } from './support/test-app.js';

const pragma = async (app: TestApp, name: string) => {
  const [row = {}] = await app.em.fork().execute<Record<string, unknown>[]>(`pragma ${name}`);
  return Object.values(row)[0];
};

describe('The migrations', () => {
  let app: TestApp;

  beforeAll(async () => {
    app = await TestApp.start();
  });

  afterAll(() => app.close());

  test('bring an empty database to what the entities describe', async () => {
    const migrator = app.nest.get(MikroORM).getMigrator();
    expect(await migrator.checkMigrationNeeded()).toBe(false);
    expect(await migrator.getPendingMigrations()).toEqual([]);
    expect((await migrator.getExecutedMigrations()).map(({ name }) => name)).toEqual(['20251201-foundation']);
  });

  test('let the database refuse what breaks a reference', async () => {
    const em = app.em.fork();
    const orphan = { id: 'm', study: 'no study', person: 'no person', role: 'reader' as const };
    await expect(em.insert(Membership, orphan)).rejects.toThrow('FOREIGN KEY constraint failed');
  });

  test('let the database refuse a role that is none', async () => {
    const statement =
      "insert into membership (id, study_id, person_id, role) values ('m', 'no study', 'no person', 'owner')";
    await expect(app.em.fork().execute(statement)).rejects.toThrow('CHECK constraint failed');
  });
});

describe('A database in a file', () => {
  let folder: string;

  beforeEach(async () => {
    folder = await mkdtemp(join(tmpdir(), 'steelyard-test-'));
  });

  afterEach(() => rm(folder, { recursive: true }));

  const start = (seeded: boolean) =>
    TestApp.start({ seeded, settings: { database: join(folder, 'data', 'steelyard.sqlite') } });

  test('writes ahead, waits for the disk and keeps references', async () => {
    const app = await start(false);
    expect(await pragma(app, 'journal_mode')).toBe('wal');
    expect(await pragma(app, 'synchronous')).toBe(2);
    expect(await pragma(app, 'foreign_keys')).toBe(1);
    expect(await pragma(app, 'busy_timeout')).toBe(5000);
    await app.close();
  });

  test('opened again, has every study as it was, and whoever was signed in still is', async () => {
    const first = await start(true);
    const cookie = await first.signIn(email('aalderink'));
    const [{ id }] = (await first.get('/api/studies', cookie)).body.studies;
    const rooms = ['', '/planning-values', '/costs', '/design-set', '/weigh'].map(
      (room) => `/api/studies/${id}${room}`,
    );
    const read = async (app: TestApp) =>
      Promise.all(rooms.map(async (room) => (await app.get(room, cookie)).body));
    const before = await read(first);
    await first.close();
    expect(await readdir(join(folder, 'data'))).toEqual(['steelyard.sqlite']);

    const second = await start(false);
    expect(await read(second)).toEqual(before);
    expect(before[2]).toMatchObject({ costs: { perExposure: [12, 101, 177, 329] } });
    expect(await second.em.fork().count(Study)).toBe(3);
    await second.close();
  });
});
