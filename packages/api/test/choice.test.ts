import { randomUUID } from 'node:crypto';
import type { OptionView } from '../src/contract/design-sets.js';
import { Team } from './support/team.js';

describe('The choice', () => {
  let team: Team;

  beforeEach(async () => {
    team = await Team.start('Stillfoot');
  });

  afterEach(() => team.app.close());

  const choose = async (changes: object = {}) => {
    const { version, options } = await team.designSet();
    const [first, second, third] = options.map(({ id }) => id);
    return team.ask('put', '/choice', {
      version,
      optionId: third,
      why: 'It needs the fewest participants.',
      whyNot: [
        { optionId: first, why: 'Four times the participants.' },
        { optionId: second, why: 'Three times the participants.' },
      ],
      ...changes,
    });
  };

  test('is kept with its reasons and shown in the list of studies', async () => {
    expect((await choose()).status).toBe(200);
    const { options, choice } = await team.read('/design-set', 'reader');
    expect(choice).toEqual({
      optionId: options[2].id,
      why: 'It needs the fewest participants.',
      whyNot: [
        { optionId: options[0].id, why: 'Four times the participants.' },
        { optionId: options[1].id, why: 'Three times the participants.' },
      ],
      by: 'Tomas Arrivel',
      at: team.app.clock.now().toISOString(),
    });
    const listed = async (who: 'reader' | 'funder') =>
      (await team.app.get('/api/studies', team.cookies[who])).body.studies[0].choice;
    expect(await listed('reader')).toEqual({ letter: 'C', name: 'Crossover' });
    expect(await listed('funder')).toBeNull();
    const [entry] = (await team.read('/history')).entries;
    expect(entry).toMatchObject({
      action: 'chose',
      what: 'option “Crossover”',
      after: { 'whyNot.Parallel, unadjusted': 'Four times the participants.' },
    });
  });

  test('holds its option in the set until it is withdrawn', async () => {
    await choose();
    const { id, version } = (await team.designSet()).options[2] as OptionView;
    expect((await team.ask('delete', `/options/${id}`, { version })).status).toBe(422);
    expect(
      (
        await team.ask('put', `/options/${id}/ruling`, {
          version,
          kind: 'not-admissible',
          reason: 'Carryover',
        })
      ).status,
    ).toBe(422);
    const set = await team.designSet();
    const withdrawn = await team.ask('delete', '/choice', { version: set.version });
    expect(withdrawn.body.choice).toBeNull();
    expect((await team.ask('delete', `/options/${id}`, { version })).status).toBe(200);
  });

  test('needs a reason for each other option that is not ruled out', async () => {
    expect((await choose({ whyNot: [] })).body.issues).toMatchObject([{ path: 'whyNot' }]);
    const { options } = await team.designSet();
    for (const { id, version } of options.slice(0, 2)) {
      await team.ask('put', `/options/${id}/ruling`, {
        version,
        kind: 'not-admissible',
        reason: 'Too many visits',
      });
    }
    expect((await choose({ whyNot: [] })).status).toBe(200);
    expect((await choose({ optionId: options[0]?.id })).body.issues).toMatchObject([{ path: 'optionId' }]);
  });

  test('is refused without a reason, for no option, and for a past version', async () => {
    expect((await choose({ why: ' ' })).body.issues).toMatchObject([{ path: 'why' }]);
    expect((await choose({ optionId: randomUUID() })).body.issues).toMatchObject([{ path: 'optionId' }]);
    expect((await choose({ whyNot: [{ optionId: randomUUID(), why: 'No' }] })).body.issues).toMatchObject([
      { path: 'whyNot.0.optionId' },
    ]);
    expect((await choose({ version: 1 })).body).toMatchObject({ code: 'stale', current: { choice: null } });
  });
});
