import '@testing-library/jest-dom/vitest';
import { cleanup } from '@testing-library/react';
import { afterAll, afterEach, beforeAll, beforeEach, vi } from 'vitest';
import { usePreferences } from '../src/shared/preferences';
import { server } from './server';
import { surroundings } from './surroundings';

// jsdom has dialogs, but cannot open or close them.
HTMLDialogElement.prototype.showModal = function open() {
  this.open = true;
};
HTMLDialogElement.prototype.close = function close() {
  this.open = false;
  this.dispatchEvent(new Event('close'));
};

beforeAll(() => server.listen({ onUnhandledRequest: 'error' }));
beforeEach(() => {
  surroundings.matching = [];
  vi.stubGlobal('matchMedia', surroundings.matchMedia);
  vi.stubGlobal('scrollTo', () => undefined);
});
afterEach(() => {
  cleanup();
  server.resetHandlers();
  localStorage.clear();
  usePreferences.setState(usePreferences.getInitialState());
  document.title = '';
});
afterAll(() => server.close());
