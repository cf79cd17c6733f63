import type { IRouter } from 'express';
import { type Admits, routeTable } from './support/route-table.js';
import { Team, type Who } from './support/team.js';

const everyone: Who[] = [
  'methodologist',
  'investigator',
  'reader',
  'funder',
  'administrator',
  'outsider',
  'signed-out',
];

/** Who is let do it; who sees the study but may not is told 403, and who may not see it 404. */
const admitted: Record<Admits, Who[]> = {
  everyone,
  'signed-in': everyone.slice(0, 6),
  draft: ['methodologist', 'investigator', 'reader'],
  team: ['methodologist', 'investigator'],
  methodologist: ['methodologist'],
  administrator: ['administrator'],
};

function refusalOf(admits: Admits, who: Who): number {
  if (who === 'signed-out') return 401;
  if (admits === 'administrator') return 403;
  return admitted.draft.includes(who) ? 403 : 404;
}

describe('By the role table', () => {
  let team: Team;

  beforeAll(async () => {
    team = await Team.start();
  });

  afterAll(() => team.app.close());

  const documentation = /\/api\/(docs|openapi\.json)/;

  test('every route of the running application has an entry, and every entry a route', () => {
    const { stack }: IRouter = team.app.nest.getHttpAdapter().getInstance().router;
    const routes = stack
      .flatMap(({ route }) =>
        (route?.stack ?? []).map(({ method }) => `${method.toUpperCase()} ${route?.path}`),
      )
      .filter((route) => !documentation.test(route));
    expect(Object.keys(routeTable).toSorted()).toEqual(routes.toSorted());
  });

  const ownSessionOf = async (who: Who) => {
    const cookie = team.cookies[who];
    if (!cookie) return '';
    const { email } = (await team.app.get('/api/session', cookie)).body;
    return team.app.signIn(email);
  };

  test.each(Object.entries(routeTable))('%s', async (route, { admits, call, ownSession, status }) => {
    const [method = '', path = ''] = route.split(' ');
    for (const who of everyone) {
      const { params = {}, body } = (await call?.(team, who)) ?? {};
      const address = path.replace(/:(\w+)/g, (_, name) =>
        name === 'studyId' ? team.studyId : (params[name] ?? name),
      );
      const cookie = ownSession ? await ownSessionOf(who) : team.cookies[who];
      const response = await team.app
        .request(method.toLowerCase() as 'get' | 'put' | 'post' | 'delete', address, cookie)
        .send(body);
      const right = admitted[admits].includes(who);
      const expected = right ? (status ?? '2xx') : refusalOf(admits, who);
      const got = response.status >= 200 && response.status < 300 ? '2xx' : response.status;
      expect([who, got, got === expected ? '' : response.text]).toEqual([who, expected, '']);
    }
  });
});
