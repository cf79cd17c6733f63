import type { InvitationView, NewAccount, PeopleView } from '@steelyard/api/contract/people';
import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { api } from '../../../shared/api/client';
import { siteHistoryQuery } from '../../history/api/history';

export const peopleQuery = () =>
  queryOptions({
    queryKey: ['people'],
    queryFn: async ({ signal }) => (await api.get<PeopleView>('/people', signal)).people,
  });

export const useInvite = () =>
  useInvitation((account: NewAccount) => api.post<InvitationView>('/people', account));

export const useNewLink = () =>
  useInvitation((personId: string) => api.post<InvitationView>(`/people/${personId}/link`, {}));

function useInvitation<Variables>(mutationFn: (variables: Variables) => Promise<InvitationView>) {
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn,
    // A link must be in nobody's memory longer than it is on the screen.
    gcTime: 0,
    onSuccess: () => {
      void queryClient.invalidateQueries({ queryKey: peopleQuery().queryKey });
      void queryClient.invalidateQueries({ queryKey: siteHistoryQuery().queryKey });
    },
  });
}
