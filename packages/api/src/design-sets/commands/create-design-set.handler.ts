import { CommandHandler, type ICommandHandler } from '@nestjs/cqrs';
import { newAggregate } from '../../common/base.entity.js';
import { stale } from '../../common/problem.js';
import { validated } from '../../common/validation.js';
import { newDesignSetSchema } from '../../contract/options.js';
import { StudyChanges } from '../../studies/study-changes.js';
import { DesignSet } from '../design-set.entity.js';
import { CreateDesignSet } from './create-design-set.command.js';

@CommandHandler(CreateDesignSet)
export class CreateDesignSetHandler implements ICommandHandler<CreateDesignSet> {
  constructor(private readonly changes: StudyChanges) {}

  async execute(command: CreateDesignSet): Promise<string> {
    const { hold } = validated(newDesignSetSchema, command.designSet);
    return this.changes.make(command, 'edit options', async ({ em, study, now, record }) => {
      if ((await em.count(DesignSet, { study })) > 0) throw stale();
      record({ action: 'created', what: 'the design set', after: { hold } });
      const designSet = em.create(DesignSet, { ...newAggregate(now), study, hold, optionIds: [] });
      return designSet.id;
    });
  }
}
