import { mkdtemp, readdir, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { MikroORM } from '@mikro-orm/sqlite';
import { ormOptions } from '../src/orm-options.js';
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
    expect((await migrator.getExecutedMigrations()).map(({ name }) => name)).toEqual([
      '20251201-foundation',
      '20251208-decisions',
    ]);
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

describe('A database of the version before', () => {
  test('keeps its planning values, each with what is known of its history', async () => {
    const orm = await MikroORM.init(ormOptions(':memory:'));
    const migrator = orm.getMigrator();
    await migrator.up({ to: '20251201-foundation' });
    const em = orm.em.fork();
    await em.execute("insert into person values ('p', 1, 1, 1, 'Ada', 'ada@merrow.example', 'x', 0)");
    await em.execute(
      "insert into study values ('s', 1, 1, 1, 'Newfield', 'Merrow', 0, '?', 'Pain', '', '{}', '[]', '{}', null)",
    );
    await em.execute(
      "insert into planning_value values ('v', 3, 1, 77, 's', 'sd', 'every-family', 2.1, null, 2.4, 'Pilot', 'p')",
    );
    await migrator.up();
    const revisions = await em.execute('select * from planning_value_revision');
    expect(revisions).toEqual([
      {
        id: 1,
        planning_value_id: 'v',
        version: 3,
        value: 2.1,
        low: null,
        high: 2.4,
        source: 'Pilot',
        set_by_id: 'p',
        set_at: 77,
      },
    ]);
    await orm.close();
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
