import type { PlanningValueView, StudyView } from '@steelyard/api/contract/studies';
import {
  type FamilyId,
  families,
  type LedgerEntry,
  type OptionPlan,
  type PlanningValueKey,
  planningValueKeys,
  planningValuesOf,
  planningValueTraits,
  requestOf,
} from '@steelyard/calc';
import { figure, percent, withUnit } from '../../../shared/format/numbers';
import type { NumberKind } from '../../../shared/ui/number-field-text';
import { toReplace } from '../../studies/model/assumed';
import { withLine } from '../../studies/model/effects';

/** One line of the ledger: a planning value that is stated, or one that the options draw on and nobody has stated. */
export interface Line {
  id: string;
  key: PlanningValueKey;
  family: FamilyId | null;
  label: string;
  stored: PlanningValueView | null;
  /** The options that take their value from this line, by their place. */
  drawnOnBy: number[];
  assumed: boolean;
}

const takes = (family: FamilyId, key: PlanningValueKey, { plan }: StudyView): boolean =>
  planningValuesOf(family, plan.outcome.kind).some((place) => place.key === key);

export const lineId = (key: PlanningValueKey, family: FamilyId | null) => `${key}/${family ?? 'every'}`;

/** A figure that no study would state: where it turns up in a request, the option draws on the line it stands in. */
const marker = 0.123456789012;

function reaches(study: StudyView, ledger: readonly LedgerEntry[], plan: OptionPlan, key: PlanningValueKey) {
  const request: unknown = requestOf(
    { question: study.plan, ledger, costs: null, hold: { kind: 'power', power: 0.9 } },
    plan,
  );
  return planningValuesOf(plan.family).some(
    (place) =>
      place.key === key &&
      place.path.split('.').reduce<unknown>((part, step) => (part as Json | undefined)?.[step], request) ===
        marker,
  );
}

type Json = Record<string, unknown>;

export function lineOf(
  key: PlanningValueKey,
  family: FamilyId | null,
  { study, ledger, plans }: { study: StudyView; ledger: PlanningValueView[]; plans: readonly OptionPlan[] },
): Line {
  const stored = ledger.find((line) => line.key === key && line.family === family) ?? null;
  const marked = withLine(ledger, { key, family, value: marker });
  const drawnOnBy = plans.flatMap((plan, position) => (reaches(study, marked, plan, key) ? [position] : []));
  const { label } = planningValueTraits[key];
  return {
    id: lineId(key, family),
    key,
    family,
    label: family ? `${label}, ${families[family].name.toLocaleLowerCase('en-GB')}` : label,
    stored,
    drawnOnBy,
    assumed: stored?.source === toReplace,
  };
}

/** What the ledger states and what the options' families would draw on besides, in the order of the keys. */
export function linesOf(study: StudyView, ledger: PlanningValueView[], plans: readonly OptionPlan[]): Line[] {
  const from = { study, ledger, plans };
  return planningValueKeys.flatMap((key) => {
    const stated = ledger
      .filter((line) => line.key === key)
      .toSorted((a, b) => (a.family ?? '').localeCompare(b.family ?? ''));
    const general = stated.some(({ family }) => family === null);
    const wanted = plans.some(({ family }) => takes(family, key, study));
    return [
      ...(wanted && !general ? [lineOf(key, null, from)] : []),
      ...stated.map(({ family }) => lineOf(key, family, from)),
    ];
  });
}

/** The values that one family of the options might take on its own and does not yet. */
export function apartFrom(
  study: StudyView,
  ledger: PlanningValueView[],
  plans: readonly OptionPlan[],
): Line[] {
  const from = { study, ledger, plans };
  return [...new Set(plans.map(({ family }) => family))].flatMap((family) =>
    planningValueKeys
      .filter((key) => takes(family, key, study))
      .map((key) => lineOf(key, family, from))
      .filter(({ stored }) => !stored),
  );
}

/** How a planning value is typed and shown. */
export function figureOf(key: PlanningValueKey, { outcomeUnit, plan }: StudyView) {
  const { unit: sort } = planningValueTraits[key];
  const kind: NumberKind = sort === 'proportion' ? 'percent' : 'number';
  const unit = sort === 'outcome' && plan.outcome.kind === 'continuous' ? outcomeUnit : '';
  return {
    kind,
    unit,
    show: (value: number) => (kind === 'percent' ? percent(value, 2) : withUnit(figure(value), unit)),
  };
}

export function rangeOf(
  { low, high }: Pick<PlanningValueView, 'low' | 'high'>,
  show: (value: number) => string,
): string | undefined {
  if (low !== null && high !== null) return `${show(low)} to ${show(high)}`;
  if (low !== null) return `${show(low)} or more`;
  return high === null ? undefined : `${show(high)} or less`;
}
