import type { LimitsView } from '@steelyard/api/contract/limits';
import { cleanup, screen, waitFor, within } from '@testing-library/react';
import type { UserEvent } from '@testing-library/user-event';
import { HttpResponse, http } from 'msw';
import { describe, expect, it } from 'vitest';
import { useKeptEdits } from '../src/features/unsaved/model/kept-edits';
import { greenkettle } from './fixtures/greenkettle';
import { stillfoot } from './fixtures/stillfoot';
import type { StudyFixture } from './fixtures/study-fixture';
import { person, problem, server } from './server';
import { openWeigh } from './weigh-page';

const amara = { by: 'Amara Doss', at: '2026-11-21T10:00:00.000Z' };
const theirReason = 'The canteen is shared.';

/** A dialog on Weigh, with a change that somebody types into it and one that somebody else has stored meanwhile. */
interface Case {
  says: string;
  fixture: () => StudyFixture;
  path: string;
  /** The button, before and after somebody else’s change. */
  opener: RegExp;
  title: string;
  verb: string;
  type: (user: UserEvent) => Promise<void>;
  expectTyped: () => void;
  /** Somebody else’s change of the same thing. */
  change: (fixture: StudyFixture) => void;
  /** Somebody else’s change of what stands beside it under the same version. */
  changeElse?: (fixture: StudyFixture) => void;
  current: (fixture: StudyFixture) => { version: number | null };
  /** A row of the table of differences: what, mine, theirs. */
  row: RegExp;
  sent: object;
  expectTheirs: () => void;
}

const dialog = () => within(screen.getByRole('dialog'));

async function typeInto(user: UserEvent, label: string, text: string) {
  await user.clear(dialog().getByLabelText(label));
  await user.type(dialog().getByLabelText(label), text);
}

const first = ({ designSet: { options } }: StudyFixture) => options[0] as (typeof options)[number];

const cases: Case[] = [
  {
    says: 'the limits',
    fixture: greenkettle,
    path: '*/api/studies/:id/limits',
    opener: /^(Set|More) limits$/,
    title: 'Limits',
    verb: 'Set the limits',
    type: (user) => typeInto(user, 'Months', '30'),
    expectTyped: () => expect(dialog().getByLabelText('Months')).toHaveValue('30'),
    change: (fixture) => {
      fixture.limits = { version: 7, limits: { months: 24, money: 800_000 } };
    },
    current: ({ limits }) => limits,
    row: /^Months 30 24$/,
    sent: { limits: { months: 30 } },
    expectTheirs: () => {
      expect(dialog().getByLabelText('Months')).toHaveValue('24');
      expect(dialog().getByLabelText('Money')).toHaveValue('800,000');
    },
  },
  {
    says: 'the hold',
    fixture: greenkettle,
    path: '*/api/studies/:id/design-set',
    opener: /^Change what is held$/,
    title: 'What is kept equal',
    verb: 'Hold',
    type: (user) => typeInto(user, 'Power', '90'),
    expectTyped: () => expect(dialog().getByLabelText('Power')).toHaveValue('90'),
    change: ({ designSet }) =>
      Object.assign(designSet, { version: 7, hold: { kind: 'budget', power: 0.85, budget: 700_000 } }),
    changeElse: ({ designSet }) =>
      Object.assign(designSet, { version: 7, options: designSet.options.toReversed() }),
    current: ({ designSet }) => designSet,
    row: /^Power, % 90 85$/,
    sent: { hold: { kind: 'power', power: 0.9 } },
    expectTheirs: () => {
      expect(dialog().getByRole('radio', { name: /^Budget:/ })).toBeChecked();
      expect(dialog().getByLabelText('Budget')).toHaveValue('700,000');
    },
  },
  {
    says: 'a ruling',
    fixture: stillfoot,
    path: '*/api/studies/:id/options/:optionId/ruling',
    opener: /^(Rule on it|Change the ruling)$/,
    title: 'Ruling on Parallel, unadjusted',
    verb: 'Rule',
    type: (user) => typeInto(user, 'Reason', 'It is plain and known.'),
    expectTyped: () => expect(dialog().getByLabelText('Reason')).toHaveValue('It is plain and known.'),
    change: (fixture) =>
      Object.assign(first(fixture), {
        version: 7,
        ruling: { kind: 'not-admissible', reason: theirReason, ...amara },
      }),
    changeElse: (fixture) => Object.assign(first(fixture), { version: 7, name: 'Parallel, plain' }),
    current: first,
    row: /^Reason It is plain and known\. The canteen is shared\.$/,
    sent: { kind: 'admissible', reason: 'It is plain and known.' },
    expectTheirs: () => {
      expect(dialog().getByRole('radio', { name: 'Not admissible' })).toBeChecked();
      expect(dialog().getByLabelText('Reason')).toHaveValue(theirReason);
    },
  },
  {
    says: 'the choice',
    fixture: stillfoot,
    path: '*/api/studies/:id/choice',
    opener: /^(Record the choice|Change)$/,
    title: 'Record the choice',
    verb: 'Record the choice',
    type: async (user) => {
      await user.click(dialog().getByRole('radio', { name: 'C, Crossover' }));
      await typeInto(user, 'Why this one', 'The fewest.');
      await typeInto(user, 'Why not A, Parallel, unadjusted', 'Dear.');
      await typeInto(user, 'Why not B, Parallel, baseline-adjusted', 'Slow.');
    },
    expectTyped: () => {
      expect(dialog().getByLabelText('Why this one')).toHaveValue('The fewest.');
      expect(dialog().getByLabelText('Why not A, Parallel, unadjusted')).toHaveValue('Dear.');
    },
    change: (fixture) =>
      Object.assign(fixture.designSet, {
        version: 7,
        choice: { optionId: first(fixture).id, why: 'Known to all.', whyNot: [], ...amara },
      }),
    changeElse: ({ designSet }) =>
      Object.assign(designSet, { version: 7, hold: { kind: 'power', power: 0.85 } }),
    current: ({ designSet }) => designSet,
    row: /^Why this one The fewest\. Known to all\.$/,
    sent: { why: 'The fewest.' },
    expectTheirs: () => expect(dialog().getByLabelText('Why this one')).toHaveValue('Known to all.'),
  },
];

const casesBeside = cases.flatMap(({ changeElse, ...rest }) => (changeElse ? [{ ...rest, changeElse }] : []));

/** A server that refuses every change of a version that is not the one it has, and takes the others. */
function refusesWhatIsStale(fixture: StudyFixture, { path, current }: Case) {
  const sent: { version: number | null }[] = [];
  server.use(
    http.put(path, async ({ request }) => {
      const body = (await request.json()) as LimitsView;
      sent.push(body);
      if (body.version !== current(fixture).version)
        return problem(409, 'stale', { current: current(fixture) });
      const { version: _, ...change } = body;
      Object.assign(current(fixture), path.endsWith('limits') ? change : {}, { version: 8 });
      return HttpResponse.json(current(fixture));
    }),
    http.get('*/api/studies/:id/history', () =>
      HttpResponse.json({
        entries: ['limits', 'what is held and the order of the options'].map((what, id) => ({
          id,
          ...amara,
          action: 'changed',
          what,
          before: null,
          after: null,
        })),
        next: null,
      }),
    ),
  );
  return sent;
}

async function openDialog(user: UserEvent, { opener, title }: Case) {
  await user.click(screen.getByRole('button', { name: opener }));
  expect(await screen.findByRole('dialog', { name: title })).toBeVisible();
}

/** Somebody types, puts the dialog away with Escape and loads the page again after somebody else’s change. */
async function goOnAfter(each: Case, change: (fixture: StudyFixture) => void) {
  const fixture = each.fixture();
  const before = await openWeigh(fixture);
  await openDialog(before.user, each);
  await each.type(before.user);
  // As a browser does on Escape.
  (screen.getByRole('dialog') as HTMLDialogElement).close();
  await waitFor(() => expect(screen.queryByRole('dialog')).not.toBeInTheDocument());
  await openDialog(before.user, each);
  each.expectTyped();
  cleanup();
  change(fixture);
  const { user } = await openWeigh(fixture);
  const sent = refusesWhatIsStale(fixture, each);
  await openDialog(user, { ...each, title: dialogTitle(each, fixture) });
  each.expectTyped();
  await user.click(dialog().getByRole('button', { name: each.verb }));
  return { fixture, user, sent };
}

const dialogTitle = ({ title }: Case, fixture: StudyFixture) =>
  title.startsWith('Ruling on') ? `Ruling on ${first(fixture).name}` : title;

const put = async () => {
  await waitFor(() => expect(screen.queryByRole('dialog')).not.toBeInTheDocument());
  expect(useKeptEdits.getState().edits).toEqual({});
};

describe.each(cases)('What was typed into $says and not saved', (each) => {
  it('goes over another person’s change only when its writer says so', async () => {
    const { user, sent } = await goOnAfter(each, each.change);
    const conflict = within(await dialog().findByRole('alert'));
    expect(await conflict.findByText('Amara Doss saved first')).toBeVisible();
    expect(conflict.getByText(/21 November 2026/)).toBeVisible();
    expect(conflict.getByRole('row', { name: each.row })).toBeVisible();
    each.expectTyped();
    expect(sent.map(({ version }) => version)).toEqual([sent[0]?.version]);
    expect(sent[0]?.version).not.toBe(7);
    await user.click(conflict.getByRole('button', { name: 'Go on with mine' }));
    each.expectTyped();
    await user.click(dialog().getByRole('button', { name: each.verb }));
    await put();
    expect(sent[1]).toMatchObject({ version: 7, ...each.sent });
  });

  it('gives way to another person’s change when its writer prefers that', async () => {
    const { user, sent } = await goOnAfter(each, each.change);
    await user.click(await dialog().findByRole('button', { name: 'Take theirs' }));
    each.expectTheirs();
    expect(useKeptEdits.getState().edits).toEqual({});
    await user.click(dialog().getByRole('button', { name: 'Cancel' }));
    expect(sent).toHaveLength(1);
  });

  it('is not shown to the next person on the same device', async () => {
    const fixture = each.fixture();
    const { user } = await openWeigh(fixture);
    await openDialog(user, each);
    await each.type(user);
    expect(Object.keys(useKeptEdits.getState().edits)).toHaveLength(1);
    cleanup();
    const next = await openWeigh(fixture, '', {
      ...person,
      id: '33333333-3333-4333-8333-333333333333',
      name: 'Amara Doss',
    });
    await openDialog(next.user, each);
    expect(each.expectTyped).toThrow();
  });
});

describe.each(casesBeside)('What was typed into $says and not saved', (each) => {
  it('is stored beside another person’s change of something else', async () => {
    const { sent } = await goOnAfter(each, each.changeElse);
    await put();
    expect(sent).toMatchObject([{ version: 1 }, { version: 7, ...each.sent }]);
  });
});
