import { type LedgerEntry, planningValueKeys } from '@steelyard/calc';
import type { PlanningValueRevisionView } from '../contract/planning-values.js';
import type { LedgerView, PlanningValueView } from '../contract/studies.js';
import type { PlanningValue } from './planning-value.entity.js';
import type { PlanningValueRevision } from './planning-value-revision.entity.js';

/** The ledger in the order in which planning values are listed; one for every family before those for one. */
export const ledgerView = (values: PlanningValue[]): LedgerView => ({
  values: values.map(planningValueView).toSorted(byKey),
});

export const ledgerEntryOf = ({ key, scope, value }: PlanningValue): LedgerEntry => ({
  key,
  family: scope === 'every-family' ? null : scope,
  value,
});

export function planningValueView(planningValue: PlanningValue): PlanningValueView {
  const { id, version, low, high, source, setBy, changedAt } = planningValue;
  return {
    id,
    version,
    ...ledgerEntryOf(planningValue),
    low: low ?? null,
    high: high ?? null,
    source,
    setBy: setBy.name,
    setAt: changedAt.toISOString(),
  };
}

export const planningValueRevisionView = ({
  version,
  value,
  low,
  high,
  source,
  setBy,
  setAt,
}: PlanningValueRevision): PlanningValueRevisionView => ({
  version,
  value,
  low: low ?? null,
  high: high ?? null,
  source,
  setBy: setBy.name,
  setAt: setAt.toISOString(),
});

const byKey = (a: PlanningValueView, b: PlanningValueView) =>
  planningValueKeys.indexOf(a.key) - planningValueKeys.indexOf(b.key) ||
  (a.family ?? '').localeCompare(b.family ?? '', 'en');
