import { Controller, Get, Param } from '@nestjs/common';
import { QueryBus } from '@nestjs/cqrs';
import { ApiOperation, ApiTags } from '@nestjs/swagger';
import { createZodDto, ZodResponse } from 'nestjs-zod';
import { CurrentPerson } from '../common/current-person.decorator.js';
import type { PersonView } from '../contract/access.js';
import {
  type CostPlanView,
  costPlanViewSchema,
  type LedgerView,
  ledgerSchema,
  type StudiesView,
  type StudyView,
  studiesSchema,
  studySchema,
} from '../contract/studies.js';
import { WhichCosts } from './queries/which-costs.query.js';
import { WhichPlanningValues } from './queries/which-planning-values.query.js';
import { WhichStudies } from './queries/which-studies.query.js';
import { WhichStudy } from './queries/which-study.query.js';

class StudiesDto extends createZodDto(studiesSchema) {}
class StudyDto extends createZodDto(studySchema) {}
class LedgerDto extends createZodDto(ledgerSchema) {}
class CostPlanDto extends createZodDto(costPlanViewSchema) {}

@ApiTags('Studies')
@Controller('studies')
export class StudiesController {
  constructor(private readonly queries: QueryBus) {}

  @Get()
  @ApiOperation({ summary: 'The studies in which the person has a part, last changed first' })
  @ZodResponse({ status: 200, description: 'The studies', type: StudiesDto })
  studies(@CurrentPerson() person: PersonView): Promise<StudiesView> {
    return this.queries.execute(new WhichStudies(person.id));
  }

  @Get(':studyId')
  @ApiOperation({ summary: 'A study: its question, test, treatments and members' })
  @ZodResponse({ status: 200, description: 'The study', type: StudyDto })
  study(@Param('studyId') studyId: string, @CurrentPerson() person: PersonView): Promise<StudyView> {
    return this.queries.execute(new WhichStudy(studyId, person.id));
  }

  @Get(':studyId/planning-values')
  @ApiOperation({ summary: 'The ledger of planning values, each with its source, who set it and when' })
  @ZodResponse({ status: 200, description: 'The ledger', type: LedgerDto })
  planningValues(
    @Param('studyId') studyId: string,
    @CurrentPerson() person: PersonView,
  ): Promise<LedgerView> {
    return this.queries.execute(new WhichPlanningValues(studyId, person.id));
  }

  @Get(':studyId/costs')
  @ApiOperation({ summary: 'Money and months of a study' })
  @ZodResponse({ status: 200, description: 'The cost plan', type: CostPlanDto })
  costs(@Param('studyId') studyId: string, @CurrentPerson() person: PersonView): Promise<CostPlanView> {
    return this.queries.execute(new WhichCosts(studyId, person.id));
  }
}
