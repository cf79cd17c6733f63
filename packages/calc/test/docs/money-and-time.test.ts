import { describe, expect, it } from 'vitest';
import { type AppraisalRequest, appraise, cheapest, mostPower } from '../../src/index.js';

/** The worked example of docs/money-and-time.md, whose figures come from going through all sizes in R. */
const request: AppraisalRequest = {
  outcome: { kind: 'continuous', difference: 3, sd: 13 },
  test: { hypothesis: 'superiority', alpha: 0.05, sides: 2 },
  design: { family: 'cluster', icc: 0.04, clusterSize: 40, clusterSizeCv: 0.35 },
  aim: { find: 'size', power: 0.8 },
  costs: { currency: 'EUR', perCluster: 5500, perRecruited: 60 },
};
const clusterSize = { from: 1, to: 200 };

describe('the worked example of money and time', () => {
  it('costs 347 600 in clusters of 40', () => {
    expect(appraise(request)).toMatchObject({ units: 22, costs: { total: 347_600 } });
  });

  it('costs least in 21 clusters of 42 in each arm', () => {
    expect(cheapest(request, { clusterSize })).toMatchObject({
      found: true,
      proven: true,
      request: { design: { clusterSize: 42 }, aim: { find: 'power', units: 21 } },
      appraisal: { units: 21, clusterSize: 42, costs: { total: 336_840 } },
    });
  });

  it('has most power within 300 000 in 18 clusters of 47', () => {
    const best = mostPower(request, { clusterSize, within: { money: 300_000 } });
    expect(best).toMatchObject({ found: true, appraisal: { units: 18, clusterSize: 47 } });
    if (best.found) expect(best.appraisal.power).toBeCloseTo(0.749, 3);
  });
});
