import type { AuditEntryView, AuditView } from '@steelyard/api/contract/audit';
import { queryOptions } from '@tanstack/react-query';
import { api } from '../../../shared/api/client';

/** Who changed something of a study last, and when; null where that is further back than the last page tells. */
export const lastChangeQuery = (studyId: string, what: string) =>
  queryOptions({
    queryKey: ['studies', studyId, 'last-change', what],
    staleTime: 0,
    queryFn: async ({ signal }): Promise<Pick<AuditEntryView, 'by' | 'at'> | null> => {
      const { entries } = await api.get<AuditView>(`/studies/${studyId}/history`, signal);
      return entries.find((entry) => entry.what === what) ?? null;
    },
  });
