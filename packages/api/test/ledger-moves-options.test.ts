import type { WeighView } from '../src/contract/design-sets.js';
import type { PlanningValueView } from '../src/contract/studies.js';
import { Team } from './support/team.js';

describe('The ICC of the ledger', () => {
  let team: Team;

  beforeAll(async () => {
    team = await Team.start();
    for (const clusterSize of [20, 60]) {
      const structure = { allocation: [1, 1] };
      const plan = { family: 'cluster', treatments: [0, 1], structure, clusterSize, overrides: {} };
      const response = await team.ask('post', '/options', { name: `Clusters of ${clusterSize}`, plan });
      expect(response.status).toBe(201);
    }
  });

  afterAll(() => team.app.close());

  const setIcc = async (value: number) => {
    const { values }: { values: PlanningValueView[] } = await team.read('/planning-values');
    const icc = values.find(({ key }) => key === 'icc');
    const { id: _, setBy: __, setAt: ___, ...line } = icc as PlanningValueView;
    const response = await team.ask('put', '/planning-values', { ...line, value });
    expect([response.status, response.body.value]).toEqual([200, value]);
  };

  test('moves every cluster option and no other, and set back restores each to 12 digits', async () => {
    const before: WeighView = await team.read('/weigh');
    await setIcc(0.05);
    const during: WeighView = await team.read('/weigh');
    await setIcc(0.04);
    const after: WeighView = await team.read('/weigh');

    const isCluster = ({ request }: WeighView['options'][number]) =>
      'icc' in ((request?.design as object | undefined) ?? {});
    expect(before.options.map(isCluster)).toEqual([true, true, true, false, false, true, true]);
    for (const [place, option] of before.options.entries()) {
      const moved = during.options[place];
      expect(option.error).toBeNull();
      if (isCluster(option)) {
        expect(moved?.appraisal).not.toEqual(option.appraisal);
        expect(moved?.appraisal?.clusters).toBeGreaterThanOrEqual(option.appraisal?.clusters as number);
      } else expect(moved).toEqual(option);
    }
    expect(after).toEqual(before);
  });
});
