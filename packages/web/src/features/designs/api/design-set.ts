import type { DesignSetView } from '@steelyard/api/contract/design-sets';
import { queryOptions } from '@tanstack/react-query';
import { api } from '../../../shared/api/client';

export const designSetQuery = (studyId: string) =>
  queryOptions({
    queryKey: ['studies', studyId, 'design-set'],
    queryFn: ({ signal }) => api.get<DesignSetView>(`/studies/${studyId}/design-set`, signal),
  });
