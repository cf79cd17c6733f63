import { MutationCache, QueryCache, QueryClient } from '@tanstack/react-query';
import { sessionQuery } from '../features/access/api/access';
import { ApiError } from '../shared/api/client';

/** Queries and changes of this application; whichever finds the session ended makes it known to all. */
export function createQueryClient(): QueryClient {
  const signedOut = () => void queryClient.setQueryData(sessionQuery().queryKey, null);
  const queryClient = new QueryClient({
    queryCache: new QueryCache({
      onError: (error) => {
        if (statusOf(error) === 401) signedOut();
      },
    }),
    mutationCache: new MutationCache({
      onError: (error) => {
        if (statusOf(error) === 401) signedOut();
        // What was to be changed is gone, or no longer open to this person: the page must learn of it too.
        if (statusOf(error) === 404) void queryClient.invalidateQueries({ queryKey: ['studies'] });
      },
    }),
    defaultOptions: {
      queries: {
        staleTime: 30_000,
        retry: (failures, error) => failures < 1 && mayPass(error),
        retryDelay: 500,
      },
    },
  });
  return queryClient;
}

const statusOf = (error: Error) => (error instanceof ApiError ? error.status : undefined);

/** A server that is starting or out of reach may answer the second time; a refusal stays one. */
function mayPass(error: Error): boolean {
  return error instanceof ApiError && (error.status === 0 || error.status >= 500);
}
