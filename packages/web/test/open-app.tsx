import { render } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { createMemoryRouter } from 'react-router-dom';
import { App, createSteelyard } from '../src/app/app';

/** The whole application at a path, with a person to act on it. */
export function openApp(path: string) {
  const steelyard = createSteelyard((routes) => createMemoryRouter(routes, { initialEntries: [path] }));
  // What the pages catch they show; React need not print it too.
  render(<App {...steelyard} />, { onCaughtError: () => undefined });
  return {
    user: userEvent.setup(),
    ...steelyard,
    address: () => {
      const { pathname, search } = steelyard.router.state.location;
      return `${pathname}${search}`;
    },
  };
}
