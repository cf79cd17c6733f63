import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { periodInformation } from '../../../src/designs/periods/information.js';
import { expectedPrecision, sizeRule } from '../../../src/designs/periods/precision.js';
import { type Schedule, wedgeSchedule } from '../../../src/designs/periods/schedule.js';
import { runs } from '../../arbitrary-requests.js';
import rows from '../../reference/periods/expected-precision.json' with { type: 'json' };

const relative = (actual: number, expected: number) => Math.abs(actual / expected - 1);
const ones = (count: number) => Array<number>(count).fill(1);

const correlations = fc.record({
  icc: fc.double({ min: 0.001, max: 0.5, noNaN: true }),
  cac: fc.double({ min: 0, max: 1, noNaN: true }),
  iac: fc.double({ min: 0, max: 0.95, noNaN: true }),
  clusterSizeCv: fc.constantFrom(undefined, 0, 0.4, 1),
});
const size = fc.integer({ min: 1, max: 2000 });

describe('what clusters of unequal sizes tell', () => {
  it('agrees with a quadrature in 40 digits', () => {
    for (const [between = 0, within = 0, mean = 0, cv = 0, expected = 0] of rows) {
      expect(relative(expectedPrecision(between, within, mean, sizeRule(cv)), expected)).toBeLessThan(1e-13);
    }
  });

  it('is what equal clusters tell as the CV goes to 0', () => {
    const equal = expectedPrecision(0.05, 0.95, 20, sizeRule(0));
    for (const cv of [1e-9, 1e-6]) {
      expect(relative(expectedPrecision(0.05, 0.95, 20, sizeRule(cv)), equal)).toBeLessThan(1e-11);
    }
  });

  it('stays finite for any CV that a request may name', () => {
    for (const cv of [10, 100]) {
      expect(expectedPrecision(0.05, 0.95, 20, sizeRule(cv))).toBeGreaterThan(0);
      expect(expectedPrecision(0.05, 0.95, 20, sizeRule(cv))).toBeLessThan(20 / 0.95);
    }
  });
});

describe('the information of a schedule', () => {
  it('is the inverse of Hussey & Hughes’ variance, 2007, Contemp Clin Trials 28:182, for cross-sections at a cluster autocorrelation of 1', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 2, max: 9 }),
        fc.integer({ min: 1, max: 4 }),
        fc.integer({ min: 1, max: 6 }),
        fc.double({ min: 0, max: 0.9, noNaN: true }),
        size,
        (steps, baseline, clusters, icc, m) => {
          const schedule = wedgeSchedule(steps, baseline, 0);
          const periods = baseline + steps;
          const [tau, sigma] = [icc, (1 - icc) / m];
          let u = 0;
          let v = 0;
          for (const row of schedule) {
            const treated = row.filter((cell) => cell === 1).length;
            u += clusters * treated;
            v += clusters * treated ** 2;
          }
          let w = 0;
          for (let period = 0; period < periods; period += 1) {
            w += (clusters * schedule.filter((row) => row[period] === 1).length) ** 2;
          }
          const n = clusters * steps;
          const variance =
            (n * sigma * (sigma + periods * tau)) /
            ((n * u - w) * sigma + (u ** 2 + n * periods * u - periods * w - n * v) * tau);
          const found = periodInformation(schedule, { icc, cac: 1 });
          expect(relative(1 / found.total(Array(steps).fill(clusters), m), variance)).toBeLessThan(1e-9);
        },
      ),
      runs(500),
    );
  });

  it('gives a cluster crossover the design effect 1 + (m−1)ρ − mρ·cac of Giraudeau, Ravaud & Donner 2008, Stat Med 27:5578', () => {
    fc.assert(
      fc.property(correlations, size, ({ icc, cac }, m) => {
        const found = periodInformation(
          [
            [0, 1],
            [1, 0],
          ],
          { icc, cac },
        );
        const effect = 1 + (m - 1) * icc - m * icc * cac;
        expect(relative((4 * m) / (4 * found.total([1, 1], m)), effect)).toBeLessThan(1e-9);
      }),
      runs(500),
    );
  });

  it('leaves 1 − r² of the later period’s variance with a baseline, after Teerenstra et al. 2012, Stat Med 31:2169', () => {
    fc.assert(
      fc.property(correlations, size, ({ icc, cac, iac }, m) => {
        const variance = icc + (1 - icc) / m;
        const r = (icc * cac + ((1 - icc) * iac) / m) / variance;
        const found = periodInformation(
          [
            [0, 0],
            [0, 1],
          ],
          { icc, cac, iac },
        );
        expect(relative(1 / found.total([3, 5], m), variance * (1 / 3 + 1 / 5) * (1 - r * r))).toBeLessThan(
          1e-9,
        );
      }),
      runs(500),
    );
  });

  it('does not see the decay at a cluster autocorrelation of 1, nor with two periods: Kasza et al. 2019', () => {
    fc.assert(
      fc.property(correlations, size, fc.integer({ min: 3, max: 6 }), (drawn, m, steps) => {
        for (const [schedule, cac] of [
          [wedgeSchedule(steps, 1, 1), 1],
          [wedgeSchedule(steps, 2, 0), 1],
          [
            [
              [0, 1],
              [1, 0],
            ] satisfies Schedule,
            drawn.cac,
          ],
        ] as const) {
          const clusters = ones(schedule.length);
          const constant = periodInformation(schedule, { ...drawn, cac }).total(clusters, m);
          const decaying = periodInformation(schedule, { ...drawn, cac, decay: true }).total(clusters, m);
          expect(relative(decaying, constant)).toBeLessThan(1e-9);
        }
      }),
      runs(300),
    );
  });

  it('is that of as many independent measurements in two arms where nothing is correlated', () => {
    const parallel: Schedule = [
      [0, 0, 0],
      [1, 1, 1],
    ];
    const found = periodInformation(parallel, { icc: 0, cac: 0.5 });
    expect(found.total([4, 6], 25)).toBeCloseTo(1 / (1 / (4 * 75) + 1 / (6 * 75)), 10);
  });

  it('leaves out a period measured in no sequence, and cells measured in none', () => {
    const whole = periodInformation(
      [
        [0, 0, 1],
        [0, 1, 1],
      ],
      { icc: 0.05, cac: 0.8 },
    );
    const gap = periodInformation(
      [
        [0, null, 0, 1],
        [0, null, 1, 1],
      ],
      { icc: 0.05, cac: 0.8 },
    );
    expect(gap.total([2, 3], 10)).toBeCloseTo(whole.total([2, 3], 10), 10);
  });

  it('does not depend on whether clusters in a sequence are counted together or apart', () => {
    const apart = wedgeSchedule(4, 1, 1).flatMap((row) => [row, row]);
    const drawn = { icc: 0.07, cac: 0.6, decay: true, iac: 0.3, clusterSizeCv: 0.6 };
    const together = periodInformation(wedgeSchedule(4, 1, 1), drawn).total([2, 2, 2, 2], 15);
    expect(relative(periodInformation(apart, drawn).total(ones(8), 15), together)).toBeLessThan(1e-12);
  });
});

describe('the information of clusters without end', () => {
  it('is what growing clusters come to', () => {
    for (const [schedule, drawn] of [
      [wedgeSchedule(4, 1, 0), { icc: 0.1, cac: 0.7, iac: 0.4 }],
      [wedgeSchedule(4, 1, 1), { icc: 0.1, cac: 0.7, decay: true, clusterSizeCv: 0.5 }],
      [
        [
          [0, 0, null],
          [1, 1, null],
          [null, 0, 0],
          [null, 1, 1],
        ] satisfies Schedule,
        { icc: 0.2, cac: 1 },
      ],
      [
        [
          [0, null, null, null],
          [1, null, null, null],
          [null, null, 0, 0],
          [null, null, 1, 1],
        ] satisfies Schedule,
        { icc: 0.2, cac: 1, iac: 0.5 },
      ],
    ] as const) {
      const clusters = schedule.map((_, index) => index + 2);
      const found = periodInformation(schedule, drawn);
      const limit = found.total(clusters, Number.POSITIVE_INFINITY);
      expect(relative(found.total(clusters, 1e8), limit)).toBeLessThan(1e-5);
    }
  });

  it('joins what large clusters tell without a step, where only their means tell', () => {
    const staggered: Schedule = [
      [0, 0, null],
      [1, 1, null],
      [null, 0, 0],
      [null, 1, 1],
    ];
    // Within a cluster 1/m is left of its variance of 0.5: the change is at m = 10⁸.
    for (const drawn of [
      { icc: 0.5, cac: 1 },
      { icc: 0.5, cac: 1, clusterSizeCv: 0.3 },
    ]) {
      const found = periodInformation(staggered, drawn);
      const [before, after] = [0.99e8, 1.01e8].map((m) => found.total([2, 3, 4, 5], m));
      expect(relative(before as number, after as number)).toBeLessThan(1e-7);
    }
  });

  it('has no bound where treatment varies within clusters that differ by period and treatment alone', () => {
    for (const schedule of [
      wedgeSchedule(3, 1, 0),
      [
        [0, 1],
        [1, 0],
      ],
      [
        [0, 0],
        [0, 1],
      ],
    ] satisfies Schedule[]) {
      const found = periodInformation(schedule, { icc: 0.1, cac: 1 });
      expect(found.total(ones(schedule.length), Number.POSITIVE_INFINITY)).toBe(Number.POSITIVE_INFINITY);
    }
  });

  it('has no bound where members of a cluster are strangers', () => {
    const found = periodInformation([[0], [1]], { icc: 0, cac: 0.5 });
    expect(found.total([2, 2], Number.POSITIVE_INFINITY)).toBe(Number.POSITIVE_INFINITY);
  });

  it('is that of any size at an ICC of 1', () => {
    const found = periodInformation(wedgeSchedule(3, 1, 0), { icc: 1, cac: 0.6 });
    expect(found.total([1, 1, 1], 7)).toBeCloseTo(found.total([1, 1, 1], Number.POSITIVE_INFINITY), 12);
  });
});
