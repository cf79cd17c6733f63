import { Body, Controller, Get, Param, Post, Put } from '@nestjs/common';
import { CommandBus, QueryBus } from '@nestjs/cqrs';
import { ApiOperation, ApiTags } from '@nestjs/swagger';
import { createZodDto, ZodResponse } from 'nestjs-zod';
import { CurrentPerson } from '../common/current-person.decorator.js';
import type { PersonView } from '../contract/access.js';
import { newCostPlanSchema } from '../contract/costs.js';
import { newQuestionSchema } from '../contract/question.js';
import {
  type CostPlanView,
  costPlanViewSchema,
  type StudiesView,
  type StudyView,
  studiesSchema,
  studySchema,
} from '../contract/studies.js';
import { studyStartSchema } from '../contract/study-start.js';
import { SetCostPlan } from './commands/set-cost-plan.command.js';
import { SetQuestion } from './commands/set-question.command.js';
import { StartStudy } from './commands/start-study.command.js';
import { WhichCosts } from './queries/which-costs.query.js';
import { WhichStudies } from './queries/which-studies.query.js';
import { WhichStudy } from './queries/which-study.query.js';

class StudiesDto extends createZodDto(studiesSchema) {}
class StudyDto extends createZodDto(studySchema) {}
class CostPlanDto extends createZodDto(costPlanViewSchema) {}
class NewCostPlanDto extends createZodDto(newCostPlanSchema) {}
class StudyStartDto extends createZodDto(studyStartSchema) {}
class NewQuestionDto extends createZodDto(newQuestionSchema) {}

@ApiTags('Studies')
@Controller('studies')
export class StudiesController {
  constructor(
    private readonly commands: CommandBus,
    private readonly queries: QueryBus,
  ) {}

  @Get()
  @ApiOperation({ summary: 'The studies in which the person has a part, last changed first' })
  @ZodResponse({ status: 200, description: 'The studies', type: StudiesDto })
  studies(@CurrentPerson() person: PersonView): Promise<StudiesView> {
    return this.queries.execute(new WhichStudies(person.id));
  }

  @Post()
  @ApiOperation({ summary: 'Start a study: what is not asked is filled in with values marked as assumed' })
  @ZodResponse({ status: 201, description: 'The study', type: StudyDto })
  startStudy(@CurrentPerson() person: PersonView, @Body() study: StudyStartDto): Promise<StudyView> {
    return this.commands.execute(new StartStudy(person.id, study));
  }

  @Get(':studyId')
  @ApiOperation({ summary: 'A study: its question, test, treatments and members' })
  @ZodResponse({ status: 200, description: 'The study', type: StudyDto })
  study(@Param('studyId') studyId: string, @CurrentPerson() person: PersonView): Promise<StudyView> {
    return this.queries.execute(new WhichStudy(studyId, person.id));
  }

  @Put(':studyId/question')
  @ApiOperation({ summary: 'Change a study’s question, estimand, test, treatments and words' })
  @ZodResponse({ status: 200, description: 'The study', type: StudyDto })
  setQuestion(
    @Param('studyId') studyId: string,
    @CurrentPerson() person: PersonView,
    @Body() question: NewQuestionDto,
  ): Promise<StudyView> {
    return this.commands.execute(new SetQuestion(studyId, person.id, question));
  }

  @Get(':studyId/costs')
  @ApiOperation({ summary: 'Money and months of a study' })
  @ZodResponse({ status: 200, description: 'The cost plan', type: CostPlanDto })
  costs(@Param('studyId') studyId: string, @CurrentPerson() person: PersonView): Promise<CostPlanView> {
    return this.queries.execute(new WhichCosts(studyId, person.id));
  }

  @Put(':studyId/costs')
  @ApiOperation({ summary: 'Set money and months of a study' })
  @ZodResponse({ status: 200, description: 'The cost plan', type: CostPlanDto })
  setCosts(
    @Param('studyId') studyId: string,
    @CurrentPerson() person: PersonView,
    @Body() costPlan: NewCostPlanDto,
  ): Promise<CostPlanView> {
    return this.commands.execute(new SetCostPlan(studyId, person.id, costPlan));
  }
}
