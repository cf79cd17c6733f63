import type { PersonView } from '@steelyard/api/contract/access';
import type { WelcomeView } from '@steelyard/api/contract/people';
import { queryOptions } from '@tanstack/react-query';
import { ApiError, api } from '../../../shared/api/client';

const path = (token: string) => `/welcome/${encodeURIComponent(token)}`;

/** Whom a link lets in; null when it lets nobody in, or nobody any more. */
export const welcomeQuery = (token: string) =>
  queryOptions({
    queryKey: ['welcome', token],
    queryFn: ({ signal }) =>
      api.get<WelcomeView>(path(token), signal).catch((error: unknown) => {
        if (error instanceof ApiError && error.status === 404) return null;
        throw error;
      }),
  });

export const enterByLink = (token: string, body: { password: string }) =>
  api.post<PersonView>(path(token), body);
