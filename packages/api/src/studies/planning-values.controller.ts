import { Body, Controller, Delete, Get, HttpCode, Param, Put } from '@nestjs/common';
import { CommandBus, QueryBus } from '@nestjs/cqrs';
import { ApiNoContentResponse, ApiOperation, ApiTags } from '@nestjs/swagger';
import { createZodDto, ZodResponse } from 'nestjs-zod';
import { CurrentPerson } from '../common/current-person.decorator.js';
import type { PersonView } from '../contract/access.js';
import {
  newPlanningValueSchema,
  type PlanningValueHistoryView,
  planningValueHistorySchema,
} from '../contract/planning-values.js';
import {
  type LedgerView,
  ledgerSchema,
  type PlanningValueView,
  planningValueSchema,
} from '../contract/studies.js';
import { versionedSchema } from '../contract/versions.js';
import { RemovePlanningValue } from './commands/remove-planning-value.command.js';
import { SetPlanningValue } from './commands/set-planning-value.command.js';
import { HowDidPlanningValueChange } from './queries/how-did-planning-value-change.query.js';
import { WhichPlanningValues } from './queries/which-planning-values.query.js';

class LedgerDto extends createZodDto(ledgerSchema) {}
class PlanningValueDto extends createZodDto(planningValueSchema) {}
class NewPlanningValueDto extends createZodDto(newPlanningValueSchema) {}
class PlanningValueHistoryDto extends createZodDto(planningValueHistorySchema) {}
class VersionedDto extends createZodDto(versionedSchema) {}

@ApiTags('Planning values')
@Controller('studies/:studyId/planning-values')
export class PlanningValuesController {
  constructor(
    private readonly commands: CommandBus,
    private readonly queries: QueryBus,
  ) {}

  @Get()
  @ApiOperation({ summary: 'The ledger of planning values, each with its source, who set it and when' })
  @ZodResponse({ status: 200, description: 'The ledger', type: LedgerDto })
  planningValues(
    @Param('studyId') studyId: string,
    @CurrentPerson() person: PersonView,
  ): Promise<LedgerView> {
    return this.queries.execute(new WhichPlanningValues(studyId, person.id));
  }

  @Put()
  @ApiOperation({ summary: 'Set a planning value, for every family of designs or for one' })
  @ZodResponse({ status: 200, description: 'The planning value', type: PlanningValueDto })
  setPlanningValue(
    @Param('studyId') studyId: string,
    @CurrentPerson() person: PersonView,
    @Body() planningValue: NewPlanningValueDto,
  ): Promise<PlanningValueView> {
    return this.commands.execute(new SetPlanningValue(studyId, person.id, planningValue));
  }

  @Get(':valueId/history')
  @ApiOperation({ summary: 'Every version of a planning value, newest first' })
  @ZodResponse({ status: 200, description: 'The versions', type: PlanningValueHistoryDto })
  planningValueHistory(
    @Param('studyId') studyId: string,
    @Param('valueId') valueId: string,
    @CurrentPerson() person: PersonView,
  ): Promise<PlanningValueHistoryView> {
    return this.queries.execute(new HowDidPlanningValueChange(studyId, person.id, valueId));
  }

  @Delete(':valueId')
  @HttpCode(204)
  @ApiOperation({ summary: 'Remove the planning value of one family of designs' })
  @ApiNoContentResponse({ description: 'Removed' })
  removePlanningValue(
    @Param('studyId') studyId: string,
    @Param('valueId') valueId: string,
    @CurrentPerson() person: PersonView,
    @Body() { version }: VersionedDto,
  ): Promise<void> {
    return this.commands.execute(new RemovePlanningValue(studyId, person.id, valueId, version));
  }
}
