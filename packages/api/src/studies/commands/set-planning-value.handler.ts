import { EntityManager } from '@mikro-orm/sqlite';
import { CommandHandler, type ICommandHandler } from '@nestjs/cqrs';
import { newAggregate } from '../../common/base.entity.js';
import { Clock } from '../../common/clock.js';
import { expectVersion } from '../../common/expect-version.js';
import { validated } from '../../common/validation.js';
import { Person } from '../../people/person.entity.js';
import { openStudy } from '../open-study.js';
import { PlanningValue, type PlanningValueScope } from '../planning-value.entity.js';
import { newPlanningValueSchema, SetPlanningValue } from './set-planning-value.command.js';

@CommandHandler(SetPlanningValue)
export class SetPlanningValueHandler implements ICommandHandler<SetPlanningValue> {
  constructor(
    private readonly em: EntityManager,
    private readonly clock: Clock,
  ) {}

  async execute(command: SetPlanningValue): Promise<string> {
    const { key, family, version, ...figures } = validated(newPlanningValueSchema, command.planningValue);
    const em = this.em.fork();
    const { study } = await openStudy(em, command, 'set planning values');
    const scope: PlanningValueScope = family ?? 'every-family';
    const current = await em.findOne(PlanningValue, { study, key, scope });
    expectVersion(current, version);
    const now = this.clock.now();
    const changes = { ...figures, setBy: em.getReference(Person, command.personId), changedAt: now };
    const planningValue = current
      ? em.assign(current, changes)
      : em.create(PlanningValue, { ...newAggregate(now), study, key, scope, ...changes });
    await em.flush();
    return planningValue.id;
  }
}
