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
 * and to a whole month, where they end in zeros).
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
    headline: 'Only B fits every limit.',
    figures: [
      {
        option: 'Cluster, end only',
        analysed: [880, 880],
        recruited: 1760,
        power: 0.813,
        euro: 715_320,
        months: 17,
      },
      {
        option: 'Cluster with baseline',
        analysed: [1200, 1200],
        recruited: 2400,
        power: 0.804,
        euro: 652_800,
        months: 20,
      },
      {
        option: 'Stepped wedge, 4 steps',
        analysed: [625, 625, 625, 625],
        recruited: 2500,
        power: 0.852,
        euro: 819_400,
        months: 32,
      },
      { option: 'Individual randomisation', analysed: [296, 296], recruited: 592, ruledOut: true },
      // By base R: qt, and pt with ncp, at SE = 13·√(2(1 − 0.5)/N) on N − 2 df.
      { option: 'Crossover', analysed: [75, 75], recruited: 150, power: 0.802, ruledOut: true },
    ],
  },
  {
    name: 'Nimblegrip',
    methodologist: 'aalderink',
    aim: 0.9,
    headline: 'A, D and E fit every limit; E costs least, ends first and recruits the fewest participants.',
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
        option: 'Four equal arms, Dunnett',
        analysed: [160, 160, 160, 160],
        recruited: 728,
        euro: 696_000,
        months: 51,
      },
      {
        option: 'Four arms, larger control, Dunnett',
        analysed: [220, 128, 128, 128],
        recruited: 688,
        euro: 664_000,
        months: 49,
      },
      {
        option: 'Three arms, larger control, Dunnett',
        analysed: [179, 127, 127],
        recruited: 494,
        euro: 580_000,
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
        figures.map(({ option }, place) => ['ABCDEF'.charAt(place), option, null]),
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
    expect(verdict.detail).toContain(
      'C costs 19\u202fk€ too much and ends 2 months late. D and E are ruled out',
    );
    expect(options[3]?.ruling?.reason).toContain('canteen is shared');
  });

  test('Greenkettle at sizes as entered', async () => {
    const cookie = await app.signIn(email('doss'));
    const [study] = (await app.get('/api/studies', cookie)).body.studies;
    const room = (path: string) => `/api/studies/${study.id}${path}`;
    const { version, options } = (await app.get(room('/design-set'), cookie)).body as DesignSetView;
    const [cluster, baseline, wedge] = options as [OptionView, OptionView, OptionView];
    for (const [option, units] of [
      [cluster, 16],
      [baseline, 16],
      [wedge, 4],
    ] as const) {
      const sized = { version: option.version, name: option.name, plan: { ...option.plan, units } };
      await app.request('put', room(`/options/${option.id}`), cookie).send(sized);
    }
    const order = options.map(({ id }) => id);
    await app
      .request('put', room('/design-set'), cookie)
      .send({ version, hold: { kind: 'sizes', power: 0.8 }, order });
    const weighed = (await app.get(room('/weigh'), cookie)).body as WeighView;
    const [endOnly, withBaseline, stepped] = weighed.options.map(
      ({ appraisal }) => appraisal as unknown as Feasible,
    ) as [Feasible, Feasible, Feasible];
    expect(endOnly).toMatchObject({ clusters: 32, clusterSize: 40, measurements: 1280 });
    expect(endOnly.power).toBeCloseTo(0.672, 3);
    expect(withBaseline).toMatchObject({ clusters: 32, measurements: 2560 });
    expect(withBaseline.power).toBeCloseTo(0.831, 3);
    expect(withBaseline.costs?.total).toBeCloseTo(674_720, 6);
    expect(stepped).toMatchObject({ clusters: 16, measurements: 2000 });
    expect(stepped.power).toBeCloseTo(0.752, 3);
  });

  test('with reals of 12 significant digits, and requests as they were computed', async () => {
    const cookie = await app.signIn(email('aalderink'));
    const [study] = (await app.get('/api/studies', cookie)).body.studies;
    const { options } = (await app.get(`/api/studies/${study.id}/weigh`, cookie)).body as WeighView;
    const threeArms = options.at(-1) as unknown as { request: object; appraisal: Feasible };
    const { power, standardError } = threeArms.appraisal;
    for (const real of [power, standardError]) expect(real).toBe(Number(real.toPrecision(12)));
    expect(threeArms.request).toMatchObject({ design: { allocation: [Math.SQRT2, 1, 1] } });
  });
});
