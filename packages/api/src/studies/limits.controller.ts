import { Body, Controller, Get, Param, Put } from '@nestjs/common';
import { CommandBus, QueryBus } from '@nestjs/cqrs';
import { ApiOperation, ApiTags } from '@nestjs/swagger';
import { createZodDto, ZodResponse } from 'nestjs-zod';
import { CurrentPerson } from '../common/current-person.decorator.js';
import type { PersonView } from '../contract/access.js';
import { type LimitsView, newLimitsSchema, studyLimitsSchema } from '../contract/limits.js';
import { SetLimits } from './commands/set-limits.command.js';
import { WhichLimits } from './queries/which-limits.query.js';

class LimitsDto extends createZodDto(studyLimitsSchema) {}
class NewLimitsDto extends createZodDto(newLimitsSchema) {}

@ApiTags('Limits')
@Controller('studies/:studyId/limits')
export class LimitsController {
  constructor(
    private readonly commands: CommandBus,
    private readonly queries: QueryBus,
  ) {}

  @Get()
  @ApiOperation({ summary: 'The most clusters, participants per cluster, money and months that exist' })
  @ZodResponse({ status: 200, description: 'The limits', type: LimitsDto })
  limits(@Param('studyId') studyId: string, @CurrentPerson() person: PersonView): Promise<LimitsView> {
    return this.queries.execute(new WhichLimits(studyId, person.id));
  }

  @Put()
  @ApiOperation({ summary: 'Set the limits of a study' })
  @ZodResponse({ status: 200, description: 'The limits', type: LimitsDto })
  setLimits(
    @Param('studyId') studyId: string,
    @CurrentPerson() person: PersonView,
    @Body() limits: NewLimitsDto,
  ): Promise<LimitsView> {
    return this.commands.execute(new SetLimits(studyId, person.id, limits));
  }
}
