import type { DesignSetView, OptionView } from '@steelyard/api/contract/design-sets';
import type { LimitsView } from '@steelyard/api/contract/limits';
import type { CostPlanView, PlanningValueView, StudyView } from '@steelyard/api/contract/studies';
import {
  type Hold,
  letterOf,
  type OptionPlan,
  planningValueFor,
  planningValuesOf,
  planningValueTraits,
  type Verdict,
  verdict,
  type WeighedOption,
  weigh,
} from '@steelyard/calc';
import { capitalised } from '../../../shared/format/lists';
import { thinly } from '../../../shared/format/spaces';
import type { StudyWords } from '../../designs/families/family-ui';
import type { KeptDraft, Sizing } from '../../designs/model/drafts';
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
  /** What is kept equal now: the sizes, while a person tries out others. */
  hold: Hold;
  /** The sizes being tried out and not stored; the design set keeps the hold that is stored. */
  sizing: Sizing | undefined;
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
  sizing?: Sizing | undefined;
}

/** What was weighed before, by option: an option is weighed anew only when what it comes from has changed. */
export type WeighedBefore = Map<string, { from: readonly unknown[]; weighed: Weighed }>;

/** Weighs a study's options, here in the browser, from what the server keeps: inputs only. */
export function weighingOf(parts: Parts, before: WeighedBefore = new Map()): Weighing {
  const { study, ledger, costs, designSet, limits, draftOf, sizing } = parts;
  const { participants, clusters } = study;
  const { currency } = costs.costs;
  const hold: Hold = sizing ? { kind: 'sizes', power: designSet.hold.power } : designSet.hold;
  const options = designSet.options.map((stored, position) => {
    const draft = draftOf(stored.id);
    const from = [study, ledger, costs, limits, JSON.stringify(hold), stored, draft, position];
    const known = before.get(stored.id);
    if (known?.from.every((part, index) => part === from[index])) return known.weighed;
    const weighed = weighedOption(parts, hold, stored, draft, position);
    before.set(stored.id, { from, weighed });
    return weighed;
  });
  const told = verdict(options, { hold, currency, participants, clusters });
  return {
    study,
    ledger,
    designSet,
    hold,
    sizing,
    limits,
    currency,
    verdict: { headline: thinly(told.headline), detail: thinly(told.detail) },
    options,
  };
}

function weighedOption(
  { study, ledger, costs, limits }: Parts,
  hold: Hold,
  stored: OptionView,
  draft: KeptDraft | undefined,
  position: number,
): Weighed {
  const { name, plan } = draft ? weighable(draft) : stored;
  const ruling = stored.ruling && { kind: stored.ruling.kind, reason: stored.ruling.reason };
  const [option] = weigh({
    question: study.plan,
    ledger,
    costs,
    hold,
    limits: limits.limits,
    options: [{ id: stored.id, name, plan, ruling }],
  }) as [WeighedOption];
  return {
    ...option,
    error: option.error && toldPlainly(option.error, plan, ledger),
    letter: letterOf(position),
    ruling: stored.ruling,
    stored,
    draft,
    position,
    plan,
    words: wordsFor(study, plan),
  };
}

/** A planning value that is missing is asked for where it belongs, by the name that it has there. */
function toldPlainly(
  error: NonNullable<WeighedOption['error']>,
  plan: OptionPlan,
  ledger: PlanningValueView[],
): WeighedOption['error'] {
  const place = planningValuesOf(plan.family).find(({ path }) => path === error.path);
  if (!place || planningValueFor(place.key, plan, ledger) !== undefined) return error;
  const { label } = planningValueTraits[place.key];
  // “ICC” and “CV of cluster size” keep their capitals.
  const named = label.replace(/^[A-Z](?![A-Z])/, (letter) => letter.toLocaleLowerCase('en-GB'));
  return { ...error, message: `State the ${named} in the ledger: nothing can be computed without it.` };
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
