import { QueryCache, QueryClient } from '@tanstack/react-query';
import { ApiError } from '../shared/api/client';

/** Queries of this application; `onSignedOut` hears of any that finds the session ended. */
export function createQueryClient(onSignedOut: () => void): QueryClient {
  return new QueryClient({
    queryCache: new QueryCache({
      onError: (error) => {
        if (error instanceof ApiError && error.status === 401) onSignedOut();
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
}

/** A server that is starting or out of reach may answer the second time; a refusal stays one. */
function mayPass(error: Error): boolean {
  return error instanceof ApiError && (error.status === 0 || error.status >= 500);
}
