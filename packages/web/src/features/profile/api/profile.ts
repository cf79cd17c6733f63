import type { ChangedPassword, ChangedProfile, ProfileView } from '@steelyard/api/contract/people';
import { type QueryClient, queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { api } from '../../../shared/api/client';
import { sessionQuery } from '../../access/api/access';

export const profileQuery = () =>
  queryOptions({
    queryKey: ['profile'],
    queryFn: ({ signal }) => api.get<ProfileView>('/profile', signal),
  });

export const putProfile = (profile: ChangedProfile) => api.put<ProfileView>('/profile', profile);

/** Puts the name as the server now has it everywhere it is shown. */
export function keepProfile(queryClient: QueryClient, { version, ...person }: ProfileView): void {
  queryClient.setQueryData(profileQuery().queryKey, { ...person, version });
  queryClient.setQueryData(sessionQuery().queryKey, person);
  void queryClient.invalidateQueries({ queryKey: ['studies'] });
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
