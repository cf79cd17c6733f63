import { cleanup, screen, waitFor, within } from '@testing-library/react';
import { HttpResponse, http } from 'msw';
import { describe, expect, it } from 'vitest';
import { useKeptEdits } from '../src/features/unsaved/model/kept-edits';
import { greenkettle } from './fixtures/greenkettle';
import { stillfoot } from './fixtures/stillfoot';
import type { StudyFixture } from './fixtures/study-fixture';
import { openApp } from './open-app';
import { problem, serve, server } from './server';

async function openQuestion(fixture: StudyFixture) {
  serve(fixture);
  const app = openApp(`/studies/${fixture.study.id}/question`);
  await screen.findByRole('form', { name: 'Question' });
  return app;
}

const field = (name: string | RegExp) => screen.getByRole('textbox', { name });

/** The server takes the question as the real one does, and tells what it was sent. */
function takeQuestions({ study }: StudyFixture) {
  const sent: Record<string, unknown>[] = [];
  server.use(
    http.put(`*/api/studies/${study.id}/question`, async ({ request }) => {
      const body = (await request.json()) as Record<string, unknown>;
      sent.push(body);
      Object.assign(study, body, { version: study.version + 1 });
      return HttpResponse.json({ ...study });
    }),
  );
  return sent;
}

describe('The question', () => {
  it('is shown with its outcome, test, treatments and words', async () => {
    await openQuestion(greenkettle());
    expect(field('Question')).toHaveValue(
      'Does the kitchen-garden programme raise haemoglobin by 3 g/L in adolescent girls?',
    );
    expect(screen.getByRole('radio', { name: /^Continuous/ })).toBeChecked();
    expect(field('Target difference')).toHaveValue('3');
    expect(field('Type I error')).toHaveValue('5');
    expect(screen.getByRole('radio', { name: 'Two-sided' })).toBeChecked();
    expect(field('Control')).toHaveValue('usual canteen');
    expect(field('Several clusters')).toHaveValue('catchments');
    expect(document.title).toBe('Question · Greenkettle · Steelyard');
  });

  it('shows what another target difference does to every option before it is saved, and once it is', async () => {
    const fixture = stillfoot();
    const sent = takeQuestions(fixture);
    const { user } = await openQuestion(fixture);
    await user.clear(field('Target difference'));
    await user.type(field('Target difference'), '-0.8');
    // 146 an arm by base R's power.t.test at a difference of 0.8, with 12 % more recruited.
    await waitFor(() =>
      expect(screen.getByRole('row', { name: /Parallel, unadjusted/ })).toHaveTextContent('214 → 332'),
    );
    await user.click(screen.getByRole('button', { name: 'Save the question' }));
    expect(await screen.findByText('Saved. Every option moved:')).toBeVisible();
    expect(sent[0]).toMatchObject({
      version: 1,
      plan: { outcome: { kind: 'continuous', difference: -0.8, better: 'lower' } },
      basis: null,
      estimand: null,
      clusters: null,
    });
  });

  it('asks for a margin where non-inferiority is tested, and of one side', async () => {
    const fixture = stillfoot();
    const sent = takeQuestions(fixture);
    const { user } = await openQuestion(fixture);
    await user.click(screen.getByRole('radio', { name: /^Non-inferiority/ }));
    await user.click(screen.getByRole('button', { name: 'Save the question' }));
    expect(await screen.findByText('State the margin that the difference must stay within.')).toBeVisible();
    expect(sent).toEqual([]);
    expect(screen.queryByRole('radio', { name: 'Two-sided' })).toBeNull();
    expect(field('Type I error')).toHaveValue('2.5');
    expect(field(/^Assumed difference/)).toHaveValue('-1');
    await user.type(field('Margin'), '0.5');
    await user.click(screen.getByRole('button', { name: 'Save the question' }));
    await waitFor(() => expect(sent).toHaveLength(1));
    expect(sent[0]?.plan).toEqual({
      outcome: { kind: 'continuous', difference: -1, better: 'lower' },
      test: { hypothesis: 'non-inferiority', alpha: 0.025, sides: 1, margin: 0.5 },
    });
  });

  it('asks for the categories of an ordinal outcome, which sum to 1', async () => {
    const fixture = stillfoot();
    const sent = takeQuestions(fixture);
    const { user } = await openQuestion(fixture);
    await user.click(screen.getByRole('radio', { name: /^Ordinal/ }));
    await user.type(field(/^Target odds ratio/), '1.8');
    await user.type(field('Category 1'), '20');
    await user.type(field('Category 2'), '50');
    await user.type(field('Category 3'), '40');
    await user.click(screen.getByRole('button', { name: 'Save the question' }));
    expect(await screen.findByText('The probabilities of the categories must sum to 1.')).toBeVisible();
    await user.click(screen.getByRole('button', { name: 'Remove category 3' }));
    await user.click(screen.getByRole('button', { name: 'Add a category' }));
    await user.type(field('Category 3'), '30');
    await user.click(screen.getByRole('button', { name: 'Save the question' }));
    await waitFor(() => expect(sent).toHaveLength(1));
    expect(sent[0]).toHaveProperty('plan.outcome', {
      kind: 'ordinal',
      better: 'lower',
      oddsRatio: 1.8,
      controlProbabilities: [0.2, 0.5, 0.3],
    });
  });

  it('takes the basis and the estimand with its intercurrent events', async () => {
    const fixture = stillfoot();
    const sent = takeQuestions(fixture);
    const { user } = await openQuestion(fixture);
    await user.click(screen.getByRole('radio', { name: 'It is both important and realistic' }));
    await user.type(field(/^To whom/), 'A panel of eight');
    await user.type(field(/^Because/), 'Worth the trouble');
    await user.type(field(/^Population$/), 'Adults with stable pain');
    await user.click(screen.getByRole('button', { name: 'Add an event' }));
    await user.type(field('Event 1'), 'Rescue medication');
    await user.selectOptions(screen.getByRole('combobox', { name: 'Strategy for event 1' }), 'composite');
    await user.click(screen.getByRole('button', { name: 'Save the question' }));
    await waitFor(() => expect(sent).toHaveLength(1));
    expect(sent[0]).toMatchObject({
      basis: { kind: 'both', toWhom: 'A panel of eight', why: 'Worth the trouble' },
      estimand: {
        population: 'Adults with stable pain',
        intercurrentEvents: [{ event: 'Rescue medication', strategy: 'composite' }],
        treatment: '',
      },
    });
  });

  it('says at the field what is missing, and sends nothing', async () => {
    const fixture = stillfoot();
    const sent = takeQuestions(fixture);
    const { user } = await openQuestion(fixture);
    await user.clear(field('Question'));
    await user.clear(field('Target difference'));
    await user.type(field('Target difference'), '0');
    await user.type(field(/^Because/), 'Said so');
    await user.click(screen.getByRole('button', { name: 'Save the question' }));
    expect(await screen.findByText('Ask the question in words.')).toBeVisible();
    expect(screen.getByText(/The target difference must not be 0/)).toBeVisible();
    expect(screen.getByText('Choose one.')).toBeVisible();
    expect(sent).toEqual([]);
  });

  it('puts a refusal at the field it concerns', async () => {
    const fixture = stillfoot();
    const { user } = await openQuestion(fixture);
    server.use(
      http.put(`*/api/studies/${fixture.study.id}/question`, () =>
        problem(422, 'invalid', {
          issues: [
            { path: 'treatments.1.name', message: 'That name is taken.' },
            { path: 'treatments', message: 'Options compare three.' },
          ],
        }),
      ),
    );
    await user.type(field('Active treatment'), ' 2 %');
    await user.click(screen.getByRole('button', { name: 'Save the question' }));
    expect(await screen.findByText('That name is taken.')).toBeVisible();
    expect(screen.getByText('Options compare three.')).toBeVisible();
    expect(field('Active treatment')).toHaveValue('vantholine gel 2 %');
  });

  it('keeps what was typed through a reload', async () => {
    const fixture = stillfoot();
    const { user } = await openQuestion(fixture);
    await user.type(field('Outcome'), ', by diary');
    cleanup();
    await openQuestion(fixture);
    expect(field('Outcome')).toHaveValue('mean pain, 0–10, over the last 7 days, by diary');
  });

  it('leads to the sign-in page when the session has ended, and has the text on coming back', async () => {
    const fixture = stillfoot();
    const { user, address } = await openQuestion(fixture);
    await user.type(field('Outcome'), ', by diary');
    server.use(
      http.get('*/api/session', () => problem(401, 'signed-out')),
      http.get('*/api/access', () => HttpResponse.json({ firstVisit: false, demo: null })),
      http.get('*/api/studies', () => problem(401, 'signed-out')),
      http.put(`*/api/studies/${fixture.study.id}/question`, () => problem(401, 'signed-out')),
    );
    await user.click(screen.getByRole('button', { name: 'Save the question' }));
    await waitFor(() => expect(address()).toMatch(/^\/sign-in/));
    cleanup();
    await openQuestion(fixture);
    expect(field('Outcome')).toHaveValue('mean pain, 0–10, over the last 7 days, by diary');
  });

  it('puts both versions side by side when somebody saved first', async () => {
    const fixture = stillfoot();
    const { study } = fixture;
    const { user } = await openQuestion(fixture);
    server.use(
      http.put(`*/api/studies/${study.id}/question`, () =>
        problem(409, 'stale', { current: { ...study, version: 2, outcomeLabel: 'pain at 6 weeks' } }),
      ),
      http.get(`*/api/studies/${study.id}/history`, () =>
        HttpResponse.json({
          entries: [
            {
              id: 7,
              at: '2026-11-30T09:00:00.000Z',
              by: 'Ilse Quennell',
              action: 'changed',
              what: 'the question',
              before: null,
              after: null,
            },
          ],
          next: null,
        }),
      ),
    );
    await user.clear(field('Outcome'));
    await user.type(field('Outcome'), 'worst pain');
    await user.click(screen.getByRole('button', { name: 'Save the question' }));
    expect(await screen.findByText('Ilse Quennell saved first')).toBeVisible();
    const both = screen.getByRole('table', { name: 'Your version and theirs' });
    expect(within(both).getByRole('row', { name: 'Outcome worst pain pain at 6 weeks' })).toBeVisible();
    study.version = 2;
    study.outcomeLabel = 'pain at 6 weeks';
    await user.click(screen.getByRole('button', { name: 'Take theirs' }));
    await waitFor(() => expect(field('Outcome')).toHaveValue('pain at 6 weeks'));
    expect(useKeptEdits.getState().edits).toEqual({});
  });

  it('is read and not changed by a reader', async () => {
    const fixture = stillfoot();
    fixture.study.role = 'reader';
    serve(fixture);
    openApp(`/studies/${fixture.study.id}/question`);
    expect(await screen.findByText(fixture.study.question)).toBeVisible();
    expect(screen.getByText('−1 points')).toBeVisible();
    expect(screen.getByText('The test is two-sided.')).toBeVisible();
    expect(screen.queryByRole('textbox')).not.toBeInTheDocument();
    expect(screen.queryByRole('button', { name: /Save/ })).not.toBeInTheDocument();
  });
});
