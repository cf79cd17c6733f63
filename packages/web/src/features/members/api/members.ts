import type { MembersView, NewMember } from '@steelyard/api/contract/members';
import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { api } from '../../../shared/api/client';

export type Member = MembersView['members'][number];

export const membersQuery = (studyId: string) =>
  queryOptions({
    queryKey: ['studies', studyId, 'members'],
    staleTime: 0,
    queryFn: async ({ signal }) =>
      (await api.get<MembersView>(`/studies/${studyId}/members`, signal)).members,
  });

/** Adds a person by e-mail, or gives a member another role. */
export const useSetMember = (studyId: string) =>
  useChange(studyId, (member: NewMember) => api.put(`/studies/${studyId}/members`, member));

export const useRemoveMember = (studyId: string) =>
  useChange(studyId, (personId: string) => api.delete(`/studies/${studyId}/members/${personId}`));

function useChange<Variables>(studyId: string, mutationFn: (variables: Variables) => Promise<unknown>) {
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn,
    onSuccess: () => queryClient.invalidateQueries({ queryKey: membersQuery(studyId).queryKey }),
    onSettled: () => void queryClient.invalidateQueries({ queryKey: ['studies'] }),
  });
}
