import type { DesignSetView, OptionView } from '@steelyard/api/contract/design-sets';
import type { LimitsView } from '@steelyard/api/contract/limits';
import type { CostPlanView, PlanningValueView, StudyView } from '@steelyard/api/contract/studies';
import { type OptionPlan, type Verdict, verdict, type WeighedOption, weigh } from '@steelyard/calc';
import { capitalised } from '../../../shared/format/lists';
import { thinly } from '../../../shared/format/spaces';
import type { StudyWords } from '../../designs/families/family-ui';
import type { KeptDraft } from '../../designs/model/drafts';
import { weighable } from '../../designs/model/option-draft';

/** One option with all that is shown of it; its name and plan are those of the person's draft where there is one. */
export interface Weighed extends Omit<WeighedOption, 'ruling'> {
  position: number;
  plan: OptionPlan;
  words: StudyWords;
  ruling: OptionView['ruling'];
  stored: OptionView;
  draft: KeptDraft | undefined;
}

export interface Weighing {
  study: StudyView;
  ledger: PlanningValueView[];
  designSet: DesignSetView;
  hold: DesignSetView['hold'];
  limits: LimitsView;
  currency: string;
  options: Weighed[];
  verdict: Verdict;
}

interface Parts {
  study: StudyView;
  ledger: PlanningValueView[];
  costs: CostPlanView;
  designSet: DesignSetView;
  limits: LimitsView;
  draftOf: (optionId: string) => KeptDraft | undefined;
}

/** Weighs a study's options, here in the browser, from what the server keeps: inputs only. */
export function weighingOf({ study, ledger, costs, designSet, limits, draftOf }: Parts): Weighing {
  const { participants, clusters } = study;
  const { currency } = costs.costs;
  const { hold } = designSet;
  const shown = designSet.options.map((stored) => {
    const draft = draftOf(stored.id);
    return { stored, draft, ...(draft ? weighable(draft) : { name: stored.name, plan: stored.plan }) };
  });
  const weighed = weigh({
    question: study.plan,
    ledger,
    costs,
    hold,
    limits: limits.limits,
    options: shown.map(({ stored, name, plan }) => ({
      id: stored.id,
      name,
      plan,
      ruling: stored.ruling && { kind: stored.ruling.kind, reason: stored.ruling.reason },
    })),
  });
  const told = verdict(weighed, { hold, currency, participants, clusters });
  return {
    study,
    ledger,
    designSet,
    hold,
    limits,
    currency,
    verdict: { headline: thinly(told.headline), detail: thinly(told.detail) },
    options: weighed.map((option, position) => {
      const { plan, stored, draft } = shown[position] as (typeof shown)[number];
      return {
        ...option,
        ruling: stored.ruling,
        stored,
        draft,
        position,
        plan,
        words: wordsFor(study, plan),
      };
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
