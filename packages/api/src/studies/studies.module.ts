import { Module } from '@nestjs/common';
import { CreateStudyHandler } from './commands/create-study.handler.js';
import { RemoveMemberHandler } from './commands/remove-member.handler.js';
import { RemovePlanningValueHandler } from './commands/remove-planning-value.handler.js';
import { SetCostPlanHandler } from './commands/set-cost-plan.handler.js';
import { SetLimitsHandler } from './commands/set-limits.handler.js';
import { SetMemberHandler } from './commands/set-member.handler.js';
import { SetPlanningValueHandler } from './commands/set-planning-value.handler.js';
import { SetQuestionHandler } from './commands/set-question.handler.js';
import { StartStudyHandler } from './commands/start-study.handler.js';
import { LimitsController } from './limits.controller.js';
import { MembersController } from './members.controller.js';
import { PlanningValuesController } from './planning-values.controller.js';
import { HowDidPlanningValueChangeHandler } from './queries/how-did-planning-value-change.handler.js';
import { WhichCostsHandler } from './queries/which-costs.handler.js';
import { WhichLimitsHandler } from './queries/which-limits.handler.js';
import { WhichMembersHandler } from './queries/which-members.handler.js';
import { WhichPlanningValuesHandler } from './queries/which-planning-values.handler.js';
import { WhichStudiesHandler } from './queries/which-studies.handler.js';
import { WhichStudyHandler } from './queries/which-study.handler.js';
import { StudiesController } from './studies.controller.js';
import { StudyChanges } from './study-changes.js';

@Module({
  controllers: [LimitsController, MembersController, PlanningValuesController, StudiesController],
  providers: [
    CreateStudyHandler,
    HowDidPlanningValueChangeHandler,
    RemoveMemberHandler,
    RemovePlanningValueHandler,
    SetCostPlanHandler,
    SetLimitsHandler,
    SetMemberHandler,
    SetPlanningValueHandler,
    SetQuestionHandler,
    StartStudyHandler,
    StudyChanges,
    WhichCostsHandler,
    WhichLimitsHandler,
    WhichMembersHandler,
    WhichPlanningValuesHandler,
    WhichStudiesHandler,
    WhichStudyHandler,
  ],
  exports: [StudyChanges],
})
export class StudiesModule {}
