import type { NewCostPlan } from '@steelyard/api/contract/costs';
import type { CostPlanView } from '@steelyard/api/contract/studies';
import type { QueryClient } from '@tanstack/react-query';
import { api } from '../../../shared/api/client';
import { costsQuery } from '../../studies/api/studies';

export const putCosts = (studyId: string, body: NewCostPlan) =>
  api.put<CostPlanView>(`/studies/${studyId}/costs`, body);

/** Puts the cost plan as the server now has it in place of what was shown. */
export function keepCosts(queryClient: QueryClient, studyId: string, costs: CostPlanView): void {
  queryClient.setQueryData(costsQuery(studyId).queryKey, costs);
  void queryClient.invalidateQueries({ queryKey: ['studies', studyId] });
  void queryClient.invalidateQueries({ queryKey: ['studies'], exact: true });
}
