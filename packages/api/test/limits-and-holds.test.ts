import { Team } from './support/team.js';

describe('Limits and holds', () => {
  let team: Team;

  beforeAll(async () => {
    team = await Team.start();
  });

  afterAll(() => team.app.close());

  test('under which an option stands are told beside it', async () => {
    const { version } = await team.read('/limits');
    const limits = { clusters: 32, participantsPerCluster: 60, money: 800_000, months: 30 };
    const response = await team.ask('put', '/limits', { version, limits }, 'investigator');
    expect(response.body).toEqual({ version: (version ?? 0) + 1, limits });
    expect((await team.ask('put', '/limits', { version, limits })).body.current).toEqual(response.body);
    // 44 catchments of 40 reach 80 %; 32 reach 67.2 %, and 72.6 % with 60 each: computed in R.
    const { standing } = (await team.read('/weigh')).options[0];
    expect(standing).toMatchObject({
      fits: false,
      reachesPower: true,
      breaches: [{ limit: 'clusters', taken: 44, allowed: 32, over: 12 }],
    });
    expect(standing.within).toMatchObject({ clusters: 32, clusterSize: 60 });
    expect(standing.within.power).toBeCloseTo(0.726, 3);
  });

  test('keep power, a budget or the sizes as entered', async () => {
    const { version, options } = await team.designSet();
    const order = options.map(({ id }) => id);
    const hold = { kind: 'budget', power: 0.8, budget: 500_000 };
    expect((await team.ask('put', '/design-set', { version, hold, order })).body.hold).toEqual(hold);
    const { appraisal } = (await team.read('/weigh')).options[0];
    expect(appraisal.costs.total).toBeLessThanOrEqual(500_000);
    const broke = await team.ask('put', '/design-set', {
      version: version + 1,
      hold: { kind: 'budget', power: 0.8, budget: -1 },
      order,
    });
    expect(broke.body.issues).toMatchObject([{ path: 'hold.budget' }]);
  });

  test.each([
    ['below 1 cluster', { clusters: 0 }, 'limits.clusters'],
    ['part of a cluster', { clusters: 3.5 }, 'limits.clusters'],
    ['money below 0', { money: -1 }, 'limits.money'],
    ['text', { months: 'thirty' }, 'limits.months'],
    ['of something unknown', { patience: 3 }, 'limits.patience'],
  ])('refuse %s', async (_, limits, path) => {
    const { version } = await team.read('/limits');
    expect((await team.ask('put', '/limits', { version, limits })).body).toMatchObject({
      status: 422,
      issues: [{ path }],
    });
  });
});
