import type { DesignSetView, OptionView } from '../../src/contract/design-sets.js';
import type { demoPeople } from '../../src/demo/people.js';
import { Study } from '../../src/studies/study.entity.js';
import { addPerson, email } from './people.js';
import { TestApp } from './test-app.js';

type Key = keyof typeof demoPeople;
export type Who =
  | 'methodologist'
  | 'investigator'
  | 'funder'
  | 'reader'
  | 'administrator'
  | 'outsider'
  | 'signed-out';

export const outsider = 'ada.merrow@elsewhere.example';

const teams: Record<string, Record<'methodologist' | 'investigator' | 'funder' | 'reader', Key>> = {
  Greenkettle: { methodologist: 'oyelaran', investigator: 'doss', funder: 'solt', reader: 'tarvin' },
  Nimblegrip: { methodologist: 'aalderink', investigator: 'mackrell', funder: 'hallam', reader: 'ferrow' },
  Stillfoot: { methodologist: 'arrivel', investigator: 'quennell', funder: 'venn', reader: 'brannick' },
};

/** A demo study with each of the people who meet it, signed in. */
export class Team {
  private constructor(
    readonly app: TestApp,
    readonly studyId: string,
    readonly cookies: Record<Who, string>,
  ) {}

  static async start(name = 'Greenkettle'): Promise<Team> {
    const app = await TestApp.start({ seeded: true });
    await addPerson(app, outsider);
    const { id } = await app.em.fork().findOneOrFail(Study, { name });
    const team = teams[name] as (typeof teams)[string];
    const cookies: Record<Who, string> = {
      methodologist: await app.signIn(email(team.methodologist)),
      investigator: await app.signIn(email(team.investigator)),
      funder: await app.signIn(email(team.funder)),
      reader: await app.signIn(email(team.reader)),
      administrator: await app.signIn(email('wexley')),
      outsider: await app.signIn(outsider),
      'signed-out': '',
    };
    return new Team(app, id, cookies);
  }

  /** Asks in a room of the study, as in `/limits`. */
  ask(method: 'get' | 'put' | 'post' | 'delete', room: string, body?: object, who: Who = 'methodologist') {
    return this.app.request(method, `/api/studies/${this.studyId}${room}`, this.cookies[who]).send(body);
  }

  async read(room: string, who: Who = 'methodologist') {
    const response = await this.ask('get', room, undefined, who);
    expect([room, response.status]).toEqual([room, 200]);
    return response.body;
  }

  async designSet(): Promise<DesignSetView> {
    return this.read('/design-set');
  }

  async firstOption(): Promise<OptionView> {
    const { options } = await this.designSet();
    return options[0] as OptionView;
  }
}
