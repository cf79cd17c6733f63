import { Module } from '@nestjs/common';
import { CreateStudyHandler } from './commands/create-study.handler.js';
import { SetCostPlanHandler } from './commands/set-cost-plan.handler.js';
import { SetPlanningValueHandler } from './commands/set-planning-value.handler.js';
import { WhichCostsHandler } from './queries/which-costs.handler.js';
import { WhichPlanningValuesHandler } from './queries/which-planning-values.handler.js';
import { WhichStudiesHandler } from './queries/which-studies.handler.js';
import { WhichStudyHandler } from './queries/which-study.handler.js';
import { StudiesController } from './studies.controller.js';

@Module({
  controllers: [StudiesController],
  providers: [
    CreateStudyHandler,
    SetCostPlanHandler,
    SetPlanningValueHandler,
    WhichCostsHandler,
    WhichPlanningValuesHandler,
    WhichStudiesHandler,
    WhichStudyHandler,
  ],
})
export class StudiesModule {}
