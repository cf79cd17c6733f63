import { randomUUID } from 'node:crypto';
import type { OptionView } from '../src/contract/design-sets.js';
import { Team } from './support/team.js';

const cluster = {
  family: 'cluster',
  treatments: [0, 1],
  structure: { allocation: [1, 1] },
  clusterSize: 40,
  overrides: {},
};

describe('Options', () => {
  let team: Team;

  beforeEach(async () => {
    team = await Team.start();
  });

  afterEach(() => team.app.close());

  const add = async (name: string, plan: object = cluster): Promise<OptionView> => {
    const response = await team.ask('post', '/options', { name, plan }, 'investigator');
    expect(response.status).toBe(201);
    return response.body;
  };
  const ids = async () => (await team.designSet()).options.map(({ id }) => id);

  test('are added, changed and duplicated, each with its version', async () => {
    const option = await add('Larger clusters', { ...cluster, clusterSize: 60 });
    const changed = await team.ask('put', `/options/${option.id}`, {
      name: 'Larger',
      plan: { ...cluster, clusterSize: 50 },
      version: 1,
    });
    expect(changed.body).toMatchObject({ version: 2, name: 'Larger', plan: { clusterSize: 50 } });
    const copy = await team.ask('post', `/options/${option.id}/duplicate`);
    expect(copy.status).toBe(201);
    expect(copy.body).toMatchObject({
      version: 1,
      name: 'Copy of Larger',
      plan: changed.body.plan,
      ruling: null,
    });
    const order = await ids();
    expect(order.indexOf(copy.body.id)).toBe(order.indexOf(option.id) + 1);
  });

  test('changed by two at once keep the first, and give the second both', async () => {
    const { id, version, name, plan } = await team.firstOption();
    const [first, second] = await Promise.all([
      team.ask('put', `/options/${id}`, { version, name: 'By the first', plan }),
      team.ask('put', `/options/${id}`, { version, name: 'By the second', plan }, 'investigator'),
    ]);
    const [won, lost] = first.status === 200 ? [first, second] : [second, first];
    expect([won.status, lost.status]).toEqual([200, 409]);
    expect(lost.body).toMatchObject({ code: 'stale', current: won.body });
    expect(await team.firstOption()).toEqual(won.body);
    expect(name).not.toBe(won.body.name);
  });

  test('removed come back to their place with all they had', async () => {
    const before = await ids();
    const { id, version } = await team.firstOption();
    const removed = await team.ask('delete', `/options/${id}`, { version });
    expect(removed.status).toBe(200);
    const { options, removed: bin } = await team.designSet();
    expect(options.map((option) => option.id)).toEqual(before.slice(1));
    expect(bin).toMatchObject([{ id, version: version + 1, removedAt: team.app.clock.now().toISOString() }]);
    expect(
      (await team.ask('put', `/options/${id}`, { ...removed.body, id: undefined, ruling: undefined })).status,
    ).toBe(404);
    const restored = await team.ask('post', `/options/${id}/restore`, { version: removed.body.version });
    expect(restored.status).toBe(200);
    expect(await ids()).toEqual(before);
    expect((await team.designSet()).removed).toEqual([]);
  });

  test('take their letters from the order that is set', async () => {
    const added = await add('Another');
    const { version, hold, options } = await team.designSet();
    const order = options.map(({ id }) => id).toReversed();
    const response = await team.ask('put', '/design-set', { version, hold, order });
    expect(response.status).toBe(200);
    const weighed = (await team.read('/weigh')).options;
    expect(weighed[0]).toMatchObject({ letter: 'A', optionId: added.id });
    for (const wrong of [order.slice(1), [...order, randomUUID()], [...order.slice(1), order[1]]]) {
      const refused = await team.ask('put', '/design-set', { version: version + 1, hold, order: wrong });
      expect(refused.body).toMatchObject({ status: 422, issues: [{ path: 'order' }] });
    }
    const late = await team.ask('put', '/design-set', { version, hold, order });
    expect(late.body).toMatchObject({ code: 'stale', current: { version: version + 1 } });
  });

  test('are ruled on by the methodologist with a reason, which anyone on the study can read', async () => {
    const { id, version } = await team.firstOption();
    const ruling = { kind: 'not-admissible', reason: 'The canteen is shared.' };
    const path = `/options/${id}/ruling`;
    expect((await team.ask('put', path, { ...ruling, version }, 'investigator')).status).toBe(403);
    expect((await team.ask('put', path, { ...ruling, reason: ' ', version })).body.issues).toMatchObject([
      { path: 'reason' },
    ]);
    expect((await team.ask('put', path, { ...ruling, version })).status).toBe(200);
    const { options } = await team.read('/design-set', 'reader');
    expect(options[0].ruling).toEqual({
      ...ruling,
      by: 'Jun Oyelaran',
      at: team.app.clock.now().toISOString(),
    });
    expect((await team.read('/weigh')).options[0].ruling).toEqual(ruling);
  });

  test('come with a ruling from whoever may rule, and from nobody else', async () => {
    const ruling = { kind: 'conditions', reason: 'Only if delivery in groups turns out to be needed.' };
    const body = { name: 'Ruled from the start', plan: cluster, ruling };
    expect((await team.ask('post', '/options', body, 'investigator')).status).toBe(403);
    expect(
      (await team.ask('post', '/options', { ...body, ruling: { ...ruling, reason: '' } })).body.issues,
    ).toMatchObject([{ path: 'ruling.reason' }]);
    const added = await team.ask('post', '/options', body);
    expect(added.body).toMatchObject({ version: 1, ruling: { ...ruling, by: 'Jun Oyelaran' } });
    const history = (await team.read('/history', 'reader')).entries;
    expect(history.slice(0, 2).map(({ action }: { action: string }) => action)).toEqual([
      'ruled on',
      'added',
    ]);
  });

  test('may be drafts: what a plan lacks is told where it is weighed', async () => {
    const { id } = await add('No size yet', { ...cluster, clusterSize: undefined });
    const weighed = (await team.read('/weigh')).options.find(
      (option: { optionId: string }) => option.optionId === id,
    );
    expect(weighed).toMatchObject({ appraisal: null, error: { path: 'design.clusterSize' } });
  });

  const wrong: [string, object, string][] = [
    ['a share below 0', { structure: { allocation: [1, -1] } }, 'plan.structure.allocation.1'],
    ['an unknown part of the structure', { structure: { wedge: true } }, 'plan.structure.wedge'],
    ['text for a size', { clusterSize: 'forty' }, 'plan.clusterSize'],
    ['a cluster of nobody', { clusterSize: 0 }, 'plan.clusterSize'],
    ['a cluster beyond all measure', { clusterSize: 1e300 }, 'plan.clusterSize'],
    ['half a cluster', { units: 2.5 }, 'plan.units'],
    ['one cluster in each arm', { units: 1 }, 'plan.units'],
    [
      'an override that cannot be',
      { overrides: { icc: { value: 2, reason: 'Guess' } } },
      'plan.overrides.icc.value',
    ],
    [
      'an override without a reason',
      { overrides: { icc: { value: 0.1, reason: '' } } },
      'plan.overrides.icc.reason',
    ],
    ['a treatment that the study has not', { treatments: [0, 7] }, 'plan.treatments'],
    ['a family that is none', { family: 'lottery' }, 'plan.family'],
  ];
  test('refuse impossible figures at their fields', async () => {
    const before = await ids();
    for (const [what, changes, path] of wrong) {
      const response = await team.ask('post', '/options', {
        name: 'Wrong',
        plan: { ...cluster, ...changes },
      });
      const paths = (response.body.issues ?? []).map((issue: { path: string }) => issue.path);
      expect([what, response.status, paths[0]]).toEqual([what, 422, path]);
    }
    expect(await ids()).toEqual(before);
  });

  test('of absurd sizes, or of treatments without a price, are weighed as well as they can be', async () => {
    await add('Absurd', { ...cluster, clusterSize: 1e9, units: 1e9 });
    const { version: studyVersion, ...study } = await team.read('');
    const { name, organisation, question, outcomeLabel, outcomeUnit, participants, clusters } = study;
    const words = { name, organisation, question, outcomeLabel, outcomeUnit, participants, clusters };
    const plan = {
      outcome: { kind: 'binary', difference: 0.1 },
      test: { hypothesis: 'superiority', alpha: 0.05, sides: 2 },
    };
    const treatments = [...study.treatments, { name: 'Meals alone' }];
    const basis = null;
    const changed = { version: studyVersion, ...words, plan, treatments, basis, estimand: null };
    expect((await team.ask('put', '/question', changed)).status).toBe(200);
    await add('New treatment', { ...cluster, treatments: [0, 2] });
    const { version, options } = await team.designSet();
    const order = options.map(({ id }) => id);
    const { options: unstated } = await team.read('/weigh');
    expect(unstated.map(({ error }: { error: unknown }) => error)).toEqual(
      options.map(() => expect.objectContaining({ path: expect.stringMatching(/^outcome/) })),
    );
    const sizes = await team.ask('put', '/design-set', {
      version,
      hold: { kind: 'sizes', power: 0.8 },
      order,
    });
    expect(sizes.status).toBe(200);
    const line = {
      key: 'controlProportion',
      family: null,
      value: 0.3,
      low: null,
      high: null,
      source: 'Register',
    };
    expect((await team.ask('put', '/planning-values', { ...line, version: null })).status).toBe(200);
    const { options: weighed } = await team.read('/weigh');
    expect(weighed.at(-1).error.path).toMatch(/^costs|^aim/);
    expect(weighed.find(({ name }: { name: string }) => name === 'Absurd')).toMatchObject({
      error: null,
      appraisal: { clusters: 2e9 },
    });
  });

  test('of other studies are not found', async () => {
    for (const id of [randomUUID(), 'no-id', '%00']) {
      expect(
        (await team.ask('put', `/options/${id}`, { version: 1, name: 'Foreign', plan: cluster })).status,
      ).toBe(404);
      expect((await team.ask('delete', `/options/${id}`, { version: 1 })).status).toBe(404);
    }
  });
});
