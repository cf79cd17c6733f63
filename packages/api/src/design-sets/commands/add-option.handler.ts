import { CommandHandler, type ICommandHandler } from '@nestjs/cqrs';
import { newAggregate } from '../../common/base.entity.js';
import { validated } from '../../common/validation.js';
import type { OptionView } from '../../contract/design-sets.js';
import { newOptionSchema } from '../../contract/options.js';
import { ledgerOf } from '../../studies/ledger-of.js';
import { refuseUnlessMay } from '../../studies/open-study.js';
import { StudyChanges } from '../../studies/study-changes.js';
import { checkPlan } from '../check-plan.js';
import { checkRoom } from '../check-room.js';
import { optionView } from '../design-set.view.js';
import { loadDesignSet } from '../load-design-set.js';
import { optionFacts, optionName } from '../option.audit.js';
import { Option } from '../option.entity.js';
import { AddOption } from './add-option.command.js';

@CommandHandler(AddOption)
export class AddOptionHandler implements ICommandHandler<AddOption> {
  constructor(private readonly changes: StudyChanges) {}

  async execute(command: AddOption): Promise<OptionView> {
    const { name, plan, ruling } = validated(newOptionSchema, command.option);
    return this.changes.make(command, 'edit options', async ({ em, study, membership, by, now, record }) => {
      if (ruling) refuseUnlessMay(membership.role, 'rule on options');
      const { designSet, options } = await loadDesignSet(em, study);
      checkRoom(options.length);
      checkPlan(study, await ledgerOf(em, study), plan, designSet.hold);
      const option = em.create(Option, { ...newAggregate(now), designSet, name, plan });
      em.assign(designSet, { optionIds: [...designSet.optionIds, option.id], changedAt: now });
      record({ action: 'added', what: optionName(option), after: optionFacts(option) });
      if (ruling) {
        em.assign(option, { ruling, ruledBy: by, ruledAt: now });
        record({ action: 'ruled on', what: optionName(option), after: ruling });
      }
      await em.flush();
      return optionView(option);
    });
  }
}
