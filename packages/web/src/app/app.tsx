import { type QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { type DataRouter, type RouteObject, RouterProvider } from 'react-router-dom';
import { sessionQuery } from '../features/access/api/access';
import { paths, signInPath } from './paths';
import { createQueryClient } from './query-client';
import { createRoutes } from './router';
import { SteelyardTheme } from './theme/steelyard-theme';

export interface Steelyard {
  queryClient: QueryClient;
  router: DataRouter;
}

/** Ties queries and routes together: whichever query finds the session ended leads to the sign-in page. */
export function createSteelyard(startRouter: (routes: RouteObject[]) => DataRouter): Steelyard {
  const queryClient = createQueryClient(() => {
    const { navigation, location } = router.state;
    const here = navigation.location ?? location;
    // Pages ask for their data while the session is still being looked up: only who was in can have been put out.
    const expired = Boolean(queryClient.getQueryData(sessionQuery().queryKey));
    queryClient.setQueryData(sessionQuery().queryKey, null);
    if (here.pathname !== paths.signIn) {
      void router.navigate(signInPath(here), { replace: true, state: { expired } });
    }
  });
  const router = startRouter(createRoutes(queryClient));
  return { queryClient, router };
}

export function App({ queryClient, router }: Steelyard) {
  return (
    <QueryClientProvider client={queryClient}>
      <SteelyardTheme>
        <RouterProvider router={router} />
      </SteelyardTheme>
    </QueryClientProvider>
  );
}
