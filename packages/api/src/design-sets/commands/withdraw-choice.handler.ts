import { CommandHandler, type ICommandHandler } from '@nestjs/cqrs';
import { notFound, stale } from '../../common/problem.js';
import type { DesignSetView } from '../../contract/design-sets.js';
import { StudyChanges } from '../../studies/study-changes.js';
import { choiceFacts } from '../choice.audit.js';
import { designSetView } from '../design-set.view.js';
import { loadDesignSet } from '../load-design-set.js';
import { WithdrawChoice } from './withdraw-choice.command.js';

@CommandHandler(WithdrawChoice)
export class WithdrawChoiceHandler implements ICommandHandler<WithdrawChoice> {
  constructor(private readonly changes: StudyChanges) {}

  execute(command: WithdrawChoice): Promise<DesignSetView> {
    return this.changes.make(command, 'record the choice', async ({ em, study, now, record }) => {
      const loaded = await loadDesignSet(em, study);
      const { designSet, options, removed } = loaded;
      if (designSet.version !== command.version) throw stale(designSetView(loaded));
      if (!designSet.choice) throw notFound('This study has no choice yet.');
      const before = choiceFacts(designSet.choice, [...options, ...removed]);
      record({ action: 'withdrew', what: 'the choice', before });
      em.assign(designSet, { choice: null, chosenBy: null, changedAt: now });
      await em.flush();
      return designSetView(loaded);
    });
  }
}
