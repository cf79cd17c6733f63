import { screen, within } from '@testing-library/react';
import { HttpResponse, http } from 'msw';
import type { StudyFixture } from './fixtures/study-fixture';
import { openApp } from './open-app';
import { serve, server } from './server';

/** Weigh as it is drawn, with a server that answers with the fixture as it then stands. */
export async function openWeigh(fixture: StudyFixture) {
  serve(fixture);
  server.use(
    http.get('*/api/studies/:id/design-set', () => HttpResponse.json(fixture.designSet)),
    http.get('*/api/studies/:id/limits', () => HttpResponse.json(fixture.limits)),
  );
  const app = openApp(`/studies/${fixture.study.id}/weigh`);
  await screen.findByRole('table', { name: 'Options' });
  return app;
}

export const optionRows = () => within(screen.getByRole('table', { name: 'Options' })).getAllByRole('row');

export const optionRow = (name: RegExp) =>
  within(screen.getByRole('table', { name: 'Options' })).getByRole('row', { name });
