import type { DesignSetView } from '@steelyard/api/contract/design-sets';
import type { CostPlanView, PlanningValueView, StudyView } from '@steelyard/api/contract/studies';
import { type OptionPlan, type Verdict, verdict, type WeighedOption, weigh } from '@steelyard/calc';
import { capitalised } from '../../../shared/format/lists';
import { thinly } from '../../../shared/format/spaces';
import type { StudyWords } from '../../designs/families/family-ui';

/** One option with all that is shown of it. */
export interface Weighed extends WeighedOption {
  position: number;
  plan: OptionPlan;
  words: StudyWords;
}

export interface Weighing {
  study: StudyView;
  ledger: PlanningValueView[];
  hold: DesignSetView['hold'];
  currency: string;
  options: Weighed[];
  verdict: Verdict;
}

/** Weighs a study's options, here in the browser, from what the server keeps: inputs only. */
export function weighingOf(
  study: StudyView,
  ledger: PlanningValueView[],
  costs: CostPlanView,
  { hold, options }: DesignSetView,
): Weighing {
  const { participants, clusters } = study;
  const { currency } = costs.costs;
  const weighed = weigh({ question: study.plan, ledger, costs, hold, options });
  const told = verdict(weighed, { hold, currency, participants, clusters });
  return {
    study,
    ledger,
    hold,
    currency,
    verdict: { headline: thinly(told.headline), detail: thinly(told.detail) },
    options: weighed.map((option, position) => {
      const { plan } = options[position] as DesignSetView['options'][number];
      return { ...option, position, plan, words: wordsFor(study, plan) };
    }),
  };
}

function wordsFor({ treatments, participants, clusters }: StudyView, plan: OptionPlan): StudyWords {
  return {
    participants,
    clusters: clusters ?? { one: 'cluster', many: 'clusters' },
    arms: plan.treatments.map((treatment) =>
      capitalised(treatments[treatment]?.name ?? `treatment ${treatment + 1}`),
    ),
  };
}
