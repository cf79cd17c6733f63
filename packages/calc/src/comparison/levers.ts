import type { Feasible } from '../appraisal.js';
import { appraise } from '../appraise.js';
import type { Lever, LeverContext, LeverIdea } from '../designs/levers.js';
import { familyOf } from '../designs/registry.js';
import { CalcError } from '../errors.js';
import type { AppraisalRequest } from '../parse-request.js';
import { planningValueFor, requestOf, type Study } from './request-of.js';
import type { OptionPlan } from './study-plan.js';

/** What a change of an option saves and costs, each figure the difference of two appraisals: after − before. */
export interface LeverOffer extends LeverIdea {
  /** Fewer recruited, above 0. */
  saving: number;
  clusters?: number;
  cost?: number;
  months?: number;
  /** Measurements of each recruited participant. */
  visits: number;
}

/**
 * The levers that cut an option's participants at the power the study holds, the largest saving first; what saves
 * nothing, or cannot be computed, is left out.
 */
export function leversOf(
  study: Study,
  plan: OptionPlan,
  words: Pick<LeverContext, 'participants' | 'clusters' | 'arms'>,
): LeverOffer[] {
  const before = sized(study, plan);
  if (!before) return [];
  const context: LeverContext = {
    ...words,
    plan,
    outcome: study.question.outcome.kind,
    states: (key, family = plan.family) =>
      planningValueFor(key, { ...plan, family }, study.ledger) !== undefined,
  };
  const levers: readonly Lever[] = familyOf(plan.family).levers ?? [];
  return levers
    .flatMap((lever) => lever(context))
    .flatMap((idea): LeverOffer[] => {
      const after = sized(study, idea.plan);
      const saving = after ? before.recruited - after.recruited : 0;
      return after && saving > 0 ? [{ ...idea, saving, ...priceOf(before, after) }] : [];
    })
    .sort((a, b) => b.saving - a.saving);
}

function priceOf(before: Feasible, after: Feasible): Omit<LeverOffer, keyof LeverIdea | 'saving'> {
  const price: ReturnType<typeof priceOf> = {
    visits: after.measurements / after.recruited - before.measurements / before.recruited,
  };
  if (after.recruitedClusters !== undefined && before.recruitedClusters !== undefined) {
    price.clusters = after.recruitedClusters - before.recruitedClusters;
  }
  if (after.costs && before.costs) price.cost = after.costs.total - before.costs.total;
  if (after.timeline && before.timeline) price.months = after.timeline.months - before.timeline.months;
  return price;
}

/** The option at the fewest units that reach the power, whatever is held. */
function sized(study: Study, plan: OptionPlan): Feasible | undefined {
  try {
    const appraisal = appraise(requestOf(study, plan) as AppraisalRequest);
    return appraisal.feasible ? appraisal : undefined;
  } catch (error) {
    if (error instanceof CalcError) return undefined;
    throw error;
  }
}
