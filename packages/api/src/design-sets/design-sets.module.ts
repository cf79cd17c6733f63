import { Module } from '@nestjs/common';
import { AddOptionHandler } from './commands/add-option.handler.js';
import { CreateDesignSetHandler } from './commands/create-design-set.handler.js';
import { DesignSetsController } from './design-sets.controller.js';
import { HowDoOptionsWeighHandler } from './queries/how-do-options-weigh.handler.js';
import { WhichOptionsHandler } from './queries/which-options.handler.js';

@Module({
  controllers: [DesignSetsController],
  providers: [AddOptionHandler, CreateDesignSetHandler, HowDoOptionsWeighHandler, WhichOptionsHandler],
})
export class DesignSetsModule {}
