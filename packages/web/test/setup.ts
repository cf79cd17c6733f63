import '@testing-library/jest-dom/vitest';
import { cleanup, configure } from '@testing-library/react';
import { afterAll, afterEach, beforeAll, beforeEach, vi } from 'vitest';
import { useDrafts } from '../src/features/designs/model/drafts';
import { useKeptEdits } from '../src/features/unsaved/model/kept-edits';
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

// It has no canvas to draw on either.
HTMLCanvasElement.prototype.getContext = () => null;

// A page's script is fetched the first time it is opened, which a busy machine may take its time over.
configure({ asyncUtilTimeout: 8000 });

// jsdom lays nothing out: nothing is ever resized.
class NothingResizes {
  observe(): void {}
  unobserve(): void {}
  disconnect(): void {}
}

beforeAll(() => server.listen({ onUnhandledRequest: 'error' }));
beforeEach(() => {
  surroundings.matching = [];
  vi.stubGlobal('matchMedia', surroundings.matchMedia);
  vi.stubGlobal('scrollTo', () => undefined);
  vi.stubGlobal('ResizeObserver', NothingResizes);
});
afterEach(() => {
  cleanup();
  server.resetHandlers();
  localStorage.clear();
  usePreferences.setState(usePreferences.getInitialState());
  useDrafts.setState({ drafts: {}, sizings: {} });
  useKeptEdits.setState(useKeptEdits.getInitialState());
  document.title = '';
});
afterAll(() => server.close());
