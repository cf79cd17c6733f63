import { CommandHandler, type ICommandHandler } from '@nestjs/cqrs';
import { expectVersion } from '../../common/expect-version.js';
import { validated } from '../../common/validation.js';
import type { OptionView } from '../../contract/design-sets.js';
import { newRulingSchema } from '../../contract/options.js';
import { StudyChanges } from '../../studies/study-changes.js';
import { checkNotChosen } from '../check-not-chosen.js';
import { optionView } from '../design-set.view.js';
import { loadOption } from '../load-design-set.js';
import { optionName } from '../option.audit.js';
import { RuleOnOption } from './rule-on-option.command.js';

@CommandHandler(RuleOnOption)
export class RuleOnOptionHandler implements ICommandHandler<RuleOnOption> {
  constructor(private readonly changes: StudyChanges) {}

  async execute(command: RuleOnOption): Promise<OptionView> {
    const { version, ...ruling } = validated(newRulingSchema, command.ruling);
    return this.changes.make(command, 'rule on options', async ({ em, study, by, now, record }) => {
      const option = await loadOption(em, study, command.optionId);
      expectVersion(option, version, optionView);
      if (ruling.kind === 'not-admissible') checkNotChosen(option);
      record({
        action: 'ruled on',
        what: optionName(option),
        ...(option.ruling && { before: option.ruling }),
        after: ruling,
      });
      em.assign(option, { ruling, ruledBy: by, ruledAt: now, changedAt: now });
      await em.flush();
      return optionView(option);
    });
  }
}
