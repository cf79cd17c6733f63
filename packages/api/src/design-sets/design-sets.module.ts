import { Module } from '@nestjs/common';
import { StudiesModule } from '../studies/studies.module.js';
import { AddOptionHandler } from './commands/add-option.handler.js';
import { ChangeDesignSetHandler } from './commands/change-design-set.handler.js';
import { ChangeOptionHandler } from './commands/change-option.handler.js';
import { CreateDesignSetHandler } from './commands/create-design-set.handler.js';
import { DuplicateOptionHandler } from './commands/duplicate-option.handler.js';
import { RecordChoiceHandler } from './commands/record-choice.handler.js';
import { RemoveOptionHandler } from './commands/remove-option.handler.js';
import { RestoreOptionHandler } from './commands/restore-option.handler.js';
import { RuleOnOptionHandler } from './commands/rule-on-option.handler.js';
import { WithdrawChoiceHandler } from './commands/withdraw-choice.handler.js';
import { DesignSetsController } from './design-sets.controller.js';
import { OptionsController } from './options.controller.js';
import { HowDoOptionsWeighHandler } from './queries/how-do-options-weigh.handler.js';
import { WhichOptionsHandler } from './queries/which-options.handler.js';

@Module({
  imports: [StudiesModule],
  controllers: [DesignSetsController, OptionsController],
  providers: [
    AddOptionHandler,
    ChangeDesignSetHandler,
    ChangeOptionHandler,
    CreateDesignSetHandler,
    DuplicateOptionHandler,
    HowDoOptionsWeighHandler,
    RecordChoiceHandler,
    RemoveOptionHandler,
    RestoreOptionHandler,
    RuleOnOptionHandler,
    WhichOptionsHandler,
    WithdrawChoiceHandler,
  ],
})
export class DesignSetsModule {}
