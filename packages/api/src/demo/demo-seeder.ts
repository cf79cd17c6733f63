import { EntityManager } from '@mikro-orm/sqlite';
import { Injectable } from '@nestjs/common';
import { CommandBus } from '@nestjs/cqrs';
import { Clock } from '../common/clock.js';
import { AddOption } from '../design-sets/commands/add-option.command.js';
import { CreateDesignSet } from '../design-sets/commands/create-design-set.command.js';
import { RuleOnOption } from '../design-sets/commands/rule-on-option.command.js';
import { entities } from '../orm-options.js';
import { CreatePerson } from '../people/commands/create-person.command.js';
import { Person } from '../people/person.entity.js';
import { CreateStudy } from '../studies/commands/create-study.command.js';
import { SetCostPlan } from '../studies/commands/set-cost-plan.command.js';
import { SetLimits } from '../studies/commands/set-limits.command.js';
import { SetPlanningValue } from '../studies/commands/set-planning-value.command.js';
import type { DemoStudy } from './demo-study.js';
import { greenkettle } from './greenkettle.js';
import { nimblegrip } from './nimblegrip.js';
import { type DemoPersonKey, demoPassword, demoPeople } from './people.js';
import { stillfoot } from './stillfoot.js';

const day = 86_400_000;
const accountsMadeDaysAgo = 58.5;

type PersonIds = ReadonlyMap<DemoPersonKey, string>;

/** Fills an empty database with the demo, as its people would have: through the command bus, over some weeks. */
@Injectable()
export class DemoSeeder {
  constructor(
    private readonly em: EntityManager,
    private readonly commands: CommandBus,
    private readonly clock: Clock,
  ) {}

  /** True also of a database whose seeding was interrupted. */
  async isNeeded(): Promise<boolean> {
    return (await this.wasInterrupted()) || (await this.em.fork().count(Person)) === 0;
  }

  /** False where people who are not of the demo work with this database. */
  async mayEmpty(): Promise<boolean> {
    const { email } = demoPeople.wexley;
    return (await this.isNeeded()) || (await this.em.fork().count(Person, { email })) > 0;
  }

  async seed(): Promise<void> {
    await this.mark(true);
    await this.empty();
    const now = this.clock.now().getTime();
    const people = await this.seedPeople(now);
    for (const study of [greenkettle, nimblegrip, stillfoot]) await this.seedStudy(study, people, now);
    await this.mark(false);
  }

  private async seedPeople(now: number): Promise<PersonIds> {
    const ids = new Map<DemoPersonKey, string>();
    for (const [key, { name, email, administrator }] of Object.entries(demoPeople)) {
      const command = new CreatePerson({ name, email, administrator, password: demoPassword });
      const id = await this.clock.asOf(daysBefore(now, accountsMadeDaysAgo), () =>
        this.commands.execute(command),
      );
      ids.set(key as DemoPersonKey, id);
    }
    return ids;
  }

  private async seedStudy(demo: DemoStudy, people: PersonIds, now: number): Promise<void> {
    const idOf = (key: DemoPersonKey) => people.get(key) as string;
    const at = <T>(daysAgo: number, work: () => Promise<T>) =>
      this.clock.asOf(daysBefore(now, daysAgo), work);
    const { study, team, planningValues, costPlan, limits, hold, options } = demo;
    const methodologist = idOf(team.methodologist);
    const investigator = idOf(team.investigator);
    const members = (['investigator', 'funder', 'reader'] as const).map((role) => ({
      personId: idOf(team[role]),
      role,
    }));

    const { daysAgo: startedDaysAgo, ...properties } = study;
    const studyId = await at(startedDaysAgo, () =>
      this.commands.execute(new CreateStudy(methodologist, { ...properties, fictional: true, members })),
    );
    for (const { daysAgo, ...value } of planningValues) {
      const command = new SetPlanningValue(studyId, methodologist, { ...value, version: null });
      await at(daysAgo, () => this.commands.execute(command));
    }
    const { daysAgo: costsDaysAgo, ...costs } = costPlan;
    await at(costsDaysAgo, () =>
      this.commands.execute(new SetCostPlan(studyId, investigator, { ...costs, version: null })),
    );
    if (limits) {
      const command = new SetLimits(studyId, investigator, { limits: limits.limits, version: null });
      await at(limits.daysAgo, () => this.commands.execute(command));
    }
    await at(startedDaysAgo, () =>
      this.commands.execute(new CreateDesignSet(studyId, methodologist, { hold })),
    );
    for (const { daysAgo, ruling, ...option } of options) {
      const { id, version } = await at(daysAgo, () =>
        this.commands.execute(new AddOption(studyId, investigator, option)),
      );
      if (!ruling) continue;
      const { daysAgo: ruledDaysAgo, ...given } = ruling;
      const command = new RuleOnOption(studyId, methodologist, id, { ...given, version });
      await at(ruledDaysAgo, () => this.commands.execute(command));
    }
  }

  private async empty(): Promise<void> {
    await this.em.fork().transactional(async (em) => {
      for (const entity of entities.toReversed()) await em.nativeDelete(entity, {});
    });
  }

  /** Each command commits by itself, so a seeding cut short must be told from a database in use. */
  private async mark(seeding: boolean): Promise<void> {
    await this.em.fork().execute(`pragma user_version = ${seeding ? 1 : 0}`);
  }

  private async wasInterrupted(): Promise<boolean> {
    const [row] = await this.em.fork().execute<{ user_version: number }[]>('pragma user_version');
    return row?.user_version === 1;
  }
}

/** Some time in the working hours of that day. */
function daysBefore(now: number, daysAgo: number): Date {
  const moment = new Date(now - Math.floor(daysAgo) * day);
  moment.setUTCHours(8, Math.round((1 - (daysAgo % 1)) * 9 * 60), 0, 0);
  return moment;
}
