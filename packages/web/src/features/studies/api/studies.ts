import type { CostPlanView, LedgerView, StudySummary, StudyView } from '@steelyard/api/contract/studies';
import type { StudyStart } from '@steelyard/api/contract/study-start';
import { queryOptions } from '@tanstack/react-query';
import { api } from '../../../shared/api/client';

export const studiesQuery = () =>
  queryOptions({
    queryKey: ['studies'],
    queryFn: async ({ signal }) => (await api.get<{ studies: StudySummary[] }>('/studies', signal)).studies,
  });

export const studyQuery = (id: string) =>
  queryOptions({
    queryKey: ['studies', id],
    queryFn: ({ signal }) => api.get<StudyView>(`/studies/${id}`, signal),
  });

export const ledgerQuery = (id: string) =>
  queryOptions({
    queryKey: ['studies', id, 'planning-values'],
    queryFn: async ({ signal }) =>
      (await api.get<LedgerView>(`/studies/${id}/planning-values`, signal)).values,
  });

export const costsQuery = (id: string) =>
  queryOptions({
    queryKey: ['studies', id, 'costs'],
    queryFn: ({ signal }) => api.get<CostPlanView>(`/studies/${id}/costs`, signal),
  });

export const startStudy = (body: StudyStart) => api.post<StudyView>('/studies', body);
