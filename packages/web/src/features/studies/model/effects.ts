import type { DesignSetView } from '@steelyard/api/contract/design-sets';
import type { CostPlanView, PlanningValueView, StudyView } from '@steelyard/api/contract/studies';
import {
  type LedgerEntry,
  type QuestionPlan,
  type StudyCosts,
  type WeighedOption,
  weigh,
} from '@steelyard/calc';

/** What a study stores that its options are computed from. */
export interface Stored {
  study: StudyView;
  ledger: PlanningValueView[];
  costs: CostPlanView;
  designSet: Pick<DesignSetView, 'hold' | 'options'>;
}

/** What would be different once a change is saved. */
export interface Change {
  question?: QuestionPlan;
  ledger?: readonly LedgerEntry[];
  costs?: StudyCosts;
}

/** One option as it is and as a change would make it. */
export interface Effect {
  position: number;
  before: WeighedOption;
  after: WeighedOption;
}

/** Every option of a study before and after a change, computed here in the browser. */
export function effectsOf({ study, ledger, costs, designSet }: Stored, change: Change): Effect[] {
  const { hold, options } = designSet;
  const under = ({ question, ledger: lines, costs: plan }: Required<Change>) =>
    weigh({
      question,
      ledger: lines,
      costs: plan,
      hold,
      options: options.map(({ id, name, plan: of }) => ({ id, name, plan: of })),
    });
  const stored = { question: study.plan, ledger, costs };
  const after = under({ ...stored, ...change });
  return under(stored).map((before, position) => ({
    position,
    before,
    after: after[position] as WeighedOption,
  }));
}

/** A ledger with one line in place of what it said, or beside it. */
export function withLine(ledger: readonly LedgerEntry[], line: LedgerEntry): LedgerEntry[] {
  return [...ledger.filter(({ key, family }) => key !== line.key || family !== line.family), line];
}
