import type { OptionView } from '../../src/contract/design-sets.js';
import { demoPassword } from '../../src/demo/people.js';
import { addPerson } from './people.js';
import type { Team, Who } from './team.js';

export type Admits = 'everyone' | 'signed-in' | 'draft' | 'team' | 'methodologist' | 'administrator';

interface Call {
  params?: Record<string, string>;
  body?: object;
}

export interface Entry {
  admits: Admits;
  /** What makes the call a good one at this moment; where it is left out the path says everything. */
  call?: (team: Team, who: Who) => Promise<Call>;
  /** Asked with a session of its own, since it ends it. */
  ownSession?: true;
  /** What those admitted are answered, where that is no success. */
  status?: number;
}

const guest = 'guest.merrow@elsewhere.example';

const cluster = { family: 'cluster', treatments: [0, 1], structure: {}, clusterSize: 40, overrides: {} };

async function newOption(team: Team): Promise<OptionView> {
  return (await team.ask('post', '/options', { name: 'Another', plan: cluster })).body;
}

async function removedOption(team: Team): Promise<OptionView> {
  const { id, version } = await newOption(team);
  return (await team.ask('delete', `/options/${id}`, { version })).body;
}

async function choice(team: Team) {
  const { version, options } = await team.designSet();
  const [chosen, ...others] = options.map(({ id }) => id);
  const whyNot = others.map((optionId) => ({ optionId, why: 'It takes more.' }));
  return { version, optionId: chosen, why: 'It fits.', whyNot };
}

async function familyValue(team: Team) {
  const line = { key: 'icc', family: 'cluster', value: 0.05, low: null, high: null, source: 'Pilot' };
  await team.ask('put', '/planning-values', { ...line, version: null });
  const { values } = await team.read('/planning-values');
  return values.find(({ family }: { family: string | null }) => family === 'cluster');
}

async function question(team: Team) {
  const {
    id: _,
    fictional: __,
    role: ___,
    members: ____,
    changedAt: _____,
    ...question
  } = await team.read('');
  return question;
}

async function guestId(team: Team): Promise<string> {
  const people = async (): Promise<{ id: string; email: string }[]> =>
    (await team.app.get('/api/people', team.cookies.administrator)).body.people;
  return (await people()).find((person) => person.email === guest)?.id ?? (await addPerson(team.app, guest));
}

async function welcomeToken(team: Team): Promise<string> {
  const path = `/api/people/${await guestId(team)}/link`;
  const { link } = (await team.app.request('post', path, team.cookies.administrator)).body;
  return link.replace('/welcome/', '');
}

const body = (of: (team: Team) => Promise<object>) => async (team: Team) => ({ body: await of(team) });

/** Every route of the application by whom it lets do something; whoever adds a route adds it here. */
export const routeTable: Record<string, Entry> = {
  'GET /api/access': { admits: 'everyone' },
  'GET /api/health': { admits: 'everyone' },
  'POST /api/first-visit': {
    admits: 'everyone',
    status: 404,
    call: async () => ({ body: { code: 'x', name: 'Ada', email: guest, password: demoPassword } }),
  },
  'POST /api/session': {
    admits: 'everyone',
    ownSession: true,
    call: async (team) => {
      await guestId(team);
      return { body: { email: guest, password: demoPassword } };
    },
  },
  'GET /api/welcome/:token': {
    admits: 'everyone',
    call: async (team) => ({ params: { token: await welcomeToken(team) } }),
  },
  'POST /api/welcome/:token': {
    admits: 'everyone',
    call: async (team) => ({ params: { token: await welcomeToken(team) }, body: { password: demoPassword } }),
  },
  'GET /api/session': { admits: 'signed-in' },
  'DELETE /api/session': { admits: 'signed-in', ownSession: true },
  'GET /api/profile': { admits: 'signed-in' },
  'PUT /api/profile': {
    admits: 'signed-in',
    call: async (team, who) => {
      const { version, name } = (await team.app.get('/api/profile', team.cookies[who])).body;
      return { body: { version: version ?? 1, name: name ?? 'Nobody' } };
    },
  },
  'PUT /api/profile/password': {
    admits: 'signed-in',
    call: async () => ({ body: { current: demoPassword, next: demoPassword } }),
  },
  'POST /api/appraisals': {
    admits: 'signed-in',
    call: async () => ({
      body: {
        outcome: { kind: 'continuous', difference: 1, sd: 2.1 },
        test: { hypothesis: 'superiority', alpha: 0.05, sides: 2 },
        design: { family: 'parallel' },
        aim: { find: 'size', power: 0.9 },
      },
    }),
  },
  'GET /api/studies': { admits: 'signed-in' },
  'POST /api/studies': {
    admits: 'signed-in',
    call: async () => ({
      body: {
        name: 'Newfield',
        organisation: 'Merrow',
        question: 'Does it help?',
        outcome: { kind: 'continuous', label: 'Pain', unit: 'points', difference: 1 },
        participants: { one: 'participant', many: 'participants' },
        clusters: null,
        treatments: [{ name: 'Usual care' }, { name: 'Something else' }],
      },
    }),
  },
  'GET /api/studies/:studyId': { admits: 'draft' },
  'GET /api/studies/:studyId/history': { admits: 'draft' },
  'GET /api/studies/:studyId/planning-values': { admits: 'draft' },
  'GET /api/studies/:studyId/planning-values/:valueId/history': {
    admits: 'draft',
    call: async (team) => ({ params: { valueId: (await team.read('/planning-values')).values[0].id } }),
  },
  'GET /api/studies/:studyId/costs': { admits: 'draft' },
  'GET /api/studies/:studyId/limits': { admits: 'draft' },
  'GET /api/studies/:studyId/members': { admits: 'draft' },
  'GET /api/studies/:studyId/design-set': { admits: 'draft' },
  'GET /api/studies/:studyId/weigh': { admits: 'draft' },
  'PUT /api/studies/:studyId/question': { admits: 'team', call: body(question) },
  'PUT /api/studies/:studyId/costs': { admits: 'team', call: body((team) => team.read('/costs')) },
  'PUT /api/studies/:studyId/limits': { admits: 'team', call: body((team) => team.read('/limits')) },
  'PUT /api/studies/:studyId/design-set': {
    admits: 'team',
    call: body(async (team) => {
      const { version, hold, options } = await team.designSet();
      return { version, hold, order: options.map(({ id }) => id) };
    }),
  },
  'POST /api/studies/:studyId/options': {
    admits: 'team',
    call: async () => ({ body: { name: 'Another', plan: cluster } }),
  },
  'PUT /api/studies/:studyId/options/:optionId': {
    admits: 'team',
    call: async (team) => {
      const { id, version, name, plan } = await team.firstOption();
      return { params: { optionId: id }, body: { version, name, plan } };
    },
  },
  'POST /api/studies/:studyId/options/:optionId/duplicate': {
    admits: 'team',
    call: async (team) => ({ params: { optionId: (await team.firstOption()).id } }),
  },
  'DELETE /api/studies/:studyId/options/:optionId': {
    admits: 'team',
    call: async (team) => {
      const { id, version } = await newOption(team);
      return { params: { optionId: id }, body: { version } };
    },
  },
  'POST /api/studies/:studyId/options/:optionId/restore': {
    admits: 'team',
    call: async (team) => {
      const { id, version } = await removedOption(team);
      return { params: { optionId: id }, body: { version } };
    },
  },
  'PUT /api/studies/:studyId/options/:optionId/ruling': {
    admits: 'methodologist',
    call: async (team) => {
      const { id, version } = await team.firstOption();
      return {
        params: { optionId: id },
        body: { version, kind: 'conditions', reason: 'If it can be kept.' },
      };
    },
  },
  'PUT /api/studies/:studyId/planning-values': {
    admits: 'methodologist',
    call: body(async (team) => {
      const { id: _, setBy: __, setAt: ___, ...value } = (await team.read('/planning-values')).values[0];
      return value;
    }),
  },
  'DELETE /api/studies/:studyId/planning-values/:valueId': {
    admits: 'methodologist',
    call: async (team) => {
      const { id, version } = await familyValue(team);
      return { params: { valueId: id }, body: { version } };
    },
  },
  'PUT /api/studies/:studyId/choice': { admits: 'methodologist', call: body(choice) },
  'DELETE /api/studies/:studyId/choice': {
    admits: 'methodologist',
    call: async (team) => {
      await team.ask('put', '/choice', await choice(team));
      return { body: { version: (await team.designSet()).version } };
    },
  },
  'PUT /api/studies/:studyId/members': {
    admits: 'methodologist',
    call: async (team) => {
      await guestId(team);
      return { body: { email: guest, role: 'reader' } };
    },
  },
  'DELETE /api/studies/:studyId/members/:memberId': {
    admits: 'methodologist',
    call: async (team) => {
      const memberId = await guestId(team);
      await team.ask('put', '/members', { email: guest, role: 'reader' });
      return { params: { memberId } };
    },
  },
  'GET /api/audit': { admits: 'administrator' },
  'GET /api/people': { admits: 'administrator' },
  'POST /api/people': {
    admits: 'administrator',
    call: async () => ({ body: { name: 'New', email: 'new.person@elsewhere.example' } }),
  },
  'POST /api/people/:accountId/link': {
    admits: 'administrator',
    call: async (team) => ({ params: { accountId: await guestId(team) } }),
  },
  'DELETE /api/sessions': { admits: 'signed-in' },
};
