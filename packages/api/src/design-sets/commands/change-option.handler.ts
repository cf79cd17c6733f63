import { CommandHandler, type ICommandHandler } from '@nestjs/cqrs';
import { expectVersion } from '../../common/expect-version.js';
import { validated } from '../../common/validation.js';
import type { OptionView } from '../../contract/design-sets.js';
import { changedOptionSchema } from '../../contract/options.js';
import { ledgerOf } from '../../studies/ledger-of.js';
import { StudyChanges } from '../../studies/study-changes.js';
import { checkPlan } from '../check-plan.js';
import { optionView } from '../design-set.view.js';
import { loadOption } from '../load-design-set.js';
import { optionFacts, optionName } from '../option.audit.js';
import { ChangeOption } from './change-option.command.js';

@CommandHandler(ChangeOption)
export class ChangeOptionHandler implements ICommandHandler<ChangeOption> {
  constructor(private readonly changes: StudyChanges) {}

  async execute(command: ChangeOption): Promise<OptionView> {
    const { version, ...given } = validated(changedOptionSchema, command.option);
    return this.changes.make(command, 'edit options', async ({ em, study, now, record }) => {
      const option = await loadOption(em, study, command.optionId);
      expectVersion(option, version, optionView);
      checkPlan(study, await ledgerOf(em, study), given.plan, option.designSet.hold);
      record({ action: 'changed', what: optionName(option), before: optionFacts(option), after: given });
      em.assign(option, { ...given, changedAt: now });
      await em.flush();
      return optionView(option);
    });
  }
}
