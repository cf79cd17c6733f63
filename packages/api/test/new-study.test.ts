import type { LedgerView } from '../src/contract/studies.js';
import { addPerson } from './support/people.js';
import { TestApp } from './support/test-app.js';

const address = 'ada.merrow@elsewhere.example';

const start = {
  name: 'Newfield',
  organisation: 'Merrow Institute',
  question: 'Does walking in company lower blood pressure by 5 mmHg?',
  outcome: {
    kind: 'continuous',
    label: 'Systolic blood pressure',
    unit: 'mmHg',
    better: 'lower',
    difference: -5,
  },
  sd: 15,
  participants: { one: 'walker', many: 'walkers' },
  clusters: null,
  treatments: [{ name: 'Leaflet' }, { name: 'Walking group' }],
};

describe('A new study', () => {
  let app: TestApp;
  let cookie: string;

  beforeAll(async () => {
    app = await TestApp.start();
    await addPerson(app, address);
    cookie = await app.signIn(address);
  });

  afterAll(() => app.close());

  const post = (changes: object = {}) =>
    app.request('post', '/api/studies', cookie).send({ ...start, ...changes });
  /** Answers with how the study it makes is read, room by room. */
  const created = async (changes: object = {}) => {
    const response = await post(changes);
    expect([response.status, response.body.issues]).toEqual([201, undefined]);
    return (room: string) => app.get(`/api/studies/${response.body.id}${room}`, cookie);
  };
  const ledger = async (read: Awaited<ReturnType<typeof created>>) => {
    const { values }: LedgerView = (await read('/planning-values')).body;
    return Object.fromEntries(values.map(({ key, value, source }) => [key, [value, source]]));
  };
  const assumed = 'assumed, replace';

  test('is its creator’s, in their words', async () => {
    const read = await created();
    expect((await read('')).body).toMatchObject({
      version: 1,
      name: 'Newfield',
      role: 'methodologist',
      fictional: false,
      outcomeUnit: 'mmHg',
      plan: {
        outcome: { kind: 'continuous', difference: -5, better: 'lower' },
        test: { hypothesis: 'superiority', alpha: 0.05, sides: 2 },
      },
      participants: { one: 'walker', many: 'walkers' },
      members: [{ role: 'methodologist', person: { name: 'Ada Merrow' } }],
    });
  });

  test('is filled with values marked as assumed, beside those that were entered', async () => {
    const read = await created();
    expect(await ledger(read)).toEqual({
      sd: [15, 'Entered with the new study'],
      baselineCorrelation: [0.5, assumed],
      withinPersonCorrelation: [0.5, assumed],
      attrition: [0.1, assumed],
    });
    expect((await read('/costs')).body).toMatchObject({
      version: 1,
      source: assumed,
      costs: { currency: 'EUR' },
    });
    expect((await read('/limits')).body).toEqual({ version: null, limits: {} });
    const { values } = (await read('/planning-values')).body;
    expect((await read(`/planning-values/${values[0].id}/history`)).body.entries).toMatchObject([
      { version: 1, value: 15 },
    ]);
    expect((await read('/history')).body.entries).toMatchObject([{ action: 'created', by: 'Ada Merrow' }]);
  });

  test('has a first option that can be weighed at once', async () => {
    const read = await created();
    const { options } = (await read('/weigh')).body;
    expect(options).toMatchObject([{ letter: 'A', name: 'Parallel', error: null }]);
    // Two-sided 5 %, power 90 %, SD 15, difference 5: 191 in each arm by R's power.t.test (190.1 rounded up).
    expect(options[0].appraisal).toMatchObject({ feasible: true, participants: 382 });
  });

  test('of clusters has a cluster option and the planning values it draws on', async () => {
    const read = await created({ clusters: { one: 'village', many: 'villages' }, randomises: 'clusters' });
    expect(await ledger(read)).toMatchObject({ icc: [0.05, assumed], clusterSizeCv: [0.3, assumed] });
    const { options } = (await read('/weigh')).body;
    expect(options).toMatchObject([{ name: 'Cluster', error: null, appraisal: { feasible: true } }]);
  });

  test('of a proportion has a control proportion, and takes the test and power that are stated', async () => {
    const outcome = { kind: 'binary', label: 'Readmission', unit: '', better: 'lower', difference: -0.1 };
    const changes = { outcome, sd: undefined, test: { alpha: 0.025, sides: 1 }, power: 0.8 };
    const read = await created({ ...changes, controlProportion: 0.4 });
    expect(await ledger(read)).toEqual({
      controlProportion: [0.4, 'Entered with the new study'],
      attrition: [0.1, assumed],
    });
    expect((await read('')).body.plan.test).toEqual({ hypothesis: 'superiority', alpha: 0.025, sides: 1 });
    expect((await read('/design-set')).body.hold).toEqual({ kind: 'power', power: 0.8 });
    expect((await read('/weigh')).body.options[0].error).toBeNull();
    const withoutProportion = await created(changes);
    expect((await withoutProportion('/weigh')).body.options[0].error).toBeNull();
  });

  const binary = { kind: 'binary', label: 'Readmission', unit: '', difference: -0.1 };
  const wrong: [string, object, string][] = [
    ['no difference', { outcome: { ...start.outcome, difference: 0 } }, 'outcome.difference'],
    ['text for a difference', { outcome: { ...start.outcome, difference: '5' } }, 'outcome.difference'],
    [
      'a difference of proportions above 1',
      { outcome: { ...binary, difference: 1.5 }, sd: undefined },
      'outcome.difference',
    ],
    ['an SD of 0', { sd: 0 }, 'sd'],
    ['an SD of a proportion', { outcome: binary }, 'sd'],
    [
      'proportions beyond 0',
      { outcome: binary, sd: undefined, controlProportion: 0.05 },
      'controlProportion',
    ],
    ['a power of 1', { power: 1 }, 'power'],
    ['clusters without a name', { randomises: 'clusters' }, 'clusters'],
    [
      'clusters of ordered categories',
      {
        outcome: {
          kind: 'ordinal',
          label: 'Scale',
          unit: '',
          oddsRatio: 2,
          controlProbabilities: [0.5, 0.5],
        },
        sd: undefined,
        clusters: { one: 'village', many: 'villages' },
        randomises: 'clusters',
      },
      'randomises',
    ],
    ['one treatment', { treatments: [{ name: 'Leaflet' }] }, 'treatments'],
    ['no question', { question: '' }, 'question'],
    ['a field that is none', { colour: 'brass' }, 'colour'],
  ];
  test.each(wrong)('is refused with %s, at its field', async (_, changes, path) => {
    const response = await post(changes);
    expect(response.status).toBe(422);
    expect(response.body.issues.map((issue: { path: string }) => issue.path)).toEqual([path]);
  });
});
