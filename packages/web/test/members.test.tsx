import { cleanup, screen, waitFor, within } from '@testing-library/react';
import { delay, HttpResponse, http } from 'msw';
import { describe, expect, it } from 'vitest';
import { useKeptEdits } from '../src/features/unsaved/model/kept-edits';
import { stillfoot } from './fixtures/stillfoot';
import { openApp } from './open-app';
import { answer, person, problem, serve, server } from './server';

const priya = {
  id: '22222222-2222-4222-8222-222222222222',
  name: 'Priya Venn',
  email: 'priya.venn@hollin-fund.example',
};

interface Stored {
  person: typeof priya;
  role: string;
}

/** The members as a server keeps them: what is put and deleted is there when asked again. */
function openMembers(role: 'methodologist' | 'investigator' | 'reader' = 'methodologist') {
  const fixture = stillfoot();
  fixture.study.role = role;
  const { id, name, email } = person;
  let members: Stored[] = [
    { person: { id, name, email }, role },
    { person: priya, role: 'funder' },
  ];
  const sent: unknown[] = [];
  serve(fixture);
  const address = `*/api/studies/${fixture.study.id}/members`;
  server.use(
    answer.studies(),
    http.get(address, () => HttpResponse.json({ members })),
    http.put(address, async ({ request }) => {
      const body = (await request.json()) as { email: string; role: string };
      sent.push(body);
      const known = members.find((member) => member.person.email === body.email);
      members = known
        ? members.map((member) => (member === known ? { ...member, role: body.role } : member))
        : [
            ...members,
            {
              person: { ...priya, id: body.email, name: 'Ilse Quennell', email: body.email },
              role: body.role,
            },
          ];
      return HttpResponse.json({ members });
    }),
    http.delete(`${address}/:personId`, ({ params }) => {
      sent.push(params.personId);
      members = members.filter((member) => member.person.id !== params.personId);
      return HttpResponse.json({ members });
    }),
  );
  return { ...openApp(`/studies/${fixture.study.id}/members`), fixture, sent, path: address };
}

const rows = async () =>
  within(await screen.findByRole('list', { name: 'Members' })).getAllByRole('listitem');

describe('The members of a study', () => {
  it('are listed with name, e-mail, role and what it means', async () => {
    openMembers();
    const [mine, hers] = await rows();
    expect(mine).toHaveTextContent('Tomas Arrivel (you)');
    expect(hers).toHaveTextContent('Priya Venn');
    expect(hers).toHaveTextContent('priya.venn@hollin-fund.example');
    expect(hers).toHaveTextContent('Funder');
    expect(hers).toHaveTextContent('Sees what the team submits, never the draft.');
    expect(document.title).toBe('Members · Stillfoot · Steelyard');
    const list = screen.getByRole('navigation', { name: 'Study' });
    expect(within(list).getByRole('link', { name: 'Members' })).toHaveAttribute('aria-current', 'page');
  });

  it.each(['investigator', 'reader'] as const)('are shown to a %s without any control', async (role) => {
    openMembers(role);
    const list = await rows();
    expect(list).toHaveLength(2);
    for (const row of list) expect(within(row).queryByRole('button')).not.toBeInTheDocument();
    expect(screen.queryByRole('form', { name: 'Add a member' })).not.toBeInTheDocument();
    expect(screen.getByText('A methodologist of the study adds and removes members.')).toBeVisible();
  });

  it('are awaited with a skeleton, and missed with a reason and a way to try again', async () => {
    const { user, path } = openMembers();
    let asked = 0;
    server.use(
      http.get(path, async () => {
        asked += 1;
        await delay(30);
        return asked > 2 ? undefined : problem(500, 'internal', { title: 'Something went wrong' });
      }),
    );
    expect(await screen.findByLabelText('Loading the members')).toBeVisible();
    const retry = await screen.findByRole('button', { name: 'Try again' });
    expect(screen.getByText(/The list of members could not be shown/)).toBeVisible();
    await user.click(retry);
    expect(await rows()).toHaveLength(2);
  });

  it('grow by e-mail and role', async () => {
    const { user, sent } = openMembers();
    await rows();
    await user.type(screen.getByLabelText('E-mail'), ' Ilse@Brackwater.example');
    await user.click(screen.getByRole('radio', { name: /^Investigator/ }));
    await user.click(screen.getByRole('button', { name: 'Add the member' }));
    await waitFor(async () => expect(await rows()).toHaveLength(3));
    expect(sent).toEqual([{ email: 'ilse@brackwater.example', role: 'investigator' }]);
    expect(await screen.findByText('Added ilse@brackwater.example as investigator.')).toBeVisible();
    expect(useKeptEdits.getState().edits).toEqual({});
    expect(screen.getByLabelText('E-mail')).toHaveValue('');
  });

  it('refuse nonsense, somebody unknown and somebody who is in already, at the field and keeping the text', async () => {
    const { user, sent, path } = openMembers();
    await rows();
    const email = screen.getByLabelText('E-mail');
    const add = screen.getByRole('button', { name: 'Add the member' });
    await user.type(email, 'ilse');
    await user.click(add);
    expect(await screen.findByText('Enter an e-mail address, such as ada@example.org.')).toBeVisible();
    await user.clear(email);
    await user.type(email, priya.email);
    await user.click(add);
    expect(await screen.findByText(/This person is a member already/)).toBeVisible();
    expect(sent).toEqual([]);
    server.use(
      http.put(path, () =>
        problem(422, 'invalid', { issues: [{ path: 'email', message: 'Nobody here has this address.' }] }),
      ),
    );
    await user.clear(email);
    await user.type(email, 'nobody@brackwater.example');
    await user.click(add);
    expect(await screen.findByText('Nobody here has this address.')).toBeVisible();
    expect(email).toBeInvalid();
    expect(email).toHaveValue('nobody@brackwater.example');
  });

  it('keep who was to be added through a reload and a lost session', async () => {
    const { user, path, fixture } = openMembers();
    await rows();
    await user.type(screen.getByLabelText('E-mail'), 'ilse@brackwater.example');
    await user.click(screen.getByRole('radio', { name: /^Investigator/ }));
    server.use(
      http.put(path, () => problem(401, 'signed-out')),
      answer.session(null),
      answer.access(),
    );
    await user.click(screen.getByRole('button', { name: 'Add the member' }));
    expect(await screen.findByText(/Your session has ended/)).toBeVisible();
    cleanup();
    server.use(answer.session());
    openApp(`/studies/${fixture.study.id}/members`);
    await rows();
    expect(screen.getByLabelText('E-mail')).toHaveValue('ilse@brackwater.example');
    expect(screen.getByRole('radio', { name: /^Investigator/ })).toBeChecked();
  });

  it('take another role', async () => {
    const { user, sent } = openMembers();
    await rows();
    await user.click(screen.getByRole('button', { name: 'Change the role of Priya Venn' }));
    const dialog = await screen.findByRole('dialog', { name: 'Role of Priya Venn' });
    expect(within(dialog).getByRole('radio', { name: /^Funder/ })).toBeChecked();
    await user.click(within(dialog).getByRole('radio', { name: /^Reader/ }));
    await user.click(within(dialog).getByRole('button', { name: 'Save the role' }));
    await waitFor(() => expect(screen.queryByRole('dialog')).not.toBeInTheDocument());
    expect(sent).toEqual([{ email: priya.email, role: 'reader' }]);
    expect((await rows())[1]).toHaveTextContent('Reader');
    expect(screen.getByRole('status')).toHaveTextContent('Priya Venn is reader now.');
  });

  it('cannot be left without a methodologist, and the server’s reason is shown', async () => {
    const { user, path } = openMembers();
    const reason = 'A study keeps one methodologist at least.';
    const refuse = () =>
      problem(422, 'invalid', { detail: reason, issues: [{ path: 'role', message: reason }] });
    server.use(http.put(path, refuse), http.delete(`${path}/:personId`, refuse));
    await rows();
    await user.click(screen.getByRole('button', { name: 'Change the role of Tomas Arrivel' }));
    const role = within(await screen.findByRole('dialog'));
    await user.click(role.getByRole('radio', { name: /^Reader/ }));
    expect(role.getByText(/You give up looking after the members/)).toBeVisible();
    await user.click(role.getByRole('button', { name: 'Save the role' }));
    expect(await role.findByRole('alert')).toHaveTextContent(reason);
    await user.click(role.getByRole('button', { name: 'Cancel' }));
    await user.click(screen.getByRole('button', { name: 'Remove Tomas Arrivel' }));
    const leave = within(await screen.findByRole('dialog'));
    await user.click(leave.getByRole('button', { name: 'Leave the study' }));
    expect(await leave.findByRole('alert')).toHaveTextContent(reason);
  });

  it('are removed once what follows has been read', async () => {
    const { user, sent } = openMembers();
    await rows();
    await user.click(screen.getByRole('button', { name: 'Remove Priya Venn' }));
    const dialog = await screen.findByRole('dialog', { name: 'Remove Priya Venn from this study?' });
    expect(dialog).toHaveTextContent(/What they did stays in its history/);
    await user.click(within(dialog).getByRole('button', { name: 'Cancel' }));
    expect(sent).toEqual([]);
    await user.click(screen.getByRole('button', { name: 'Remove Priya Venn' }));
    await user.click(
      within(await screen.findByRole('dialog')).getByRole('button', { name: 'Remove Priya Venn' }),
    );
    await waitFor(async () => expect(await rows()).toHaveLength(1));
    expect(sent).toEqual([priya.id]);
    expect(screen.getByRole('status')).toHaveTextContent('Priya Venn is not a member any more.');
  });

  it('may leave, and go back to their studies', async () => {
    const { user, address } = openMembers();
    await rows();
    await user.click(screen.getByRole('button', { name: 'Remove Tomas Arrivel' }));
    const dialog = await screen.findByRole('dialog', { name: 'Leave this study?' });
    await user.click(within(dialog).getByRole('button', { name: 'Leave the study' }));
    await waitFor(() => expect(address()).toBe('/'));
  });
});

describe('Somebody who was taken off a study while on one of its pages', () => {
  it('is told so kindly as soon as the server says so', async () => {
    const { user, fixture, path } = openMembers();
    await rows();
    const gone = () => problem(404, 'not-found', { detail: 'There is no such study.' });
    server.use(
      http.get(`*/api/studies/${fixture.study.id}`, gone),
      http.get(path, gone),
      http.put(path, gone),
    );
    await user.type(screen.getByLabelText('E-mail'), 'ilse@brackwater.example');
    await user.click(screen.getByRole('button', { name: 'Add the member' }));
    expect(
      await screen.findByRole('heading', { name: 'Stillfoot is not open to you any more' }),
    ).toBeVisible();
    expect(screen.getByText(/What you had typed and not saved is kept here/)).toBeVisible();
    await user.click(screen.getByRole('link', { name: 'Go to your studies' }));
    expect(await screen.findByRole('heading', { name: 'Studies' })).toBeVisible();
  });
});
