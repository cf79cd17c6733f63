import { cleanup, screen, waitFor } from '@testing-library/react';
import { HttpResponse, http } from 'msw';
import { describe, expect, it } from 'vitest';
import { useKeptEdits } from '../src/features/unsaved/model/kept-edits';
import { greenkettle } from './fixtures/greenkettle';
import { stillfoot } from './fixtures/stillfoot';
import type { StudyFixture } from './fixtures/study-fixture';
import { openApp } from './open-app';
import { answer, problem, serve, server } from './server';

const field = (name: string | RegExp) => screen.getByRole('textbox', { name });
const start = () => screen.getByRole('button', { name: 'Start weighing' });

async function openNewStudy() {
  server.use(answer.session());
  const app = openApp('/studies/new');
  await screen.findByRole('form', { name: 'New study' });
  return app;
}

/** The server makes a study of what it is sent. */
function takeStudies(fixture: StudyFixture) {
  const sent: Record<string, unknown>[] = [];
  serve(fixture);
  server.use(
    http.post('*/api/studies', async ({ request }) => {
      sent.push((await request.json()) as Record<string, unknown>);
      return HttpResponse.json(fixture.study, { status: 201 });
    }),
  );
  return sent;
}

describe('A new study', () => {
  it('is begun from the list of studies', async () => {
    server.use(answer.session(), answer.studies());
    const { user, address } = openApp('/');
    await user.click(await screen.findByRole('link', { name: 'New study' }));
    await screen.findByRole('form', { name: 'New study' });
    expect(address()).toBe('/studies/new');
    expect(document.title).toBe('New study · Steelyard');
  });

  it('asks one page and lands on Weigh with a first option', async () => {
    const fixture = stillfoot();
    const sent = takeStudies(fixture);
    const { user, address } = await openNewStudy();
    await user.type(field(/^Question/), 'Does the gel lower pain by 1 point?');
    await user.type(field('Name of the study'), 'Stillfoot');
    await user.type(field('Organisation'), 'Brackwater Clinic');
    await user.type(field(/^Outcome/), 'Pain, 0–10');
    await user.type(field(/^Unit/), 'points');
    await user.type(field(/^Target difference/), '-1');
    await user.type(field(/^Standard deviation/), '2.1');
    await user.click(start());
    await screen.findByRole('table', { name: 'Options' });
    expect(address()).toMatch(new RegExp(`^/studies/${fixture.study.id}/weigh`));
    expect(sent).toEqual([
      {
        name: 'Stillfoot',
        organisation: 'Brackwater Clinic',
        question: 'Does the gel lower pain by 1 point?',
        outcome: { kind: 'continuous', label: 'Pain, 0–10', unit: 'points', difference: -1 },
        sd: 2.1,
        participants: { one: 'participant', many: 'participants' },
        clusters: null,
        treatments: [{ name: 'Control' }, { name: 'New treatment' }],
        randomises: 'individuals',
      },
    ]);
    expect(useKeptEdits.getState().edits).toEqual({});
  });

  it.each([
    {
      kind: /^Time to an event/,
      typed: {
        'Target hazard ratio': '0.7',
        'Survival is stated at': '12',
        Accrual: '18',
        'Follow-up after accrual': '12',
        'Controls free of the event': '60',
      },
      outcome: { kind: 'time-to-event', hazardRatio: 0.7, survivalAt: 12, accrual: 18, followUp: 12 },
      value: { controlSurvival: 0.6 },
    },
    {
      kind: /^Count/,
      typed: { 'Target rate ratio': '0,75', 'Exposure of each': '1', 'Control rate': '1.4' },
      outcome: { kind: 'count', rateRatio: 0.75, exposure: 1 },
      value: { controlRate: 1.4 },
    },
  ])(
    'asks for what belongs to its kind of outcome: $outcome.kind',
    async ({ kind, typed, outcome, value }) => {
      const sent = takeStudies(stillfoot());
      const { user } = await openNewStudy();
      await user.type(field(/^Question/), 'Does it help?');
      await user.type(field('Name of the study'), 'Helpful');
      await user.type(field('Organisation'), 'A clinic');
      await user.type(field(/^Outcome/), 'An outcome');
      await user.click(screen.getByRole('radio', { name: kind }));
      for (const [label, text] of Object.entries(typed)) {
        await user.type(field(new RegExp(`^${label}`)), text);
      }
      await user.click(start());
      await screen.findByRole('table', { name: 'Options' });
      expect(sent[0]).toMatchObject({ outcome: { label: 'An outcome', unit: '', ...outcome }, ...value });
    },
  );

  it('asks for proportions and for the study’s own words where clusters are randomised', async () => {
    const sent = takeStudies(greenkettle());
    const { user } = await openNewStudy();
    await user.type(field(/^Question/), 'Does the programme lower anaemia?');
    await user.type(field('Name of the study'), 'Greenkettle');
    await user.type(field('Organisation'), 'Fernhollow');
    await user.type(field(/^Outcome/), 'Anaemia at 4 months');
    await user.click(screen.getByRole('radio', { name: /^Binary/ }));
    await user.type(field(/^Target difference, in percentage points/), '-10');
    await user.type(field(/^Control proportion/), '40');
    await user.click(screen.getByRole('radio', { name: /^Clusters/ }));
    await user.clear(field('One cluster'));
    await user.type(field('One cluster'), 'catchment');
    await user.clear(field('Several clusters'));
    await user.type(field('Several clusters'), 'catchments');
    await user.click(start());
    await waitFor(() => expect(sent).toHaveLength(1));
    expect(sent[0]).toMatchObject({
      outcome: { kind: 'binary', difference: -0.1 },
      controlProportion: 0.4,
      clusters: { one: 'catchment', many: 'catchments' },
      randomises: 'clusters',
    });
    expect(sent[0]).not.toHaveProperty('sd');
  });

  it('says at each field what is missing, and sends nothing', async () => {
    const sent = takeStudies(stillfoot());
    const { user } = await openNewStudy();
    await user.click(start());
    for (const message of [
      'Ask the question in words.',
      'Name the study.',
      'Name the organisation.',
      'Name the outcome.',
      'The target difference must be a number.',
    ]) {
      expect(await screen.findByText(message)).toBeVisible();
    }
    expect(sent).toEqual([]);
  });

  it('puts a refusal at the field it concerns and keeps everything typed', async () => {
    const { user } = await openNewStudy();
    server.use(
      http.post('*/api/studies', () =>
        problem(422, 'invalid', { issues: [{ path: 'name', message: 'That name is taken.' }] }),
      ),
    );
    await user.type(field(/^Question/), 'Does it?');
    await user.type(field('Name of the study'), 'Stillfoot');
    await user.type(field('Organisation'), 'Brackwater');
    await user.type(field(/^Outcome/), 'Pain');
    await user.type(field(/^Target difference/), '1');
    await user.click(start());
    expect(await screen.findByText('That name is taken.')).toBeVisible();
    expect(field('Organisation')).toHaveValue('Brackwater');
  });

  it('leads to the sign-in page when the session has ended, and has the text on coming back', async () => {
    const { user, address } = await openNewStudy();
    await user.type(field(/^Question/), 'Does it?');
    await user.type(field('Name of the study'), 'Stillfoot');
    await user.type(field('Organisation'), 'Brackwater');
    await user.type(field(/^Outcome/), 'Pain');
    await user.type(field(/^Target difference/), '1');
    server.use(
      answer.access(),
      answer.session(null),
      http.post('*/api/studies', () => problem(401, 'signed-out')),
      http.get('*/api/studies', () => problem(401, 'signed-out')),
    );
    await user.click(start());
    await waitFor(() => expect(address()).toBe('/sign-in?from=%2Fstudies%2Fnew'));
    cleanup();
    await openNewStudy();
    expect(field(/^Question/)).toHaveValue('Does it?');
    expect(field(/^Target difference/)).toHaveValue('1');
  });
});
