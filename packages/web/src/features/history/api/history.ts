import type { AuditView } from '@steelyard/api/contract/audit';
import { infiniteQueryOptions } from '@tanstack/react-query';
import { api } from '../../../shared/api/client';

/** What happened in a study, newest first, page by page; asked afresh whenever it is looked at. */
export const studyHistoryQuery = (studyId: string) =>
  pagesOf(['studies', studyId, 'history'], `/studies/${studyId}/history`);

/** What happened to people and their accounts. */
export const siteHistoryQuery = () => pagesOf(['audit'], '/audit');

export type HistoryQuery = ReturnType<typeof pagesOf>;

const pagesOf = (queryKey: string[], path: string) =>
  infiniteQueryOptions({
    queryKey,
    staleTime: 0,
    initialPageParam: null as number | null,
    queryFn: ({ pageParam, signal }) =>
      api.get<AuditView>(pageParam === null ? path : `${path}?before=${pageParam}`, signal),
    getNextPageParam: ({ next }) => next,
  });
