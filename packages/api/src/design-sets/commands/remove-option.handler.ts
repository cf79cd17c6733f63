import { CommandHandler, type ICommandHandler } from '@nestjs/cqrs';
import { expectVersion } from '../../common/expect-version.js';
import type { OptionView } from '../../contract/design-sets.js';
import { StudyChanges } from '../../studies/study-changes.js';
import { checkNotChosen } from '../check-not-chosen.js';
import { optionView } from '../design-set.view.js';
import { loadOption } from '../load-design-set.js';
import { optionFacts, optionName } from '../option.audit.js';
import { RemoveOption } from './remove-option.command.js';

@CommandHandler(RemoveOption)
export class RemoveOptionHandler implements ICommandHandler<RemoveOption> {
  constructor(private readonly changes: StudyChanges) {}

  execute(command: RemoveOption): Promise<OptionView> {
    return this.changes.make(command, 'edit options', async ({ em, study, now, record }) => {
      const option = await loadOption(em, study, command.optionId);
      expectVersion(option, command.version, optionView);
      checkNotChosen(option);
      record({ action: 'removed', what: optionName(option), before: optionFacts(option) });
      em.assign(option, { removedAt: now, changedAt: now });
      await em.flush();
      return optionView(option);
    });
  }
}
