import type { StudyView } from '../src/contract/studies.js';
import { Team } from './support/team.js';

describe('The question', () => {
  let team: Team;

  beforeAll(async () => {
    team = await Team.start();
  });

  afterAll(() => team.app.close());

  const question = async (changes: object = {}) => {
    const study: StudyView = await team.read('');
    const { version, name, organisation, question, outcomeLabel, outcomeUnit, plan } = study;
    const { basis, estimand, participants, clusters, treatments } = study;
    const words = { name, organisation, question, outcomeLabel, outcomeUnit, participants, clusters };
    return { version, ...words, plan, basis, estimand, treatments, ...changes };
  };
  const put = async (changes: object) =>
    team.ask('put', '/question', await question(changes), 'investigator');

  test('takes an estimand by its attributes and the basis of the difference, and keeps both', async () => {
    const estimand = {
      population: 'Girls of 10 to 15 years enrolled at a school of the catchment',
      treatment: 'The programme as offered',
      variable: 'Haemoglobin at 4 months',
      intercurrentEvents: [{ event: 'Moving to another catchment', strategy: 'treatment-policy' }],
      summary: 'Difference of means',
    };
    const basis = { kind: 'both', toWhom: 'The health cooperative', why: 'Seen in two districts' };
    const response = await put({ estimand, basis });
    expect(response.status).toBe(200);
    expect(response.body).toMatchObject({ version: 2, estimand, basis });
    expect(await team.read('', 'reader')).toMatchObject({ version: 2, estimand, basis });
  });

  test('answers a change to a past version with the study as it is', async () => {
    const response = await put({ version: 1, name: 'Another name' });
    expect(response.status).toBe(409);
    expect(response.body).toMatchObject({ code: 'stale', current: { version: 2, name: 'Greenkettle' } });
    expect(response.body.current).toEqual(await team.read('', 'investigator'));
  });

  test('moves every option with its target difference', async () => {
    const before = (await team.read('/weigh')).options[0].appraisal.clusters;
    const { plan } = await question();
    await put({ plan: { ...plan, outcome: { ...plan.outcome, difference: 4 } } });
    expect((await team.read('/weigh')).options[0].appraisal.clusters).toBeLessThan(before);
  });

  const { outcome, test: asked } = {
    outcome: { kind: 'continuous', difference: 3, better: 'higher' },
    test: { hypothesis: 'superiority', alpha: 0.05, sides: 2 },
  };
  const wrong: [string, object, string][] = [
    [
      'no difference',
      { plan: { outcome: { ...outcome, difference: 0 }, test: asked } },
      'plan.outcome.difference',
    ],
    ['an alpha of 2', { plan: { outcome, test: { ...asked, alpha: 2 } } }, 'plan.test.alpha'],
    [
      'text for a number',
      { plan: { outcome: { ...outcome, difference: 'three' }, test: asked } },
      'plan.outcome.difference',
    ],
    ['one treatment', { treatments: [{ name: 'Alone' }] }, 'treatments'],
    [
      'a strategy of no guideline',
      {
        estimand: {
          population: '',
          treatment: '',
          variable: '',
          summary: '',
          intercurrentEvents: [{ event: 'Death', strategy: 'hope' }],
        },
      },
      'estimand.intercurrentEvents.0.strategy',
    ],
    ['a field that is none', { colour: 'brass' }, 'colour'],
  ];
  test.each(wrong)('refuses %s at its field', async (_, changes, path) => {
    const response = await put(changes);
    expect(response.status).toBe(422);
    expect(response.body.issues.map((issue: { path: string }) => issue.path)).toEqual([path]);
  });
});
