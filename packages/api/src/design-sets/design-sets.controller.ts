import { Body, Controller, Delete, Get, Param, Put } from '@nestjs/common';
import { CommandBus, QueryBus } from '@nestjs/cqrs';
import { ApiOperation, ApiTags } from '@nestjs/swagger';
import { createZodDto, ZodResponse } from 'nestjs-zod';
import { CurrentPerson } from '../common/current-person.decorator.js';
import type { PersonView } from '../contract/access.js';
import { type DesignSetView, designSetSchema, type WeighView, weighSchema } from '../contract/design-sets.js';
import { changedDesignSetSchema, newChoiceSchema } from '../contract/options.js';
import { versionedSchema } from '../contract/versions.js';
import { ChangeDesignSet } from './commands/change-design-set.command.js';
import { RecordChoice } from './commands/record-choice.command.js';
import { WithdrawChoice } from './commands/withdraw-choice.command.js';
import { HowDoOptionsWeigh } from './queries/how-do-options-weigh.query.js';
import { WhichOptions } from './queries/which-options.query.js';

class DesignSetDto extends createZodDto(designSetSchema) {}
class WeighDto extends createZodDto(weighSchema) {}
class ChangedDesignSetDto extends createZodDto(changedDesignSetSchema) {}
class NewChoiceDto extends createZodDto(newChoiceSchema) {}
class VersionedDto extends createZodDto(versionedSchema) {}

@ApiTags('Design sets')
@Controller('studies/:studyId')
export class DesignSetsController {
  constructor(
    private readonly commands: CommandBus,
    private readonly queries: QueryBus,
  ) {}

  @Get('design-set')
  @ApiOperation({ summary: 'The options of a study, what is held equal between them, and the choice' })
  @ZodResponse({ status: 200, description: 'The design set', type: DesignSetDto })
  designSet(@Param('studyId') studyId: string, @CurrentPerson() person: PersonView): Promise<DesignSetView> {
    return this.queries.execute(new WhichOptions(studyId, person.id));
  }

  @Put('design-set')
  @ApiOperation({ summary: 'Change what is held equal and the order of the options' })
  @ZodResponse({ status: 200, description: 'The design set', type: DesignSetDto })
  changeDesignSet(
    @Param('studyId') studyId: string,
    @CurrentPerson() person: PersonView,
    @Body() designSet: ChangedDesignSetDto,
  ): Promise<DesignSetView> {
    return this.commands.execute(new ChangeDesignSet(studyId, person.id, designSet));
  }

  @Put('choice')
  @ApiOperation({ summary: 'Record the option settled on, why, and why not each other' })
  @ZodResponse({ status: 200, description: 'The design set', type: DesignSetDto })
  recordChoice(
    @Param('studyId') studyId: string,
    @CurrentPerson() person: PersonView,
    @Body() choice: NewChoiceDto,
  ): Promise<DesignSetView> {
    return this.commands.execute(new RecordChoice(studyId, person.id, choice));
  }

  @Delete('choice')
  @ApiOperation({ summary: 'Withdraw the choice' })
  @ZodResponse({ status: 200, description: 'The design set', type: DesignSetDto })
  withdrawChoice(
    @Param('studyId') studyId: string,
    @CurrentPerson() person: PersonView,
    @Body() { version }: VersionedDto,
  ): Promise<DesignSetView> {
    return this.commands.execute(new WithdrawChoice(studyId, person.id, version));
  }

  @Get('weigh')
  @ApiOperation({ summary: 'The options weighed: each with its request and appraisal, and the verdict' })
  @ZodResponse({ status: 200, description: 'The verdict and the weighed options', type: WeighDto })
  weigh(@Param('studyId') studyId: string, @CurrentPerson() person: PersonView): Promise<WeighView> {
    return this.queries.execute(new HowDoOptionsWeigh(studyId, person.id));
  }
}
