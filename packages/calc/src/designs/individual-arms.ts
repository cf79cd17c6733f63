import type { Caution, Step } from '../appraisal.js';
import { activeSymbol } from '../explain/outcome-steps.js';
import { tex, texFactor } from '../explain/tex.js';
import type { OutcomeModel } from '../outcomes/outcome-model.js';
import type { Outcome, RequestFor } from '../request.js';
import type { Analysis, Contrast } from '../tests/analysis.js';
import { armLabels, groupSizes, minimumBaseUnits, recruitedFor, roundingReach } from './allocation.js';
import type { DesignPlan, Layout } from './family.js';

/** Two or more parallel arms of individuals, each active arm against the shared control. */
export function individualArmsPlan(
  request: RequestFor<unknown>,
  allocation: readonly number[],
): Omit<DesignPlan, 'steps'> {
  const arms = armLabels(allocation.length);
  return {
    unitName: 'participants in the control arm',
    arms,
    hasDf: request.outcome.kind === 'continuous',
    minimumUnits: minimumBaseUnits(allocation),
    lookBelow: roundingReach(allocation),
    groupUnits: (units) => groupSizes(units, allocation),
    analyse: (sizes, outcomes) => analyseArms(sizes, outcomes),
    layout: (units) => individualLayout(request, arms, groupSizes(units, allocation)),
    cautions: (layout, outcomes) => individualCautions(request, allocation, layout, outcomes),
  };
}

/**
 * Each arm against control.
 *
 * Formula: SE² = v₀/n₀ + v₁/n₁; df = N − arms, less one with a baseline; unequal SDs take the
 * Welch–Satterthwaite df (v₀/n₀ + v₁/n₁)² / Σ (vᵢ/nᵢ)²/(nᵢ − 1).
 * Source: Julious 2004, Stat Med 23:1921; Welch 1947, Biometrika 34:28.
 */
function analyseArms(sizes: readonly number[], outcomes: readonly OutcomeModel[]): Analysis {
  const [n0 = 0, ...active] = sizes;
  const contrasts = active.map((n1, index) =>
    armContrast(outcomes[index] as OutcomeModel, index + 1, n0, n1),
  );
  const first = outcomes[0] as OutcomeModel;
  if (first.reference === 'normal') return { df: null, contrasts };
  if (first.unequalVariances) {
    const parts = first.variances.map((variance, arm) => variance / (sizes[arm] as number));
    const [a = 0, b = 0] = parts;
    const df = (a + b) ** 2 / (a ** 2 / (n0 - 1) + b ** 2 / ((active[0] as number) - 1));
    return { df, contrasts };
  }
  const total = sizes.reduce((sum, size) => sum + size, 0);
  return { df: total - sizes.length - first.covariates, contrasts };
}

function armContrast(outcome: OutcomeModel, arm: number, n0: number, n1: number): Contrast {
  const [v0, v1] = outcome.variances;
  const contrast: Contrast = {
    arm,
    versus: 0,
    effect: outcome.effect,
    standardError: Math.sqrt(v0 / n0 + v1 / n1),
  };
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

function individualCautions(
  { outcome }: RequestFor<unknown>,
  allocation: readonly number[],
  layout: Layout,
  outcomes: readonly OutcomeModel[],
): Caution[] {
  const cautions: Caution[] = [];
  const participants = layout.groups.reduce((sum, group) => sum + group.participants, 0);
  if (outcome.kind === 'continuous') {
    const unequalArms = allocation.some((share) => share !== allocation[0]);
    if (outcome.sdActive !== undefined && outcome.sdActive !== outcome.sd && unequalArms) {
      cautions.push({
        code: 'unequal-sd',
        message:
          'Arms of unequal size with unequal SDs: plan the analysis for unequal variances too, since a pooled test would have the wrong type I error here.',
        source: 'Welch 1947',
      });
    }
    if (outcome.repeated && outcome.repeated.baselines > 0 && participants < 40) {
      cautions.push({
        code: 'small-ancova',
        message:
          'Adjusting for a baseline with fewer than 40 participants costs slightly more precision than is allowed for here; a factor of about 1 + 1/(N − 4) on the variance is left out.',
        source: 'Borm, Fransen & Lemmens 2007',
      });
    }
  }
  if (outcome.kind === 'binary') {
    const fewest = Math.min(
      ...layout.groups.map(({ participants: n }, arm) => {
        const [control = 0, active = 0] = outcomes[Math.max(0, arm - 1)]?.proportions ?? [];
        const p = arm === 0 ? control : active;
        return n * Math.min(p, 1 - p);
      }),
    );
    if (fewest < 5) {
      cautions.push({
        code: 'small-counts',
        message: `An arm expects only ${fewest.toFixed(1)} of its rarer outcome; the normal approximation wants 5 or more. Check this size with an exact method.`,
        source: 'Fleiss, Levin & Paik 2003',
      });
    }
  }
  return cautions;
}

/**
 * The working of each arm against control: effect and standard error, then the df they share. Arms of one size
 * and effect are worked once.
 */
export function armSteps(
  request: RequestFor<unknown>,
  outcomes: readonly OutcomeModel[],
  sizes: readonly number[],
  analysis: Analysis,
): Step[] {
  const n0 = sizes[0] as number;
  const alike = (a: number, b: number) =>
    sizes[a + 1] === sizes[b + 1] && outcomes[a]?.target === outcomes[b]?.target;
  const steps = analysis.contrasts.flatMap((contrast, index) => {
    const first = analysis.contrasts.findIndex((_, other) => alike(index, other));
    if (first !== index) return [];
    const of = index === 0 ? '' : `, Active ${contrast.arm}`;
    const outcome = outcomes[index] as OutcomeModel;
    const ownEffect = outcome.target !== outcomes[0]?.target ? [effectStep(contrast, of)] : [];
    return [...ownEffect, ...contrastSteps(contrast, outcome, n0, sizes[index + 1] as number, of)];
  });
  if (analysis.df === null) return steps;
  return [...steps, dfStep(request, outcomes[0] as OutcomeModel, sizes, analysis.df)];
}

function effectStep({ effect }: Contrast, of: string): Step {
  return {
    label: `Effect${of}`,
    formula: '\\delta',
    substituted: tex(effect),
    value: effect,
    source: 'The effect stated for this arm, after dilution',
  };
}

function contrastSteps(
  contrast: Contrast,
  outcome: OutcomeModel,
  n0: number,
  n1: number,
  of: string,
): Step[] {
  const [v0, v1] = outcome.variances;
  const [p0 = 0, p1 = 0] = outcome.proportions ?? [];
  const active = activeSymbol(outcome);
  const steps: Step[] = [
    {
      label: `Standard error of the effect${of}`,
      formula: '\\mathrm{SE}=\\sqrt{\\frac{v_0}{n_0}+\\frac{v_1}{n_1}}',
      substituted: `\\sqrt{\\frac{${tex(v0)}}{${tex(n0)}}+\\frac{${tex(v1)}}{${tex(n1)}}}`,
      value: contrast.standardError,
      source: outcome.proportions
        ? 'Fleiss, Levin & Paik 2003; Cohen 1988 on the arcsine scale'
        : 'Julious 2004, Stat Med 23:1921',
    },
  ];
  if (contrast.nullStandardError !== undefined) {
    const pooled = (n0 * p0 + n1 * p1) / (n0 + n1);
    steps.push({
      label: `Standard error under no difference${of}`,
      formula: `\\mathrm{SE}_0=\\sqrt{\\bar p\\,(1-\\bar p)\\left(\\tfrac1{n_0}+\\tfrac1{n_1}\\right)},\\quad \\bar p=\\frac{n_0p_0+n_1${active}}{n_0+n_1}`,
      substituted: `\\sqrt{${tex(pooled)}\\,(1-${tex(pooled)})\\left(\\tfrac1{${tex(n0)}}+\\tfrac1{${tex(n1)}}\\right)}`,
      value: contrast.nullStandardError,
      source: 'Fleiss, Levin & Paik 2003',
    });
  }
  if (contrast.correction !== undefined) {
    steps.push({
      label: `Continuity correction, taken off the effect${of}`,
      formula: '\\tfrac12\\left(\\tfrac1{n_0}+\\tfrac1{n_1}\\right)',
      substituted: `\\tfrac12\\left(\\tfrac1{${tex(n0)}}+\\tfrac1{${tex(n1)}}\\right)`,
      value: contrast.correction,
      source: 'Casagrande, Pike & Smith 1978; Fleiss, Tytun & Ury 1980',
    });
  }
  return steps;
}

function dfStep(
  { outcome: asked }: RequestFor<unknown>,
  outcome: OutcomeModel,
  sizes: readonly number[],
  df: number,
): Step {
  if (outcome.unequalVariances && asked.kind === 'continuous') {
    const [n0 = 0, n1 = 0] = sizes;
    const [v0, v1] = outcome.variances;
    return {
      label: 'Degrees of freedom',
      formula: '\\nu=\\frac{(v_0/n_0+v_1/n_1)^2}{\\frac{(v_0/n_0)^2}{n_0-1}+\\frac{(v_1/n_1)^2}{n_1-1}}',
      substituted: `\\frac{(${tex(v0 / n0)}+${tex(v1 / n1)})^2}{\\frac{${texFactor(v0 / n0)}^2}{${tex(n0 - 1)}}+\\frac{${texFactor(v1 / n1)}^2}{${tex(n1 - 1)}}}`,
      value: df,
      source: 'Welch 1947, Biometrika 34:28',
    };
  }
  const total = sizes.reduce((sum, size) => sum + size, 0);
  const lost = outcome.covariates;
  return {
    label: 'Degrees of freedom',
    formula: `\\nu=N-K${lost ? '-1' : ''}`,
    substituted: `${tex(total)}-${sizes.length}${lost ? '-1' : ''}`,
    value: df,
    source: lost ? 'One spent on the baseline covariate' : 'Pooled SD of all arms',
  };
}
