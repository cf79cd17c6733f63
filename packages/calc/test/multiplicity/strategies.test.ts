import { readFileSync } from 'node:fs';
import fc from 'fast-check';
import { describe, expect, it, vi } from 'vitest';
import {
  type AppraisalRequest,
  appraise,
  CalcError,
  type Comparisons,
  curve,
  type Feasible,
} from '../../src/index.js';
import { runs } from '../arbitrary-requests.js';
import { clusters, feasible } from '../requests.js';

// Whole counts take their time on a busy machine.
vi.setConfig({ testTimeout: 120_000 });

type Adjustment = Comparisons['adjust'];
type Goal = Comparisons['powerGoal'];

const adjustments: Adjustment[] = ['none', 'bonferroni', 'holm', 'dunnett', 'fixed-sequence'];
const goals: Goal[] = ['per-comparison', 'disjunctive', 'conjunctive'];

interface Setting {
  allocation: number[];
  effects: number[];
  sides: 1 | 2;
  alpha: number;
  units: number;
  normal: boolean;
}

const settings: fc.Arbitrary<Setting> = fc.integer({ min: 2, max: 4 }).chain((active) =>
  fc.record({
    allocation: fc.array(fc.double({ min: 0.3, max: 3, noNaN: true }), {
      minLength: active + 1,
      maxLength: active + 1,
    }),
    effects: fc.array(
      fc
        .tuple(fc.double({ min: 1, max: 9, noNaN: true }), fc.boolean())
        .map(([size, up]) => (up ? size : -size)),
      { minLength: active, maxLength: active },
    ),
    sides: fc.constantFrom(1 as const, 2 as const),
    alpha: fc.constantFrom(0.001, 0.025, 0.05, 0.1),
    units: fc.integer({ min: 20, max: 120 }),
    normal: fc.boolean(),
  }),
);

const asked = (
  { allocation, effects, sides, alpha, units, normal }: Setting,
  adjust: Adjustment,
  powerGoal: Goal = 'per-comparison',
): AppraisalRequest => ({
  outcome: { kind: 'continuous', difference: 5, sd: 10 },
  test: { hypothesis: 'superiority', alpha, sides, ...(normal ? { reference: 'normal' as const } : {}) },
  design: {
    family: 'multi-arm',
    allocation,
    comparisons: { against: 'control', adjust, powerGoal, effects },
  },
  aim: { find: 'power', units },
});

const each = (answer: Feasible) => answer.comparisons.map(({ power }) => power);
const joint = ({ disjunctivePower = Number.NaN, conjunctivePower = Number.NaN }: Feasible) => ({
  any: disjunctivePower,
  all: conjunctivePower,
});
const slack = 1e-10;

function expectAlike(found: number[], powers: number[]): void {
  const differences = found.map((power, index) => Math.abs(power - (powers[index] as number)));
  expect(Math.max(...differences)).toBeLessThan(slack);
}

describe('comparisons with one control', () => {
  it('succeed all together less often than any of them, and at least one more often', () => {
    fc.assert(
      fc.property(settings, fc.constantFrom(...adjustments), (setting, adjust) => {
        const answer = feasible(asked(setting, adjust));
        const { any, all } = joint(answer);
        expect(all).toBeLessThanOrEqual(Math.min(...each(answer)) + slack);
        expect(any).toBeGreaterThanOrEqual(Math.max(...each(answer)) - slack);
        expect(any).toBeLessThanOrEqual(1);
        expect(all).toBeGreaterThanOrEqual(0);
      }),
      runs(100),
    );
  });

  it('have as their power that of the goal, and the rest unchanged by it', () => {
    fc.assert(
      fc.property(settings, fc.constantFrom(...adjustments), (setting, adjust) => {
        const [one, any, all] = goals.map((goal) => feasible(asked(setting, adjust, goal))) as [
          Feasible,
          Feasible,
          Feasible,
        ];
        expect(one.power).toBe(Math.min(...each(one)));
        expect(any.power).toBe(any.disjunctivePower);
        expect(all.power).toBe(all.conjunctivePower);
        for (const answer of [any, all]) {
          expect({ ...answer, power: 0 }).toEqual({ ...one, power: 0 });
        }
      }),
      runs(100),
    );
  });

  it('need less of each statistic under Dunnett than under Bonferroni, and more than alone', () => {
    fc.assert(
      fc.property(settings, (setting) => {
        const of = (adjust: Adjustment) => feasible(asked(setting, adjust)).criticalValue;
        expect(of('dunnett')).toBeLessThanOrEqual(of('bonferroni') * (1 + slack));
        expect(of('dunnett')).toBeGreaterThan(of('none'));
        expect(of('holm')).toBe(of('bonferroni'));
        expect(of('fixed-sequence')).toBe(of('none'));
      }),
      runs(100),
    );
  });

  it('gain by stepping down, never lose', () => {
    fc.assert(
      fc.property(settings, (setting) => {
        const bonferroni = feasible(asked(setting, 'bonferroni'));
        const holm = feasible(asked(setting, 'holm'));
        const none = feasible(asked(setting, 'none'));
        each(holm).forEach((power, index) => {
          expect(power).toBeGreaterThanOrEqual((each(bonferroni)[index] as number) - slack);
          expect(power).toBeLessThanOrEqual((each(none)[index] as number) + slack);
        });
        expect(joint(holm).any).toBe(joint(bonferroni).any);
        expect(joint(holm).all).toBeGreaterThanOrEqual(joint(bonferroni).all - slack);
      }),
      runs(100),
    );
  });

  it('in a fixed sequence begin as one alone and end as all', () => {
    fc.assert(
      fc.property(settings, (setting) => {
        const sequence = feasible(asked(setting, 'fixed-sequence'));
        const none = feasible(asked(setting, 'none'));
        const powers = each(sequence);
        expect(powers[0]).toBeCloseTo(each(none)[0] as number, 10);
        expect(joint(sequence).any).toBe(powers[0]);
        expect(joint(sequence).all).toBe(powers.at(-1));
        expect(joint(sequence).all).toBeCloseTo(joint(none).all, 12);
        for (const [place, power] of powers.slice(1).entries()) {
          expect(power).toBeLessThanOrEqual((powers[place] as number) + 1e-12);
        }
      }),
      runs(100),
    );
  });

  it('are the same with every effect turned round, and in any order but a fixed one', () => {
    fc.assert(
      fc.property(settings, fc.constantFrom(...adjustments), (setting, adjust) => {
        const answer = feasible(asked(setting, adjust));
        const turned = feasible(
          asked({ ...setting, effects: setting.effects.map((effect) => -effect) }, adjust),
        );
        expectAlike(each(turned), each(answer));
        expect(joint(turned).any).toBeCloseTo(joint(answer).any, 12);
        expect(joint(turned).all).toBeCloseTo(joint(answer).all, 12);
        if (adjust === 'fixed-sequence') return;
        const [control = 1, ...shares] = setting.allocation;
        const backwards = feasible(
          asked(
            {
              ...setting,
              allocation: [control, ...shares.reverse()],
              effects: [...setting.effects].reverse(),
            },
            adjust,
          ),
        );
        expect(joint(backwards).all).toBeCloseTo(joint(answer).all, 10);
        expectAlike(each(backwards).reverse(), each(answer));
      }),
      runs(100),
    );
  });
});

describe('a search over several comparisons', () => {
  const aim = fc.constantFrom(0.6, 0.8, 0.9, 0.975);

  it('finds the smallest size for every goal', () => {
    fc.assert(
      fc.property(
        settings,
        fc.constantFrom(...adjustments),
        fc.constantFrom(...goals),
        aim,
        (setting, adjust, goal, power) => {
          const request = asked(setting, adjust, goal);
          const { units, power: reached } = feasible({ ...request, aim: { find: 'size', power } });
          expect(reached).toBeGreaterThanOrEqual(power);
          for (let less = units - 1; less >= Math.max(20, units - 6); less -= 1) {
            expect(feasible({ ...request, aim: { find: 'power', units: less } }).power).toBeLessThan(power);
          }
        },
      ),
      runs(100),
    );
  });

  it('finds one effect of all arms for every goal, at which the power is as asked', () => {
    fc.assert(
      fc.property(
        settings,
        fc.constantFrom(...adjustments),
        fc.constantFrom(...goals),
        aim,
        (setting, adjust, goal, power) => {
          const request = asked(setting, adjust, goal);
          const { units } = setting;
          const answer = feasible({ ...request, aim: { find: 'effect', units, power } });
          const detectable = answer.detectable as number;
          expect(Math.sign(detectable)).toBe(Math.sign(setting.effects[0] as number));
          expect(answer.power).toBeCloseTo(power, 9);
          const there = asked({ ...setting, effects: setting.effects.map(() => detectable) }, adjust, goal);
          expect(feasible(there).power).toBeCloseTo(power, 9);
        },
      ),
      runs(100),
    );
  });

  it('says where chance alone reaches the power', () => {
    const request = asked(
      { allocation: [1, 1, 1, 1, 1], effects: [5, 5, 5, 5], sides: 1, alpha: 0.1, units: 20, normal: false },
      'none',
      'disjunctive',
    );
    const answer = appraise({ ...request, aim: { find: 'effect', units: 20, power: 0.15 } });
    expect(answer).toMatchObject({ feasible: false, infeasible: { code: 'effect' } });
  });

  it('finds the smallest cluster size for a goal of several comparisons, or why there is none', () => {
    const request = (units: number, icc = 0.03): AppraisalRequest => ({
      ...clusters,
      design: {
        family: 'cluster',
        icc,
        clusterSize: 1,
        allocation: [1.5, 1, 1],
        comparisons: { against: 'control', adjust: 'dunnett', powerGoal: 'conjunctive' },
      },
      aim: { find: 'cluster-size', units, power: 0.8 },
    });
    const powerAt = (clusterSize: number) => {
      const { design } = request(24);
      return feasible({
        ...request(24),
        design: { ...design, clusterSize } as AppraisalRequest['design'],
        aim: { find: 'power', units: 24 },
      }).power;
    };
    const { clusterSize = 0 } = feasible(request(24));
    expect(powerAt(clusterSize)).toBeGreaterThanOrEqual(0.8);
    expect(powerAt(clusterSize - 1)).toBeLessThan(0.8);
    expect(appraise(request(6))).toMatchObject({ feasible: false, infeasible: { code: 'clusters' } });
    expect(feasible(request(6, 0)).power).toBeGreaterThanOrEqual(0.8);
  });

  it('passes through its answer on the curve', () => {
    for (const adjust of adjustments) {
      const request: AppraisalRequest = {
        ...asked(
          { allocation: [1, 1, 1], effects: [5, 4], sides: 2, alpha: 0.05, units: 20, normal: false },
          adjust,
          'conjunctive',
        ),
        aim: { find: 'size', power: 0.8 },
      };
      const { units, power } = feasible(request);
      const [point] = curve(request, { over: 'units', from: units, to: units, points: 2 });
      expect(point).toMatchObject({ size: units, power });
      expect(point?.detectable).toBeGreaterThan(0);
    }
  });
});

describe('what is not computed for several comparisons', () => {
  const three = (comparisons: Comparisons, outcome?: AppraisalRequest['outcome']): AppraisalRequest => ({
    outcome: outcome ?? { kind: 'continuous', difference: 5, sd: 10 },
    test: { hypothesis: 'superiority', alpha: 0.05, sides: 2 },
    design: { family: 'multi-arm', allocation: [1, 1, 1], comparisons },
    aim: { find: 'size', power: 0.8 },
  });
  const binary: AppraisalRequest['outcome'] = { kind: 'binary', control: 0.3, active: 0.2 };

  it.each<[string, AppraisalRequest]>([
    [
      'design.comparisons.adjust',
      three({ against: 'all-pairs', adjust: 'dunnett', powerGoal: 'per-comparison' }),
    ],
    [
      'design.comparisons.powerGoal',
      three({ against: 'all-pairs', adjust: 'none', powerGoal: 'disjunctive' }),
    ],
    [
      'design.comparisons.effects',
      three({ against: 'all-pairs', adjust: 'none', powerGoal: 'per-comparison', effects: [5, 4] }),
    ],
    [
      'design.comparisons.adjust',
      three({ against: 'control', adjust: 'holm', powerGoal: 'per-comparison' }, binary),
    ],
    [
      'design.comparisons.powerGoal',
      three({ against: 'control', adjust: 'none', powerGoal: 'conjunctive' }, binary),
    ],
    [
      'design.comparisons.against',
      three({ against: 'all-pairs', adjust: 'none', powerGoal: 'per-comparison' }, binary),
    ],
  ])('is refused at %s', (path, request) => {
    expect(() => appraise(request)).toThrow(CalcError);
    expect(() => appraise(request)).toThrow(expect.objectContaining({ code: 'unsupported', path }));
  });

  it('in clusters is more than two arms without comparisons, or of another outcome', () => {
    const design = { family: 'cluster' as const, icc: 0.05, clusterSize: 20, allocation: [1, 1, 1] };
    expect(() => appraise({ ...clusters, design })).toThrow(
      expect.objectContaining({ code: 'schema', path: 'design.comparisons' }),
    );
    const comparisons: Comparisons = { against: 'control', adjust: 'none', powerGoal: 'per-comparison' };
    expect(() => appraise({ ...clusters, outcome: binary, design: { ...design, comparisons } })).toThrow(
      expect.objectContaining({ code: 'unsupported', path: 'design.allocation' }),
    );
  });
});

describe('the worked example of several arms', () => {
  const page = readFileSync(new URL('../../docs/multi-arm.md', import.meta.url), 'utf8').replace(/\s+/g, ' ');
  const example = (adjust: Adjustment): AppraisalRequest => ({
    outcome: { kind: 'continuous', difference: 5, sd: 10 },
    test: { hypothesis: 'superiority', alpha: 0.05, sides: 2 },
    design: {
      family: 'multi-arm',
      allocation: [1, 1, 1],
      comparisons: { against: 'control', adjust, powerGoal: 'per-comparison' },
    },
    aim: { find: 'size', power: 0.8 },
  });

  it('comes to the numbers on its page', () => {
    const answer = feasible(example('dunnett'));
    const percent = (power = Number.NaN) => `${(100 * power).toFixed(1)} %`;
    for (const text of [
      `${answer.units} in each arm, ${answer.participants} in all`,
      `= ${answer.standardError.toFixed(3)}; ν = ${answer.df};`,
      `c = ${answer.criticalValue.toFixed(4)}; d = ${(5 / answer.standardError).toFixed(3)};`,
      `power of each comparison ${percent(answer.power)}; at least one succeeds with ${percent(answer.disjunctivePower)}, both with ${percent(answer.conjunctivePower)}`,
      `Bonferroni needs ${feasible(example('bonferroni')).units} in each arm, no adjustment ${feasible(example('none')).units}`,
    ]) {
      expect(page).toContain(text);
    }
  });
});
