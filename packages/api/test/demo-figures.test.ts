import type { Feasible, Standing } from '@steelyard/calc';
import type { DesignSetView, OptionView, WeighView } from '../src/contract/design-sets.js';
import type { demoPeople } from '../src/demo/people.js';
import { email } from './support/people.js';
import { TestApp } from './support/test-app.js';

interface Figures {
  option: string;
  analysed: number[];
  recruited: number;
  /** Given to three decimals where it is more than the one aimed at. */
  power?: number;
  /** What it costs and takes is stated of options that may be chosen. */
  euro?: number;
  months?: number;
  ruledOut?: true;
}

interface Study {
  name: string;
  methodologist: keyof typeof demoPeople;
  aim: number;
  headline: string;
  figures: Figures[];
}

/**
 * Sizes and powers were computed in R from the written formulas, money and months added by hand (to a thousand
 * and to a whole month, where they end in zeros). Nimblegrip's three arms are those of reference/three-arms.R.
 */
const studies: Study[] = [
  {
    name: 'Stillfoot',
    methodologist: 'arrivel',
    aim: 0.9,
    headline: 'At power 90 % C costs least, ends first and recruits the fewest participants.',
    figures: [
      { option: 'Parallel, unadjusted', analysed: [94, 94], recruited: 214, euro: 490_000, months: 41 },
      {
        option: 'Parallel, baseline-adjusted',
        analysed: [66, 66],
        recruited: 150,
        euro: 446_000,
        months: 31,
      },
      { option: 'Crossover', analysed: [20, 20], recruited: 50, euro: 333_000, months: 18 },
    ],
  },
  {
    name: 'Greenkettle',
    methodologist: 'oyelaran',
    aim: 0.8,
    headline: 'No option fits every limit.',
    figures: [
      {
        option: 'Cluster, end only',
        analysed: [880, 880],
        recruited: 1760,
        power: 0.813,
        euro: 715_320,
        months: 17,
      },
      { option: 'Individual randomisation', analysed: [296, 296], recruited: 592, ruledOut: true },
    ],
  },
  {
    name: 'Nimblegrip',
    methodologist: 'aalderink',
    aim: 0.9,
    headline: 'A and C fit every limit; C costs least, ends first and recruits the fewest participants.',
    figures: [
      {
        option: 'Four equal arms, no adjustment',
        analysed: [128, 128, 128, 128],
        recruited: 584,
        euro: 632_000,
        months: 44,
      },
      {
        option: 'Four equal arms, Bonferroni',
        analysed: [164, 164, 164, 164],
        recruited: 748,
        euro: 705_000,
        months: 52,
      },
      {
        option: 'Three arms, larger control, Bonferroni',
        analysed: [182, 129, 129],
        recruited: 501,
        power: 0.901,
        euro: 583_384,
        months: 40,
      },
    ],
  },
];

describe('The demo weighs', () => {
  let app: TestApp;

  beforeAll(async () => {
    app = await TestApp.start({ seeded: true });
  });

  afterAll(() => app.close());

  test.each(studies)(
    '$name as it was computed elsewhere',
    async ({ methodologist, aim, headline, figures }) => {
      const cookie = await app.signIn(email(methodologist));
      const [study] = (await app.get('/api/studies', cookie)).body.studies;
      const response = await app.get(`/api/studies/${study.id}/weigh`, cookie);
      expect(response.status).toBe(200);
      const { verdict, options } = response.body as WeighView;

      expect(verdict.headline.replaceAll('\u202f', ' ')).toBe(headline);
      expect(options.map(({ letter, name, error }) => [letter, name, error])).toEqual(
        figures.map(({ option }, place) => ['ABC'.charAt(place), option, null]),
      );
      for (const [place, { analysed, recruited, power, euro, months, ruledOut }] of figures.entries()) {
        const appraisal = options[place]?.appraisal as unknown as Feasible;
        expect(appraisal.groups.map(({ participants }) => participants)).toEqual(analysed);
        expect(appraisal.recruited).toBe(recruited);
        expect(options[place]?.ruling?.kind === 'not-admissible').toBe(ruledOut ?? false);
        if (euro !== undefined) {
          const nearest = euro % 1000 === 0 ? 1000 : 1;
          expect(Math.round((appraisal.costs?.total ?? 0) / nearest) * nearest).toBe(euro);
        }
        if (months !== undefined) expect(Math.round(appraisal.timeline?.months ?? 0)).toBe(months);
        expect(appraisal.power).toBeGreaterThanOrEqual(aim);
        if (power !== undefined) expect(appraisal.power).toBeCloseTo(power, 3);
      }
    },
  );

  test('Greenkettle with 44 catchments of 40', async () => {
    const cookie = await app.signIn(email('oyelaran'));
    const [study] = (await app.get('/api/studies', cookie)).body.studies;
    const { options } = (await app.get(`/api/studies/${study.id}/weigh`, cookie)).body as WeighView;
    expect(options[0]?.appraisal).toMatchObject({ clusters: 44, clusterSize: 40, measurements: 1760 });
  });

  test('Greenkettle against its limits: 12 catchments too many, 72.6 % with 60 girls in each of 32', async () => {
    const cookie = await app.signIn(email('tarvin'));
    const [study] = (await app.get('/api/studies', cookie)).body.studies;
    const { verdict, options } = (await app.get(`/api/studies/${study.id}/weigh`, cookie)).body as WeighView;
    const standing = options[0]?.standing as unknown as Standing;
    expect(standing.breaches).toEqual([{ limit: 'clusters', allowed: 32, taken: 44, over: 12 }]);
    expect(standing.within).toMatchObject({ clusters: 32, clusterSize: 60 });
    expect(standing.within?.power).toBeCloseTo(0.726, 3);
    expect(verdict.detail).toContain('A needs 12 catchments that do not exist');
    expect(verdict.detail).toContain('B is ruled out');
    expect(options[1]?.ruling?.reason).toContain('canteen is shared');
  });

  test('Greenkettle at sizes as entered: 67.2 % with 40 girls in each of 32 catchments', async () => {
    const cookie = await app.signIn(email('doss'));
    const [study] = (await app.get('/api/studies', cookie)).body.studies;
    const room = (path: string) => `/api/studies/${study.id}${path}`;
    const { version, options } = (await app.get(room('/design-set'), cookie)).body as DesignSetView;
    const [cluster] = options as [OptionView];
    const sized = { version: cluster.version, name: cluster.name, plan: { ...cluster.plan, units: 16 } };
    await app.request('put', room(`/options/${cluster.id}`), cookie).send(sized);
    const order = options.map(({ id }) => id);
    await app
      .request('put', room('/design-set'), cookie)
      .send({ version, hold: { kind: 'sizes', power: 0.8 }, order });
    const weighed = (await app.get(room('/weigh'), cookie)).body as WeighView;
    const appraisal = weighed.options[0]?.appraisal as unknown as Feasible;
    expect(appraisal).toMatchObject({ clusters: 32, clusterSize: 40, measurements: 1280 });
    expect(appraisal.power).toBeCloseTo(0.672, 3);
  });

  test('with reals of 12 significant digits, and requests as they were computed', async () => {
    const cookie = await app.signIn(email('aalderink'));
    const [study] = (await app.get('/api/studies', cookie)).body.studies;
    const { options } = (await app.get(`/api/studies/${study.id}/weigh`, cookie)).body as WeighView;
    const [, , threeArms] = options as [unknown, unknown, { request: object; appraisal: Feasible }];
    const { power, standardError } = threeArms.appraisal;
    for (const real of [power, standardError]) expect(real).toBe(Number(real.toPrecision(12)));
    expect(threeArms.request).toMatchObject({ design: { allocation: [Math.SQRT2, 1, 1] } });
  });
});
