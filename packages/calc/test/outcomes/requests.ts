import type { AppraisalRequest } from '../../src/index.js';
import { clusters, twoMeans } from '../requests.js';

/** Requests of every outcome and hypothesis, to be varied. */
export const survival: AppraisalRequest = {
  ...twoMeans,
  outcome: {
    kind: 'time-to-event',
    hazardRatio: 0.7,
    controlSurvival: { at: 12, probability: 0.6 },
    accrual: 18,
    followUp: 12,
  },
};

export const rates: AppraisalRequest = {
  ...twoMeans,
  outcome: { kind: 'count', controlRate: 1.2, rateRatio: 0.7, exposure: 1, dispersion: 0.5 },
};

export const categories: AppraisalRequest = {
  ...twoMeans,
  outcome: { kind: 'ordinal', controlProbabilities: [0.2, 0.5, 0.2, 0.1], oddsRatio: 1.8 },
};

export const noWorse: AppraisalRequest = {
  ...twoMeans,
  outcome: { kind: 'continuous', difference: 0, sd: 10, better: 'higher' },
  test: { hypothesis: 'non-inferiority', alpha: 0.025, sides: 1, margin: 4 },
};

export const alike: AppraisalRequest = {
  ...twoMeans,
  outcome: { kind: 'continuous', difference: 0, sd: 10 },
  test: { hypothesis: 'equivalence', alpha: 0.05, sides: 1, margin: 5 },
};

export const clusterRates: AppraisalRequest = {
  ...clusters,
  outcome: { kind: 'count', controlRate: 0.2, rateRatio: 0.7, exposure: 1 },
  design: { family: 'cluster', rateCv: 0.25, clusterSize: 100 },
};

/** The request against a margin, non-inferiority with lower the better. */
export const against = (request: AppraisalRequest, margin: number): AppraisalRequest => ({
  ...request,
  outcome: { ...request.outcome, better: 'lower' },
  test: { hypothesis: 'non-inferiority', alpha: 0.025, sides: 1, margin },
});
