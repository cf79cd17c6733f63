import type { ChangedPassword, ChangedProfile, ProfileView } from '@steelyard/api/contract/people';
import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { ApiError, api } from '../../../shared/api/client';
import { sessionQuery } from '../../access/api/access';

export const profileQuery = () =>
  queryOptions({
    queryKey: ['profile'],
    queryFn: ({ signal }) => api.get<ProfileView>('/profile', signal),
  });

/** The name, everywhere it is shown. */
export function useSaveProfile() {
  const queryClient = useQueryClient();
  const take = ({ version, ...person }: ProfileView) => {
    queryClient.setQueryData(profileQuery().queryKey, { ...person, version });
    queryClient.setQueryData(sessionQuery().queryKey, person);
  };
  return useMutation({
    mutationFn: (profile: ChangedProfile) => api.put<ProfileView>('/profile', profile),
    onSuccess: (profile) => {
      take(profile);
      void queryClient.invalidateQueries({ queryKey: ['studies'] });
    },
    onError: (error) => {
      const theirs = currentIn(error);
      if (theirs) take(theirs);
    },
  });
}

/** What a stale change met instead, where that is why it was refused. */
export function currentIn(error: unknown): ProfileView | undefined {
  const stale = error instanceof ApiError && error.problem.code === 'stale';
  return stale ? (error.problem.current as ProfileView) : undefined;
}

export function useChangePassword() {
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn: (passwords: ChangedPassword) => api.put('/profile/password', passwords),
    // The person has another version now.
    onSuccess: () => queryClient.invalidateQueries({ queryKey: profileQuery().queryKey }),
  });
}

export const signOutEverywhere = () => api.delete('/sessions');
