import { render } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { App } from '../src/app/app';
import { createQueryClient } from '../src/app/query-client';

/** The whole application at a path, with a person to act on it. */
export function openApp(path: string) {
  history.replaceState(null, '', path);
  const queryClient = createQueryClient();
  // What the pages catch they show; React need not print it too.
  render(<App queryClient={queryClient} />, { onCaughtError: () => undefined });
  return {
    user: userEvent.setup(),
    queryClient,
    address: () => `${location.pathname}${location.search}`,
  };
}
