import type { MembersView } from '../src/contract/members.js';
import { email } from './support/people.js';
import { outsider, Team } from './support/team.js';

describe('Members of a study', () => {
  let team: Team;

  beforeEach(async () => {
    team = await Team.start();
  });

  afterEach(() => team.app.close());

  const roles = async () => {
    const { members }: MembersView = await team.read('/members');
    return Object.fromEntries(members.map(({ person, role }) => [person.email, role]));
  };
  const idOf = async (address: string): Promise<string> => {
    const { members }: MembersView = await team.read('/members');
    return members.find(({ person }) => person.email === address)?.person.id ?? '';
  };

  test('are added by their address, and change their role', async () => {
    const added = await team.ask('put', '/members', { email: outsider.toUpperCase(), role: 'reader' });
    expect(added.status).toBe(200);
    expect((await roles())[outsider]).toBe('reader');
    expect((await team.ask('get', '', undefined, 'outsider')).body.role).toBe('reader');
    await team.ask('put', '/members', { email: outsider, role: 'investigator' });
    expect((await roles())[outsider]).toBe('investigator');
    const [entry] = (await team.read('/history')).entries;
    expect(entry).toMatchObject({
      action: 'changed',
      what: 'member Ada Merrow',
      before: { role: 'reader' },
      after: { role: 'investigator' },
    });
  });

  test('removed while they edit are told that there is no such study, and change nothing', async () => {
    const { id, version, name, plan } = await team.firstOption();
    const removed = await team.ask('delete', `/members/${await idOf(email('doss'))}`);
    expect(removed.status).toBe(200);
    expect((await roles())[email('doss')]).toBeUndefined();
    const late = await team.ask('put', `/options/${id}`, { version, name: `${name}!`, plan }, 'investigator');
    expect(late.body).toMatchObject({ status: 404, detail: 'There is no such study.' });
    expect((await team.firstOption()).name).toBe(name);
  });

  test('include a methodologist, whatever the methodologist does', async () => {
    const id = await idOf(email('oyelaran'));
    expect((await team.ask('delete', `/members/${id}`)).body.issues).toMatchObject([{ path: 'role' }]);
    const demoted = await team.ask('put', '/members', { email: email('oyelaran'), role: 'reader' });
    expect(demoted.body.issues).toMatchObject([{ path: 'role' }]);
    await team.ask('put', '/members', { email: outsider, role: 'methodologist' });
    expect((await team.ask('put', '/members', { email: email('oyelaran'), role: 'reader' })).status).toBe(
      200,
    );
    expect((await team.ask('put', '/members', { email: outsider, role: 'reader' })).status).toBe(403);
  });

  test('are people who have an account, in a role that there is', async () => {
    const nobody = await team.ask('put', '/members', { email: 'nobody@elsewhere.example', role: 'reader' });
    expect(nobody.body).toMatchObject({ status: 422, issues: [{ path: 'email' }] });
    const owner = await team.ask('put', '/members', { email: outsider, role: 'owner' });
    expect(owner.body).toMatchObject({ status: 422, issues: [{ path: 'role' }] });
    expect((await team.ask('delete', '/members/no-id')).status).toBe(404);
  });
});
