import { EntityManager } from '@mikro-orm/sqlite';
import { CommandHandler, type ICommandHandler } from '@nestjs/cqrs';
import { newAggregate } from '../../common/base.entity.js';
import { Clock } from '../../common/clock.js';
import { invalid, notFound } from '../../common/problem.js';
import { validated } from '../../common/validation.js';
import { openStudy } from '../../studies/open-study.js';
import { DesignSet } from '../design-set.entity.js';
import { Option } from '../option.entity.js';
import { AddOption, newOptionSchema } from './add-option.command.js';

@CommandHandler(AddOption)
export class AddOptionHandler implements ICommandHandler<AddOption> {
  constructor(
    private readonly em: EntityManager,
    private readonly clock: Clock,
  ) {}

  async execute(command: AddOption): Promise<string> {
    const { name, plan } = validated(newOptionSchema, command.option);
    const em = this.em.fork();
    const { study } = await openStudy(em, command, 'edit options');
    checkTreatments(plan.treatments, study.treatments.length);
    const designSet = await em.findOne(DesignSet, { study });
    if (!designSet) throw notFound('This study has no design set yet.');
    const now = this.clock.now();
    const option = em.create(Option, { ...newAggregate(now), designSet, name, plan });
    em.assign(designSet, { optionIds: [...designSet.optionIds, option.id], changedAt: now });
    await em.flush();
    return option.id;
  }
}

function checkTreatments(treatments: number[], known: number): void {
  const distinct = new Set(treatments).size === treatments.length;
  if (!distinct || treatments.some((treatment) => treatment >= known)) {
    const message = `Name each treatment once, by its place among the study’s ${known}.`;
    throw invalid([{ path: 'plan.treatments', message }]);
  }
}
