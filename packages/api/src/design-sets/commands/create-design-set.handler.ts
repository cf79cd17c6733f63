import { EntityManager } from '@mikro-orm/sqlite';
import { CommandHandler, type ICommandHandler } from '@nestjs/cqrs';
import { newAggregate } from '../../common/base.entity.js';
import { Clock } from '../../common/clock.js';
import { expectVersion } from '../../common/expect-version.js';
import { validated } from '../../common/validation.js';
import { openStudy } from '../../studies/open-study.js';
import { DesignSet } from '../design-set.entity.js';
import { CreateDesignSet, newDesignSetSchema } from './create-design-set.command.js';

@CommandHandler(CreateDesignSet)
export class CreateDesignSetHandler implements ICommandHandler<CreateDesignSet> {
  constructor(
    private readonly em: EntityManager,
    private readonly clock: Clock,
  ) {}

  async execute(command: CreateDesignSet): Promise<string> {
    const { hold } = validated(newDesignSetSchema, command.designSet);
    const em = this.em.fork();
    const { study } = await openStudy(em, command, 'edit options');
    expectVersion(await em.findOne(DesignSet, { study }), null);
    const designSet = em.create(DesignSet, { ...newAggregate(this.clock.now()), study, hold, optionIds: [] });
    await em.flush();
    return designSet.id;
  }
}
