import type { OptionView } from '@steelyard/api/contract/design-sets';
import type { ChangedOption, NewOption } from '@steelyard/api/contract/options';
import { screen, within } from '@testing-library/react';
import { HttpResponse, http } from 'msw';
import { id, type StudyFixture } from './fixtures/study-fixture';
import { openApp } from './open-app';
import { answer, person, serve, server } from './server';

/** Weigh as it is drawn, with a server that answers with the fixture as it then stands. */
export async function openWeigh(fixture: StudyFixture, search = '', who = person) {
  serve(fixture);
  server.use(
    answer.session(who),
    http.get('*/api/studies/:id/design-set', () => HttpResponse.json(fixture.designSet)),
    http.get('*/api/studies/:id/limits', () => HttpResponse.json(fixture.limits)),
  );
  const app = openApp(`/studies/${fixture.study.id}/weigh${search}`);
  await screen.findByRole('table', { name: 'Options' });
  return app;
}

/** Weigh with the chosen option’s form, which opens by itself where an edit was begun. */
export async function openEditing(fixture: StudyFixture) {
  const app = await openWeigh(fixture);
  const edit = screen.queryByRole('button', { name: 'Edit' });
  if (edit) await app.user.click(edit);
  await screen.findByRole('form', { name: 'Option' });
  return app;
}

/** The server stores the options that are put and answers with them from then on, each time once it is let. */
export function storesOptions({ designSet }: StudyFixture, answered = async () => {}): ChangedOption[] {
  const sent: ChangedOption[] = [];
  server.use(
    http.put('*/api/studies/:id/options/:optionId', async ({ request, params }) => {
      const body = (await request.json()) as ChangedOption;
      sent.push(body);
      const at = designSet.options.findIndex((each) => each.id === params.optionId);
      const stored = { ...designSet.options[at], ...body, version: body.version + 1 } as OptionView;
      designSet.options[at] = stored;
      await answered();
      return HttpResponse.json(stored);
    }),
  );
  return sent;
}

/** The server adds the options that are posted. */
export function addsOptions({ designSet }: StudyFixture): NewOption[] {
  const sent: NewOption[] = [];
  server.use(
    http.post('*/api/studies/:id/options', async ({ request }) => {
      const body = (await request.json()) as NewOption;
      sent.push(body);
      const ruling = body.ruling && { ...body.ruling, by: 'Tomas Arrivel', at: '2026-11-20T10:00:00.000Z' };
      const added = { ...body, id: id(), version: 1, ruling: ruling ?? null } as OptionView;
      designSet.options.push(added);
      return HttpResponse.json(added, { status: 201 });
    }),
  );
  return sent;
}

export const optionRows = () => within(screen.getByRole('table', { name: 'Options' })).getAllByRole('row');

export const optionRow = (name: RegExp) =>
  within(screen.getByRole('table', { name: 'Options' })).getByRole('row', { name });
