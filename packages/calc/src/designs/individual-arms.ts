import type { OutcomeModel } from '../outcomes/outcome-model.js';
import type { Comparisons, Outcome, RequestFor } from '../request.js';
import type { Analysis, Contrast } from '../tests/analysis.js';
import { armLabels, groupSizes, minimumBaseUnits, recruitedFor, roundingReach } from './allocation.js';
import { armCautions } from './arm-cautions.js';
import { type ComparedArms, comparedArms, loadingOnControl } from './compared-arms.js';
import type { DesignPlan, Layout } from './family.js';

/** Two or more parallel arms of individuals: each active arm against the shared control, or all pairs of arms. */
export function individualArmsPlan(
  request: RequestFor<unknown>,
  allocation: readonly number[],
  comparisons?: Comparisons,
): Omit<DesignPlan, 'steps'> {
  const arms = armLabels(allocation.length);
  const pairs = comparedArms(allocation.length, comparisons?.against);
  return {
    unitName: 'participants in the control arm',
    arms,
    comparisons,
    hasDf: request.outcome.kind === 'continuous',
    minimumUnits: minimumBaseUnits(allocation),
    lookBelow: roundingReach(allocation),
    groupUnits: (units) => groupSizes(units, allocation),
    analyse: (sizes, outcomes) => analyseArms(sizes, outcomes, pairs),
    layout: (units) => individualLayout(request, arms, groupSizes(units, allocation)),
    cautions: (layout, outcomes) => armCautions(request, allocation, layout, outcomes),
  };
}

/**
 * Each comparison, and the df they share.
 *
 * Formula: SE² = v₀/n₀ + v₁/n₁ unless the outcome has its own; df = N − arms, less one with a baseline; unequal
 * SDs take the Welch–Satterthwaite df (v₀/n₀ + v₁/n₁)² / Σ (vᵢ/nᵢ)²/(nᵢ − 1).
 * Source: Julious 2004, Stat Med 23:1921; Welch 1947, Biometrika 34:28.
 */
function analyseArms(
  sizes: readonly number[],
  outcomes: readonly OutcomeModel[],
  pairs: readonly ComparedArms[],
): Analysis {
  const contrasts = pairs.map((pair) => armContrast(outcomes[pair.arm - 1] as OutcomeModel, pair, sizes));
  const first = outcomes[0] as OutcomeModel;
  if (first.reference === 'normal') return { df: null, contrasts };
  if (first.unequalVariances) {
    const parts = first.variances.map((variance, arm) => variance / (sizes[arm] as number));
    const [a = 0, b = 0] = parts;
    const [n0 = 0, n1 = 0] = sizes;
    const df = (a + b) ** 2 / (a ** 2 / (n0 - 1) + b ** 2 / (n1 - 1));
    return { df, dfAtMost: n0 + n1 - 2, contrasts };
  }
  const total = sizes.reduce((sum, size) => sum + size, 0);
  return { df: total - sizes.length - first.covariates, contrasts };
}

function armContrast(
  outcome: OutcomeModel,
  { arm, versus, sharesControl }: ComparedArms,
  sizes: readonly number[],
): Contrast {
  const n0 = sizes[versus] as number;
  const n1 = sizes[arm] as number;
  const [v0, v1] = outcome.variances;
  const contrast: Contrast = {
    arm,
    versus,
    effect: outcome.effect,
    standardError: Math.sqrt(outcome.variance?.(n0, n1) ?? v0 / n0 + v1 / n1),
  };
  if (sharesControl && outcome.reference === 't') contrast.loading = loadingOnControl(n0, n1);
  if (outcome.nullVariance) contrast.nullStandardError = Math.sqrt(outcome.nullVariance(n0, n1));
  if (outcome.correction) contrast.correction = outcome.correction(n0, n1);
  return contrast;
}

/** Measurements of one participant: baselines and follow-ups, one without `repeated`. */
export function measurementsEach(outcome: Outcome): number {
  if (outcome.kind !== 'continuous' || !outcome.repeated) return 1;
  return outcome.repeated.baselines + outcome.repeated.followUps;
}

function individualLayout(
  request: RequestFor<unknown>,
  arms: readonly string[],
  sizes: readonly number[],
): Layout {
  const each = measurementsEach(request.outcome);
  const groups = sizes.map((participants, arm) => ({
    label: arms[arm] as string,
    units: participants,
    participants,
    recruited: recruitedFor(participants, request.attrition?.participants),
  }));
  return {
    groups,
    arms: groups.map(({ label, recruited }) => ({
      label,
      exposures: recruited,
      measurements: recruited * each,
      clusterPeriods: 0,
    })),
  };
}
