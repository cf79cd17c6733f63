import type { NewPlanningValue, PlanningValueHistoryView } from '@steelyard/api/contract/planning-values';
import type { PlanningValueView } from '@steelyard/api/contract/studies';
import { type QueryClient, queryOptions } from '@tanstack/react-query';
import { api } from '../../../shared/api/client';
import { ledgerQuery } from '../../studies/api/studies';

export const putPlanningValue = (studyId: string, body: NewPlanningValue) =>
  api.put<PlanningValueView>(`/studies/${studyId}/planning-values`, body);

export const removePlanningValue = (studyId: string, { id, version }: PlanningValueView) =>
  api.delete(`/studies/${studyId}/planning-values/${id}`, { version });

export const planningValueHistoryQuery = (studyId: string, { id, version }: PlanningValueView) =>
  queryOptions({
    queryKey: ['studies', studyId, 'planning-values', id, 'history', version],
    queryFn: async ({ signal }) =>
      (await api.get<PlanningValueHistoryView>(`/studies/${studyId}/planning-values/${id}/history`, signal))
        .entries,
  });

/** Puts one line as the server now has it into the ledger at hand, and asks for the whole again. */
export function keepLine(
  queryClient: QueryClient,
  studyId: string,
  of: Pick<PlanningValueView, 'key' | 'family'>,
  line: PlanningValueView | null,
): void {
  const { queryKey } = ledgerQuery(studyId);
  queryClient.setQueryData(queryKey, (values) => {
    if (!values) return undefined;
    const rest = values.filter(({ key, family }) => key !== of.key || family !== of.family);
    return line ? [...rest, line] : rest;
  });
  void queryClient.invalidateQueries({ queryKey: ['studies', studyId] });
  void queryClient.invalidateQueries({ queryKey: ['studies'], exact: true });
}
