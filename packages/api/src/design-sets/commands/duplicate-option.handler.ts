import { CommandHandler, type ICommandHandler } from '@nestjs/cqrs';
import { newAggregate } from '../../common/base.entity.js';
import type { OptionView } from '../../contract/design-sets.js';
import { StudyChanges } from '../../studies/study-changes.js';
import { checkRoom } from '../check-room.js';
import { optionView } from '../design-set.view.js';
import { loadDesignSet, loadOption } from '../load-design-set.js';
import { optionFacts, optionName } from '../option.audit.js';
import { Option } from '../option.entity.js';
import { DuplicateOption } from './duplicate-option.command.js';

@CommandHandler(DuplicateOption)
export class DuplicateOptionHandler implements ICommandHandler<DuplicateOption> {
  constructor(private readonly changes: StudyChanges) {}

  execute(command: DuplicateOption): Promise<OptionView> {
    return this.changes.make(command, 'edit options', async ({ em, study, now, record }) => {
      const original = await loadOption(em, study, command.optionId);
      const { designSet, options } = await loadDesignSet(em, study);
      checkRoom(options.length);
      const name = `Copy of ${original.name}`.slice(0, 200);
      const copy = em.create(Option, { ...newAggregate(now), designSet, name, plan: original.plan });
      const behind = designSet.optionIds.indexOf(original.id) + 1;
      em.assign(designSet, { optionIds: designSet.optionIds.toSpliced(behind, 0, copy.id), changedAt: now });
      record({ action: 'duplicated', what: optionName(original), after: optionFacts(copy) });
      await em.flush();
      return optionView(copy);
    });
  }
}
