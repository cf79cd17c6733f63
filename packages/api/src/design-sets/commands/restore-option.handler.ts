import { CommandHandler, type ICommandHandler } from '@nestjs/cqrs';
import { expectVersion } from '../../common/expect-version.js';
import type { OptionView } from '../../contract/design-sets.js';
import { StudyChanges } from '../../studies/study-changes.js';
import { checkRoom } from '../check-room.js';
import { optionView } from '../design-set.view.js';
import { loadDesignSet, loadOption } from '../load-design-set.js';
import { optionFacts, optionName } from '../option.audit.js';
import { RestoreOption } from './restore-option.command.js';

@CommandHandler(RestoreOption)
export class RestoreOptionHandler implements ICommandHandler<RestoreOption> {
  constructor(private readonly changes: StudyChanges) {}

  execute(command: RestoreOption): Promise<OptionView> {
    return this.changes.make(command, 'edit options', async ({ em, study, now, record }) => {
      const option = await loadOption(em, study, command.optionId, { removed: true });
      expectVersion(option, command.version, optionView);
      if (option.removedAt) {
        checkRoom((await loadDesignSet(em, study)).options.length);
        record({ action: 'restored', what: optionName(option), after: optionFacts(option) });
        em.assign(option, { removedAt: null, changedAt: now });
        await em.flush();
      }
      return optionView(option);
    });
  }
}
