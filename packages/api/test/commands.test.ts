import { randomUUID } from 'node:crypto';
import type { Command } from '@nestjs/cqrs';
import { ProblemError } from '../src/common/problem.js';
import type { Problem } from '../src/contract/problem.js';
import type { DemoStudy } from '../src/demo/demo-study.js';
import { stillfoot } from '../src/demo/stillfoot.js';
import { AddOption } from '../src/design-sets/commands/add-option.command.js';
import { CreateDesignSet } from '../src/design-sets/commands/create-design-set.command.js';
import { CreatePerson } from '../src/people/commands/create-person.command.js';
import { CreateStudy } from '../src/studies/commands/create-study.command.js';
import { SetCostPlan } from '../src/studies/commands/set-cost-plan.command.js';
import { SetPlanningValue } from '../src/studies/commands/set-planning-value.command.js';
import { addPerson } from './support/people.js';
import { TestApp } from './support/test-app.js';
import { minute } from './support/test-clock.js';

const { daysAgo: _, ...properties } = stillfoot.study;
const { costs, timeline } = stillfoot.costPlan;
const sd = {
  key: 'sd',
  family: null,
  value: 2.1,
  low: null,
  high: 2.4,
  source: 'Pilot of 30',
  version: null,
} as const;
const [{ name, plan }] = stillfoot.options as [DemoStudy['options'][0]];

describe('Commands', () => {
  let app: TestApp;
  let methodologist: string;
  let investigator: string;
  let reader: string;
  let stranger: string;
  let studyId: string;
  let cookie: string;

  beforeAll(async () => {
    app = await TestApp.start();
    methodologist = await addPerson(app, 'methodologist@merrow.example');
    investigator = await addPerson(app, 'investigator@merrow.example');
    reader = await addPerson(app, 'reader@merrow.example');
    stranger = await addPerson(app, 'stranger@merrow.example');
    cookie = await app.signIn('methodologist@merrow.example');
  });

  beforeEach(async () => {
    studyId = await app.commands.execute(createStudy());
  });

  afterAll(() => app.close());

  function createStudy(changes: Partial<CreateStudy['study']> = {}): CreateStudy {
    const members: CreateStudy['study']['members'] = [
      { personId: investigator, role: 'investigator' },
      { personId: reader, role: 'reader' },
    ];
    return new CreateStudy(methodologist, { ...properties, fictional: true, members, ...changes });
  }

  const refusal = async (
    command: Command<unknown>,
  ): Promise<Pick<Problem, 'code'> & Record<string, unknown>> => {
    const error: unknown = await app.commands.execute(command).catch((reason) => reason);
    if (!(error instanceof ProblemError)) throw error;
    return { code: error.code, ...error.extra };
  };

  const get = async (room: string) => (await app.get(`/api/studies/${studyId}${room}`, cookie)).body;

  describe('creating a person', () => {
    test('refuse an address that somebody has, whatever its case', async () => {
      const again = {
        name: 'Ada',
        email: 'Reader@Merrow.example',
        password: 'long enough for all',
        administrator: false,
      };
      expect(await refusal(new CreatePerson(again))).toMatchObject({
        code: 'invalid',
        issues: [{ path: 'email' }],
      });
    });
  });

  describe('creating a study', () => {
    test('make its creator the methodologist', async () => {
      expect(await get('')).toMatchObject({ name: 'Stillfoot', role: 'methodologist', clusters: null });
    });

    test('refuse two roles for one person, and members without an account', async () => {
      const twice = [
        { personId: reader, role: 'reader' as const },
        { personId: reader, role: 'funder' as const },
      ];
      const nobody = [{ personId: randomUUID(), role: 'reader' as const }];
      for (const members of [twice, nobody]) {
        expect(await refusal(createStudy({ members }))).toMatchObject({
          code: 'invalid',
          issues: [{ path: 'members' }],
        });
      }
    });

    test('refuse a question that calc’s schema refuses, naming the field', async () => {
      const plan = { ...properties.plan, test: { ...properties.plan.test, alpha: 2 } };
      expect(await refusal(createStudy({ plan }))).toMatchObject({
        code: 'invalid',
        issues: [{ path: 'plan.test.alpha' }],
      });
    });
  });

  describe('setting a planning value', () => {
    const set = (personId: string, changes: object = {}) =>
      new SetPlanningValue(studyId, personId, { ...sd, ...changes });

    test('keep who set it, when and why, and count its versions', async () => {
      await app.commands.execute(set(methodologist));
      app.clock.advance(minute);
      await app.commands.execute(set(methodologist, { value: 2.2, version: 1 }));
      expect((await get('/planning-values')).values).toEqual([
        {
          id: expect.any(String),
          version: 2,
          key: 'sd',
          family: null,
          value: 2.2,
          low: null,
          high: 2.4,
          source: 'Pilot of 30',
          setBy: 'Ada Merrow',
          setAt: app.clock.now().toISOString(),
        },
      ]);
      expect((await get('')).changedAt).toBe(app.clock.now().toISOString());
    });

    test('refuse a change to a version that is past', async () => {
      await app.commands.execute(set(methodologist));
      await app.commands.execute(set(methodologist, { value: 2.2, version: 1 }));
      expect(await refusal(set(methodologist, { value: 2.3, version: 1 }))).toMatchObject({ code: 'stale' });
      expect(await refusal(set(methodologist, { value: 2.3 }))).toMatchObject({ code: 'stale' });
      expect((await get('/planning-values')).values[0].value).toBe(2.2);
    });

    test('keep a value for one family beside the one for all', async () => {
      await app.commands.execute(set(methodologist, { key: 'attrition', value: 0.12, high: null }));
      await app.commands.execute(
        set(methodologist, { key: 'attrition', family: 'crossover', value: 0.2, high: null }),
      );
      const { values } = await get('/planning-values');
      expect(values.map(({ family, value }: Record<string, unknown>) => [family, value])).toEqual([
        [null, 0.12],
        ['crossover', 0.2],
      ]);
    });

    test.each([
      ['outside its range', { value: 2.5 }, 'value'],
      ['beyond a proportion', { key: 'attrition', value: 1.2, high: null }, 'value'],
      ['without a source', { source: ' ' }, 'source'],
      ['that no design draws on', { key: 'temperature' }, 'key'],
      ['with a mistyped field', { hgih: 3 }, 'hgih'],
    ])('refuse one %s', async (_, changes, path) => {
      expect(await refusal(set(methodologist, changes))).toMatchObject({
        code: 'invalid',
        issues: [{ path }],
      });
    });

    test('are the methodologist’s alone', async () => {
      expect(await refusal(set(investigator))).toMatchObject({ code: 'forbidden' });
      expect(await refusal(set(reader))).toMatchObject({ code: 'forbidden' });
      expect(await refusal(set(stranger))).toMatchObject({ code: 'not-found' });
    });
  });

  describe('setting the costs', () => {
    const set = (personId: string, changes: object = {}) =>
      new SetCostPlan(studyId, personId, { costs: { ...costs, ...changes }, timeline, version: null });

    test('keep them by treatment', async () => {
      await app.commands.execute(set(investigator));
      expect(await get('/costs')).toEqual({ version: 1, costs, timeline, source: null });
    });

    test('refuse figures for more treatments than the study has', async () => {
      expect(await refusal(set(investigator, { perExposure: [1, 2, 3] }))).toMatchObject({
        code: 'invalid',
        issues: [{ path: 'costs.perExposure' }],
      });
    });

    test('are refused to a reader and where others were first', async () => {
      expect(await refusal(set(reader))).toMatchObject({ code: 'forbidden' });
      await app.commands.execute(set(methodologist));
      expect(await refusal(set(investigator))).toMatchObject({ code: 'stale' });
    });

    test('leave a study without any as not found', async () => {
      expect(await get('/costs')).toMatchObject({ status: 404, code: 'not-found' });
    });
  });

  describe('adding an option', () => {
    const add = (personId: string, changes: object = {}) =>
      new AddOption(studyId, personId, { name, plan: { ...plan, ...changes } });
    const createDesignSet = () =>
      new CreateDesignSet(studyId, methodologist, { hold: { kind: 'power', power: 0.9 } });

    test('put it behind those that are there', async () => {
      await app.commands.execute(createDesignSet());
      const first = await app.commands.execute(add(investigator));
      const second = await app.commands.execute(add(methodologist));
      const { version, hold, options } = await get('/design-set');
      expect({ version, hold }).toEqual({ version: 3, hold: { kind: 'power', power: 0.9 } });
      expect(options).toEqual([first, second]);
      expect(first).toEqual({ id: expect.any(String), version: 1, name, plan, ruling: null });
    });

    test('weigh one that lacks a planning value as in error, and say which', async () => {
      await app.commands.execute(createDesignSet());
      await app.commands.execute(add(investigator));
      const { options } = await get('/weigh');
      expect(options[0]).toMatchObject({ letter: 'A', appraisal: null, error: { path: 'outcome.sd' } });
    });

    test('refuse treatments that the study has not, and one named twice', async () => {
      await app.commands.execute(createDesignSet());
      for (const treatments of [
        [0, 2],
        [0, 0],
      ]) {
        expect(await refusal(add(investigator, { treatments }))).toMatchObject({
          code: 'invalid',
          issues: [{ path: 'plan.treatments' }],
        });
      }
    });

    test('refuse a family that is none, and whoever may not edit', async () => {
      await app.commands.execute(createDesignSet());
      expect(await refusal(add(investigator, { family: 'lottery' }))).toMatchObject({
        issues: [{ path: 'plan.family' }],
      });
      expect(await refusal(add(reader))).toMatchObject({ code: 'forbidden' });
      expect(await refusal(add(stranger))).toMatchObject({ code: 'not-found' });
    });

    test('need a design set, of which a study has one', async () => {
      expect(await refusal(add(investigator))).toMatchObject({ code: 'not-found' });
      expect(await get('/weigh')).toMatchObject({ status: 404 });
      await app.commands.execute(createDesignSet());
      expect(await refusal(createDesignSet())).toMatchObject({ code: 'stale' });
    });
  });
});
