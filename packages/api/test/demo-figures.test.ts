import type { Feasible } from '@steelyard/calc';
import type { WeighView } from '../src/contract/design-sets.js';
import type { demoPeople } from '../src/demo/people.js';
import { email } from './support/people.js';
import { TestApp } from './support/test-app.js';

interface Figures {
  option: string;
  analysed: number[];
  recruited: number;
  /** Given to three decimals where it is more than the one aimed at. */
  power?: number;
  euro: number;
  months: number;
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
    headline: 'A takes 1,760 girls, 715 k€ and 17 months.',
    figures: [
      {
        option: 'Cluster, end only',
        analysed: [880, 880],
        recruited: 1760,
        power: 0.813,
        euro: 715_320,
        months: 17,
      },
    ],
  },
  {
    name: 'Nimblegrip',
    methodologist: 'aalderink',
    aim: 0.9,
    headline: 'At power 90 % C costs least, ends first and recruits the fewest participants.',
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
      for (const [place, { analysed, recruited, power, euro, months }] of figures.entries()) {
        const appraisal = options[place]?.appraisal as unknown as Feasible;
        const nearest = euro % 1000 === 0 ? 1000 : 1;
        expect(appraisal.groups.map(({ participants }) => participants)).toEqual(analysed);
        expect(appraisal.recruited).toBe(recruited);
        expect(Math.round((appraisal.costs?.total ?? 0) / nearest) * nearest).toBe(euro);
        expect(Math.round(appraisal.timeline?.months ?? 0)).toBe(months);
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
