import { describe, expect, it } from 'vitest';
import { periodInformation } from '../../src/designs/periods/information.js';
import type { Schedule } from '../../src/designs/periods/schedule.js';
import { type AppraisalRequest, appraise, type Design } from '../../src/index.js';
import { feasible, twoMeans } from '../requests.js';

const over = (design: Design, units: number) =>
  feasible({
    ...twoMeans,
    outcome: { kind: 'continuous', difference: 0.3, sd: 1 },
    design,
    aim: { find: 'power', units },
  });

describe('published values of designs over cluster periods', () => {
  it('are the variance of a wedge by Hussey & Hughes 2007, Contemp Clin Trials 28:182 (formula from memory, own numbers)', () => {
    const { standardError } = over(
      { family: 'stepped-wedge', steps: 4, icc: 0.05, cac: 1, clusterSize: 100 },
      6,
    );
    expect(Math.abs(standardError ** 2 - 0.0010304075235)).toBeLessThanOrEqual(1e-12);
  });

  it.each([
    [3, 10, 0.05, 0.71654829545],
    [4, 20, 0.02, 0.53585321101],
    [6, 15, 0.1, 0.38236024845],
  ])(
    'are the design effect of %s steps by Woertman et al. 2013, J Clin Epidemiol 66:752 (formula from memory, own numbers)',
    (steps, clusterSize, icc, expected) => {
      const { designEffect } = over({ family: 'stepped-wedge', steps, icc, cac: 1, clusterSize }, 5);
      // Theirs is for the participants of one period.
      expect(Math.abs((designEffect as number) / (steps + 1) - expected)).toBeLessThanOrEqual(1e-9);
    },
  );

  it.each([
    [4, 20, 0.05, 0.8, undefined, 0.34221740701],
    [5, 10, 0.03, 0.9, 0.6, 0.16728954377],
  ])(
    'are the design effect of repeated assessment of %s steps by Hooper et al. 2016, Stat Med 35:4718 (formula from memory, own numbers)',
    (steps, clusterSize, icc, cac, iac, expected) => {
      const { designEffect } = over(
        { family: 'stepped-wedge', steps, icc, cac, clusterSize, ...(iac === undefined ? {} : { iac }) },
        5,
      );
      const clustering = 1 + (clusterSize - 1) * icc;
      const repeated = (designEffect as number) / (steps + 1) / clustering;
      expect(Math.abs(repeated - expected)).toBeLessThanOrEqual(1e-9);
    },
  );

  it('are the factor left by a baseline, 1 − r² of Teerenstra et al. 2012, Stat Med 31:2169 (formula from memory, own numbers)', () => {
    const [icc, clusterSize] = [0.05, 30];
    const { standardError } = over({ family: 'cluster-baseline', icc, cac: 0.8, iac: 0.6, clusterSize }, 10);
    const later = over({ family: 'cluster', icc, clusterSize }, 10).standardError;
    expect(Math.abs((standardError / later) ** 2 - 0.47806747189)).toBeLessThanOrEqual(1e-8);
  });

  it('are the design effect 2.162 of a cluster crossover: Giraudeau, Ravaud & Donner 2008, Stat Med 27:5578 (from memory)', () => {
    const { designEffect } = over(
      { family: 'cluster-crossover', icc: 0.038, cac: 0.032 / 0.038, clusterSize: 200 },
      10,
    );
    expect(Math.abs((designEffect as number) - 2.162)).toBeLessThanOrEqual(1e-8);
  });

  it.each([
    [0.05, 100, 12.0045853235],
    [0.1, 100, 23.7114516766],
    [0.01, 100, 3.4350238363],
    [0.05, 20, 3.5225515836],
  ])(
    'have the best number of sequences at ICC %s and %s in a cluster: Thompson et al. 2017, Clin Trials 14:639 (read)',
    (icc, size, best) => {
      // No period is all control or all active, and a cluster's participants are spread over the periods.
      const information = Array.from({ length: 39 }, (_, index) => {
        const sequences = index + 2;
        const schedule: Schedule = Array.from({ length: sequences }, (_, sequence) =>
          Array.from({ length: sequences - 1 }, (_, period) => (period < sequence ? 0 : 1)),
        );
        const shares = Array<number>(sequences).fill(1 / sequences);
        return periodInformation(schedule, { icc, cac: 1 }).total(shares, size / (sequences - 1));
      });
      const found = information.indexOf(Math.max(...information)) + 2;
      expect(Math.abs(found - best)).toBeLessThanOrEqual(0.6);
    },
  );
});

describe('published values of the crossover', () => {
  const bioequivalent = (cv: number, ratio: number, power: number): AppraisalRequest => ({
    outcome: { kind: 'continuous', difference: Math.log(ratio), sd: Math.sqrt(Math.log(1 + cv * cv)) },
    test: { hypothesis: 'equivalence', alpha: 0.05, sides: 1, margin: Math.log(1.25) },
    // A correlation of 0 makes the SD that of one participant's measurements.
    design: { family: 'crossover', sequences: ['AB', 'BA'], correlation: 0 },
    aim: { find: 'size', power },
  });
  const ratios = [0.85, 0.9, 0.95, 1, 1.05, 1.1, 1.15, 1.2];

  it.each([
    [0.1, [36, 12, 8, 6, 8, 10, 20, 76]],
    [0.15, [78, 22, 12, 10, 12, 20, 42, 168]],
    [0.2, [134, 38, 20, 16, 18, 32, 72, 294]],
    [0.25, [206, 56, 28, 24, 28, 48, 110, 452]],
    [0.3, [292, 80, 40, 32, 38, 68, 156, 642]],
  ])(
    'are the sizes for bioequivalence at 80 percent and a CV of %s: Diletti, Hauschke & Steinijans 1991 (from memory)',
    (cv, sizes) => {
      expect(ratios.map((ratio) => feasible(bioequivalent(cv, ratio, 0.8)).participants)).toEqual(sizes);
    },
  );

  it('are the sizes for bioequivalence at 90 %: Diletti, Hauschke & Steinijans 1991 (from memory)', () => {
    const sizes = [
      [0.2, 0.95],
      [0.2, 1],
      [0.3, 0.95],
      [0.3, 1],
    ].map(([cv = 0, ratio = 1]) => feasible(bioequivalent(cv, ratio, 0.9)).participants);
    expect(sizes).toEqual([26, 20, 52, 40]);
  });

  it('are 13 in each sequence for non-inferiority and 8 for equivalence: Chow, Shao & Wang, chapter 3 (from memory)', () => {
    // Their SD is that of a participant's difference of means, with σm² = 2σ²(1 − ρ) = 0.04.
    const request: AppraisalRequest = {
      outcome: { kind: 'continuous', difference: -0.1, sd: 0.2, better: 'higher' },
      test: { hypothesis: 'non-inferiority', alpha: 0.05, sides: 1, margin: 0.2, reference: 'normal' },
      design: { family: 'crossover', sequences: ['AB', 'BA'], correlation: 0.5 },
      aim: { find: 'size', power: 0.8 },
    };
    // For equivalence they share the type II error between both sides, though nearly all of it is on one: as for 90 %.
    const equivalence: AppraisalRequest = {
      ...request,
      test: { ...request.test, hypothesis: 'equivalence', margin: 0.25 },
      aim: { find: 'size', power: 0.9 },
    };
    expect([feasible(request).units, feasible(equivalence).units]).toEqual([13, 8]);
  });

  it('are 59 pairs of proportions: Connor 1987, as in Chow, Shao & Wang (from memory)', () => {
    // Chances 0.5 and 0.2 of differing one way and the other; both succeed with 0.1.
    const [p0, p1] = [0.3, 0.6];
    const correlation = (0.1 - p0 * p1) / Math.sqrt(p0 * (1 - p0) * p1 * (1 - p1));
    const request: AppraisalRequest = {
      ...twoMeans,
      outcome: { kind: 'binary', control: p0, active: p1 },
      design: { family: 'crossover', sequences: ['AB', 'BA'], correlation },
    };
    const { units, participants } = feasible(request);
    expect([units, participants]).toEqual([30, 60]);
    const below = appraise({ ...request, aim: { find: 'power', units: 29 } });
    expect(below).toMatchObject({ feasible: true });
    expect((below as { power: number }).power).toBeLessThan(0.8);
  });

  it.each([
    ['ABC BCA CAB ACB BAC CBA', 3],
    ['ADBC BACD CBDA DCAB', 4],
  ])(
    'lose (K² − K − 1)/(K² − K − 2) of their precision to carryover in the Williams design %s: Williams 1949; Jones & Kenward 2014 (from memory)',
    (sequences, k) => {
      const variance = (carryover: boolean) =>
        feasible({
          ...twoMeans,
          design: { family: 'crossover', sequences: sequences.split(' '), correlation: 0.3, carryover },
          aim: { find: 'power', units: 5 },
        }).standardError ** 2;
      expect(variance(false)).toBeCloseTo((2 * 100 * 0.7) / (5 * sequences.split(' ').length), 9);
      expect(variance(true) / variance(false)).toBeCloseTo((k * k - k - 1) / (k * k - k - 2), 9);
    },
  );
});
