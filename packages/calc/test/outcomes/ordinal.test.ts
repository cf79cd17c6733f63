import { describe, expect, it } from 'vitest';
import { scoreShare, shiftedProbabilities } from '../../src/outcomes/ordinal.js';
import cases from '../reference/outcomes/ordinal.json' with { type: 'json' };

const relative = (found: number, exact: number) => (found === exact ? 0 : Math.abs(found / exact - 1));

describe('an ordinal outcome', () => {
  it('has the active probabilities of shifted cumulative odds within a relative 1e-14', () => {
    for (const { control, oddsRatio, active } of cases) {
      const found = shiftedProbabilities(control, oddsRatio);
      active.forEach((exact, k) => {
        expect(relative(found[k] as number, exact), `${control} × ${oddsRatio}`).toBeLessThanOrEqual(1e-14);
      });
    }
  });

  it('keeps a share 1 − Σp̄³ of the information within a relative 1e-14, even where one category has nearly all', () => {
    for (const { control, active, controlWeight, share } of cases) {
      const mean = control.map((p, k) => controlWeight * p + (1 - controlWeight) * (active[k] as number));
      expect(relative(scoreShare(mean), share), `${control}`).toBeLessThanOrEqual(1e-14);
    }
  });
});
