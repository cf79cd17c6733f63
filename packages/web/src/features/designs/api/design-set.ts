import type { DesignSetView, OptionView } from '@steelyard/api/contract/design-sets';
import type { LimitsView, NewLimits } from '@steelyard/api/contract/limits';
import type { ChangedDesignSet } from '@steelyard/api/contract/options';
import { type QueryClient, queryOptions } from '@tanstack/react-query';
import { api } from '../../../shared/api/client';

export const designSetQuery = (studyId: string) =>
  queryOptions({
    queryKey: ['studies', studyId, 'design-set'],
    queryFn: ({ signal }) => api.get<DesignSetView>(`/studies/${studyId}/design-set`, signal),
  });

export const limitsQuery = (studyId: string) =>
  queryOptions({
    queryKey: ['studies', studyId, 'limits'],
    queryFn: ({ signal }) => api.get<LimitsView>(`/studies/${studyId}/limits`, signal),
  });

export const putDesignSet = (studyId: string, body: ChangedDesignSet) =>
  api.put<DesignSetView>(`/studies/${studyId}/design-set`, body);

export const putLimits = (studyId: string, body: NewLimits) =>
  api.put<LimitsView>(`/studies/${studyId}/limits`, body);

/** An option as it is known to be stored now, which what is drawn may not show yet. */
export const storedOption = (queryClient: QueryClient, studyId: string, optionId: string) =>
  queryClient.getQueryData(designSetQuery(studyId).queryKey)?.options.find(({ id }) => id === optionId);

/** Puts one option as the server now has it into the set at hand. */
export function keepOption(queryClient: QueryClient, studyId: string, option: OptionView): void {
  queryClient.setQueryData(designSetQuery(studyId).queryKey, (set) =>
    set ? { ...set, options: set.options.map((each) => (each.id === option.id ? option : each)) } : undefined,
  );
}

/** Puts the design set as the server now has it in place of what was shown. */
export function keepDesignSet(queryClient: QueryClient, studyId: string, set: DesignSetView | null): void {
  if (set) queryClient.setQueryData(designSetQuery(studyId).queryKey, set);
  void queryClient.invalidateQueries({ queryKey: ['studies', studyId] });
}

/** Puts the limits as the server now has them in place of what was shown; null where nobody has stated any. */
export function keepLimits(queryClient: QueryClient, studyId: string, limits: LimitsView | null): void {
  queryClient.setQueryData(limitsQuery(studyId).queryKey, limits ?? { version: null, limits: {} });
  void queryClient.invalidateQueries({ queryKey: ['studies', studyId] });
}
