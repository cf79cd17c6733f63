import { Controller, Get, Param } from '@nestjs/common';
import { QueryBus } from '@nestjs/cqrs';
import { ApiOperation, ApiTags } from '@nestjs/swagger';
import { createZodDto, ZodResponse } from 'nestjs-zod';
import { CurrentPerson } from '../common/current-person.decorator.js';
import type { PersonView } from '../contract/access.js';
import { type DesignSetView, designSetSchema, type WeighView, weighSchema } from '../contract/design-sets.js';
import { HowDoOptionsWeigh } from './queries/how-do-options-weigh.query.js';
import { WhichOptions } from './queries/which-options.query.js';

class DesignSetDto extends createZodDto(designSetSchema) {}
class WeighDto extends createZodDto(weighSchema) {}

@ApiTags('Design sets')
@Controller('studies/:studyId')
export class DesignSetsController {
  constructor(private readonly queries: QueryBus) {}

  @Get('design-set')
  @ApiOperation({ summary: 'The options of a study and what is held equal between them' })
  @ZodResponse({ status: 200, description: 'The design set', type: DesignSetDto })
  designSet(@Param('studyId') studyId: string, @CurrentPerson() person: PersonView): Promise<DesignSetView> {
    return this.queries.execute(new WhichOptions(studyId, person.id));
  }

  @Get('weigh')
  @ApiOperation({ summary: 'The options weighed: each with its request and appraisal, and the verdict' })
  @ZodResponse({ status: 200, description: 'The verdict and the weighed options', type: WeighDto })
  weigh(@Param('studyId') studyId: string, @CurrentPerson() person: PersonView): Promise<WeighView> {
    return this.queries.execute(new HowDoOptionsWeigh(studyId, person.id));
  }
}
