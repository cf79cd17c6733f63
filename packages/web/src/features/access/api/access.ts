import type { AccessView, FirstVisit, PersonView, SignIn } from '@steelyard/api/contract/access';
import { queryOptions } from '@tanstack/react-query';
import { ApiError, api } from '../../../shared/api/client';

/** What the sign-in page needs before anyone has signed in. */
export const accessQuery = () =>
  queryOptions({ queryKey: ['access'], queryFn: ({ signal }) => api.get<AccessView>('/access', signal) });

/** Who is signed in; null when nobody is. */
export const sessionQuery = () =>
  queryOptions({
    queryKey: ['session'],
    staleTime: Number.POSITIVE_INFINITY,
    queryFn: ({ signal }) => api.get<PersonView>('/session', signal).catch(nobodyWhenSignedOut),
  });

/** Being signed out already is an answer here, not a failure. */
function nobodyWhenSignedOut(error: unknown): null {
  if (error instanceof ApiError && error.status === 401) return null;
  throw error;
}

export const signIn = (body: SignIn) => api.post<PersonView>('/session', body);
export const signOut = () => api.delete('/session').catch(nobodyWhenSignedOut);
export const createAdministrator = (body: FirstVisit) => api.post<PersonView>('/first-visit', body);
