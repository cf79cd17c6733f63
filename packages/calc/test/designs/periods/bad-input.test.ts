import { describe, expect, it } from 'vitest';
import { type AppraisalRequest, appraise, type CalcErrorCode } from '../../../src/index.js';
import { errorOf, withField } from '../../faults.js';
import { abba, twoMeans } from '../../requests.js';

const shared = { icc: 0.05, cac: 0.8, clusterSize: 10 };
const wedge: AppraisalRequest = { ...twoMeans, design: { family: 'stepped-wedge', steps: 4, ...shared } };
const baseline: AppraisalRequest = { ...twoMeans, design: { family: 'cluster-baseline', ...shared } };
const crossed: AppraisalRequest = { ...twoMeans, design: { family: 'cluster-crossover', ...shared } };
const schedule: AppraisalRequest = {
  ...twoMeans,
  design: {
    family: 'cluster-schedule',
    schedule: [
      [0, 0, 1],
      [0, 1, 1],
    ],
    ...shared,
  },
};
const williams: AppraisalRequest = {
  ...twoMeans,
  design: { family: 'crossover', sequences: ['ABC', 'BCA', 'CAB'], correlation: 0.5 },
};
const pairs: AppraisalRequest = { ...abba, outcome: { kind: 'binary', control: 0.2, active: 0.4 } };
const comparisons = { against: 'control', adjust: 'none', powerGoal: 'per-comparison' };

const faults: [AppraisalRequest, string, unknown, CalcErrorCode][] = [
  [wedge, 'design.icc', undefined, 'schema'],
  [wedge, 'design.icc', 1.01, 'schema'],
  [wedge, 'design.icc', -0.01, 'schema'],
  [wedge, 'design.cac', undefined, 'schema'],
  [wedge, 'design.cac', 1.01, 'schema'],
  [wedge, 'design.cac', '1', 'schema'],
  [wedge, 'design.iac', 1, 'schema'],
  [wedge, 'design.iac', -0.1, 'schema'],
  [wedge, 'design.decay', 1, 'schema'],
  [wedge, 'design.clusterSize', 0, 'schema'],
  [wedge, 'design.clusterSizeCv', -0.1, 'schema'],
  [wedge, 'design.clustersizeCv', 0.4, 'schema'],
  [wedge, 'design.steps', 0, 'schema'],
  [wedge, 'design.steps', 1.5, 'schema'],
  [wedge, 'design.steps', 61, 'schema'],
  [wedge, 'design.steps', 60, 'schema'],
  [wedge, 'design.steps', 1, 'not-estimable'],
  [wedge, 'design.baselinePeriods', -1, 'schema'],
  [wedge, 'design.transitionPeriods', 0.5, 'schema'],
  [wedge, 'design.allocation', [1, 1, 1], 'schema'],
  [wedge, 'design.allocation', [1, 1, 1, 0], 'schema'],
  [wedge, 'aim.units', 0, 'schema'],
  [wedge, 'outcome.sdActive', 3, 'unsupported'],
  [wedge, 'outcome.repeated', { baselines: 1, followUps: 1, correlation: 0.5 }, 'unsupported'],
  [wedge, 'outcome', { kind: 'count', controlRate: 1, rateRatio: 0.7, exposure: 1 }, 'unsupported'],
  [baseline, 'design.allocation', [1, 1, 1], 'schema'],
  [crossed, 'design.schedule', [[0, 1]], 'schema'],
  [crossed, 'outcome', { kind: 'binary', control: 0.2, active: 0.4, method: 'pooled' }, 'unsupported'],
  [schedule, 'design.schedule', [], 'schema'],
  [schedule, 'design.schedule', [[]], 'schema'],
  [schedule, 'design.schedule', [[0, 1], [1]], 'schema'],
  [
    schedule,
    'design.schedule',
    [
      [0, 2],
      [1, 0],
    ],
    'schema',
  ],
  [
    schedule,
    'design.schedule',
    [
      [0, 1],
      [null, null],
    ],
    'schema',
  ],
  [schedule, 'design.schedule', [[0, 1]], 'not-estimable'],
  [
    schedule,
    'design.schedule',
    [
      [0, 1],
      [0, 1],
    ],
    'not-estimable',
  ],
  [
    schedule,
    'design.schedule',
    [
      [0, null],
      [null, 1],
    ],
    'not-estimable',
  ],
  [schedule, 'design.schedule', Array(61).fill([0, 1]), 'schema'],
  [williams, 'design.sequences', [], 'schema'],
  [williams, 'design.sequences', ['ABC', 'BA'], 'schema'],
  [williams, 'design.sequences', ['ABD', 'BDA'], 'schema'],
  [williams, 'design.sequences', ['BC', 'CB'], 'schema'],
  [williams, 'design.sequences', ['AA', 'AA'], 'schema'],
  [williams, 'design.sequences', ['ABC', 'ABC'], 'not-estimable'],
  [williams, 'design.sequences', ['AB', 'BC'], 'not-estimable'],
  [williams, 'design.correlation', -0.5, 'impossible-correlation'],
  [williams, 'design.comparisons', { ...comparisons, adjust: 'holm' }, 'unsupported'],
  [williams, 'design.comparisons', { ...comparisons, against: 'all-pairs' }, 'unsupported'],
  [williams, 'design.comparisons', { ...comparisons, powerGoal: 'disjunctive' }, 'unsupported'],
  [williams, 'design.comparisons.effects', [5], 'schema'],
  [pairs, 'design.sequences', ['ABC', 'BCA', 'CAB'], 'unsupported'],
  [pairs, 'design.correlation', 0.8, 'impossible-correlation'],
  [pairs, 'design.correlation', -0.6, 'impossible-correlation'],
  [pairs, 'outcome.method', 'pooled', 'unsupported'],
  [pairs, 'test.reference', 't', 'unsupported'],
  [pairs, 'design.sequences', ['ABB', 'BAA'], 'unsupported'],
];

describe('a request of a design over periods that breaks a bound', () => {
  it.each(faults)('is refused at its field, fault %#', (request, path, value, code) => {
    const error = errorOf(withField(request, path, value));
    const parent = path.split('.').slice(0, 2).join('.');
    expect([error.code, error.message]).toEqual([code, expect.stringMatching(/[.]$/)]);
    expect(error.path.startsWith(parent), `${error.path} for ${path}`).toBe(true);
  });

  it('is refused when it asks for fewer clusters than leave a degree of freedom', () => {
    for (const [request, units] of [
      [crossed, 1],
      [baseline, 1],
    ] as const) {
      const error = errorOf({ ...request, aim: { find: 'power', units } });
      expect([error.code, error.path]).toEqual(['too-few-units', 'aim.units']);
    }
  });

  it('says why a carryover cannot be estimated in AB/BA, and where to look where treatment cannot', () => {
    expect(errorOf(withField(abba, 'design.carryover', true))).toMatchObject({
      code: 'not-estimable',
      path: 'design.carryover',
      message: expect.stringContaining('ABB'),
    });
    expect(errorOf(withField(abba, 'design.sequences', ['AB', 'AB']))).toMatchObject({
      path: 'design.sequences',
      message: expect.stringContaining('B from A'),
    });
  });

  it('names the row of a schedule that is wrong', () => {
    const ragged = withField(schedule, 'design.schedule', [
      [0, 1, 1],
      [0, 0, 1],
      [0, 1],
    ]);
    expect(errorOf(ragged).path).toBe('design.schedule.2');
    const odd = withField(schedule, 'design.schedule', [
      [0, 1],
      [3, 0],
    ]);
    expect(errorOf(odd).path).toBe('design.schedule.1.0');
  });
});

describe('a bound of a design over periods', () => {
  it.each([
    [crossed, 2],
    [wedge, 1],
    [schedule, 2],
  ] as const)('lets the fewest clusters with a degree of freedom through, %#', (request, units) => {
    expect(appraise({ ...request, aim: { find: 'power', units } })).toMatchObject({ feasible: true });
  });

  it('lets a wedge without a baseline through, and correlations at their ends', () => {
    for (const part of [
      { baselinePeriods: 0 },
      { icc: 0 },
      { icc: 1 },
      { cac: 0 },
      { cac: 1 },
      { iac: 0.99 },
    ]) {
      const request = { ...wedge, design: { ...wedge.design, ...part } } as AppraisalRequest;
      expect(appraise({ ...request, aim: { find: 'power', units: 3 } })).toMatchObject({ feasible: true });
    }
  });
});
