import type { PlanningValueView } from '../src/contract/studies.js';
import { Team } from './support/team.js';
import { day } from './support/test-clock.js';

describe('The ledger', () => {
  let team: Team;

  beforeAll(async () => {
    team = await Team.start('Stillfoot');
  });

  afterAll(() => team.app.close());

  const ledgerLine = async (key: string, family: string | null = null): Promise<PlanningValueView> => {
    const { values } = await team.read('/planning-values');
    return values.find((value: PlanningValueView) => value.key === key && value.family === family);
  };
  const set = (value: object) => team.ask('put', '/planning-values', value);
  const sd = {
    key: 'sd',
    family: null,
    value: 2.2,
    low: null,
    high: null,
    source: 'Second pilot',
    version: 1,
  };

  test('keeps every version of a value with who set it, when and why', async () => {
    const { id } = await ledgerLine('sd');
    team.app.clock.advance(day);
    await set(sd);
    const { entries } = await team.read(`/planning-values/${id}/history`, 'reader');
    expect(entries).toMatchObject([
      {
        version: 2,
        value: 2.2,
        source: 'Second pilot',
        setBy: 'Tomas Arrivel',
        setAt: team.app.clock.now().toISOString(),
      },
      { version: 1, value: 2.1, source: 'Pilot of 30: 1.9, taken up to its upper limit' },
    ]);
  });

  test('answers a change to a past version with the value as it is', async () => {
    const response = await set({ ...sd, value: 2.3 });
    expect(response.status).toBe(409);
    expect(response.body.current).toEqual(await ledgerLine('sd'));
  });

  test('gives a family’s own value up again, so that the general one holds', async () => {
    const { id, version } = await ledgerLine('attrition', 'crossover');
    const recruited = async () => (await team.read('/weigh')).options[2].appraisal.recruited;
    const before = await recruited();
    expect((await team.ask('delete', `/planning-values/${id}`, { version: version + 1 })).status).toBe(409);
    expect((await team.ask('delete', `/planning-values/${id}`, { version })).status).toBe(204);
    expect(await ledgerLine('attrition', 'crossover')).toBeUndefined();
    expect(await recruited()).toBeLessThan(before);
    expect((await team.ask('delete', `/planning-values/${id}`, { version })).status).toBe(404);
    expect((await team.ask('get', `/planning-values/${id}/history`)).status).toBe(404);
  });

  test('keeps a value that speaks for every family', async () => {
    const { id, version } = await ledgerLine('attrition');
    const response = await team.ask('delete', `/planning-values/${id}`, { version });
    expect(response.status).toBe(422);
    expect(await ledgerLine('attrition')).toBeDefined();
  });

  const wrong: [string, object, string][] = [
    ['an SD of 0', { value: 0 }, 'value'],
    ['an SD below 0', { value: -2 }, 'value'],
    ['an SD beyond all measure', { value: 1e300 }, 'value'],
    ['text for a number', { value: '2.2' }, 'value'],
    ['a range that leaves the value out', { low: 3 }, 'value'],
    ['a low that cannot be', { low: -1 }, 'low'],
    ['a control proportion of 1', { key: 'controlProportion', value: 1 }, 'value'],
    ['a control proportion of 0', { key: 'controlProportion', value: 0 }, 'value'],
    ['an ICC above 1', { key: 'icc', value: 1.2 }, 'value'],
    ['an ICC below 0', { key: 'icc', value: -0.1 }, 'value'],
    ['a correlation of 1', { key: 'baselineCorrelation', value: 1 }, 'value'],
    ['attrition of 100 %', { key: 'attrition', value: 1 }, 'value'],
    ['a family that does not draw on it', { key: 'icc', value: 0.1, family: 'parallel' }, 'family'],
    ['a family that is none', { family: 'lottery' }, 'family'],
    ['no source', { source: '' }, 'source'],
    ['no version', { version: undefined }, 'version'],
  ];
  test.each(wrong)('refuses %s at its field', async (_, changes, path) => {
    const response = await set({ ...sd, ...changes });
    expect(response.status).toBe(422);
    expect(response.body.issues.map((issue: { path: string }) => issue.path)).toEqual([path]);
  });
});
