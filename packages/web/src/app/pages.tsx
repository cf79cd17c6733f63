import { useQueryClient } from '@tanstack/react-query';
import { useDeferredValue, useLayoutEffect, useRef } from 'react';
import { useLocation, useNavigationType, useRoutes } from 'react-router-dom';
import { PageBoundary } from './page-boundary';
import { prepare, routes } from './route-table';

/** Every page. Before the first there is the ground, so that it has its colour while the page is sent for. */
export function Pages() {
  const queryClient = useQueryClient();
  const { pathname, key } = useLocation();
  const prepared = useRef<string>(undefined);
  // While it is drawn and not after, as a page is there only once it has what it is made of; and once, however often
  // it is drawn until then: what fails must not be asked for again unseen.
  if (prepared.current !== pathname) {
    prepared.current = pathname;
    prepare(queryClient, pathname);
  }
  return <PageBoundary address={key}>{useDeferredValue(true, false) && <Page />}</PageBoundary>;
}

/** Nothing here shows a fallback: the page before stays until the next one has its script and its person. */
function Page() {
  const { pathname } = useLocation();
  const arrival = useNavigationType();

  useLayoutEffect(() => {
    // A new page is read from its top; back and forward are the browser’s.
    if (arrival !== 'POP') scrollTo(0, 0);
  }, [pathname]);

  return useRoutes(routes);
}
