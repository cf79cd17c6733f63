import type { AuditEntryView, AuditView } from '../src/contract/audit.js';
import { Team } from './support/team.js';
import { minute } from './support/test-clock.js';

describe('The history of a study', () => {
  let team: Team;

  beforeAll(async () => {
    team = await Team.start();
  });

  afterAll(() => team.app.close());

  const history = async (page = ''): Promise<AuditView> => team.read(`/history${page}`, 'reader');
  const last = async () => (await history('?limit=1')).entries[0] as AuditEntryView;

  test('tells a second person who set what, when, from what to what', async () => {
    const { values } = await team.read('/planning-values');
    const icc = values.find(({ key }: { key: string }) => key === 'icc');
    team.app.clock.advance(minute);
    const { id, setBy: _, setAt: __, ...same } = icc;
    const change = await team.ask('put', '/planning-values', {
      ...same,
      value: 0.05,
      source: 'Second pilot',
    });
    expect(change.status).toBe(200);
    expect(change.body).toMatchObject({ id, version: 2, value: 0.05 });
    expect(await last()).toEqual({
      id: expect.any(Number),
      at: team.app.clock.now().toISOString(),
      by: 'Jun Oyelaran',
      action: 'changed',
      what: 'planning value “ICC”',
      before: {
        value: 0.04,
        source: 'Pilot of 8 catchments: Beta(1.7, 32), median 0.042; the range holds nine tenths of it',
      },
      after: { value: 0.05, source: 'Second pilot' },
    });
  });

  test('tells each cost line that changed by its path, and none that did not', async () => {
    const { version, costs, timeline } = await team.read('/costs');
    const changed = { version, costs: { ...costs, perClusterPeriod: [900, 5000] }, timeline };
    expect((await team.ask('put', '/costs', changed, 'investigator')).status).toBe(200);
    expect(await last()).toMatchObject({
      by: 'Amara Doss',
      before: { 'costs.perClusterPeriod.1': 4700 },
      after: { 'costs.perClusterPeriod.1': 5000 },
    });
  });

  test('gains no entry by a change that is refused, or that changes nothing', async () => {
    const { entries } = await history('?limit=200');
    const costs = await team.read('/costs');
    expect((await team.ask('put', '/costs', { ...costs, version: 1 })).status).toBe(409);
    expect((await team.ask('put', '/costs', costs, 'reader')).status).toBe(403);
    expect((await team.ask('put', '/costs', costs)).status).toBe(200);
    expect((await history('?limit=200')).entries).toEqual(entries);
  });

  test('is read page by page without a gap, newest first', async () => {
    const { entries, next } = await history('?limit=200');
    expect(next).toBeNull();
    const times = entries.map(({ at }) => at);
    expect(times).toEqual(times.toSorted().toReversed());
    const paged: AuditEntryView[] = [];
    for (let before: number | null = 0; before !== null; ) {
      const page: AuditView = await history(`?limit=3${before ? `&before=${before}` : ''}`);
      paged.push(...page.entries);
      before = page.next;
    }
    expect(paged).toEqual(entries);
    expect(entries.at(-1)).toMatchObject({ action: 'created', by: 'Jun Oyelaran' });
  });

  test('says where a page cannot be', async () => {
    expect((await team.ask('get', '/history?limit=many')).status).toBe(422);
    expect((await team.ask('get', '/history?before=999999')).status).toBe(404);
  });

  test('is no part of the site’s audit', async () => {
    const site = await team.app.get('/api/audit', team.cookies.administrator);
    expect(site.status).toBe(200);
    expect(JSON.stringify(site.body)).not.toContain('ICC');
    expect((await team.app.get('/api/audit', team.cookies.methodologist)).status).toBe(403);
  });
});
