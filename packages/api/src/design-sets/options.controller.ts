import { Body, Controller, Delete, HttpCode, Param, Post, Put } from '@nestjs/common';
import { CommandBus } from '@nestjs/cqrs';
import { ApiOperation, ApiTags } from '@nestjs/swagger';
import { createZodDto, ZodResponse } from 'nestjs-zod';
import { CurrentPerson } from '../common/current-person.decorator.js';
import type { PersonView } from '../contract/access.js';
import { type OptionView, optionSchema } from '../contract/design-sets.js';
import { changedOptionSchema, newOptionSchema, newRulingSchema } from '../contract/options.js';
import { versionedSchema } from '../contract/versions.js';
import { AddOption } from './commands/add-option.command.js';
import { ChangeOption } from './commands/change-option.command.js';
import { DuplicateOption } from './commands/duplicate-option.command.js';
import { RemoveOption } from './commands/remove-option.command.js';
import { RestoreOption } from './commands/restore-option.command.js';
import { RuleOnOption } from './commands/rule-on-option.command.js';

class OptionDto extends createZodDto(optionSchema) {}
class NewOptionDto extends createZodDto(newOptionSchema) {}
class ChangedOptionDto extends createZodDto(changedOptionSchema) {}
class NewRulingDto extends createZodDto(newRulingSchema) {}
class VersionedDto extends createZodDto(versionedSchema) {}

@ApiTags('Options')
@Controller('studies/:studyId/options')
export class OptionsController {
  constructor(private readonly commands: CommandBus) {}

  @Post()
  @ApiOperation({ summary: 'Add a candidate design behind those that are there' })
  @ZodResponse({ status: 201, description: 'The option', type: OptionDto })
  addOption(
    @Param('studyId') studyId: string,
    @CurrentPerson() person: PersonView,
    @Body() option: NewOptionDto,
  ): Promise<OptionView> {
    return this.commands.execute(new AddOption(studyId, person.id, option));
  }

  @Put(':optionId')
  @ApiOperation({ summary: 'Change an option: its name, structure, size and overrides' })
  @ZodResponse({ status: 200, description: 'The option', type: OptionDto })
  changeOption(
    @Param('studyId') studyId: string,
    @Param('optionId') optionId: string,
    @CurrentPerson() person: PersonView,
    @Body() option: ChangedOptionDto,
  ): Promise<OptionView> {
    return this.commands.execute(new ChangeOption(studyId, person.id, optionId, option));
  }

  @Post(':optionId/duplicate')
  @ApiOperation({ summary: 'Put a copy of an option right behind it' })
  @ZodResponse({ status: 201, description: 'The copy', type: OptionDto })
  duplicateOption(
    @Param('studyId') studyId: string,
    @Param('optionId') optionId: string,
    @CurrentPerson() person: PersonView,
  ): Promise<OptionView> {
    return this.commands.execute(new DuplicateOption(studyId, person.id, optionId));
  }

  @Delete(':optionId')
  @ApiOperation({ summary: 'Remove an option; it can be restored' })
  @ZodResponse({ status: 200, description: 'The option as it was removed', type: OptionDto })
  removeOption(
    @Param('studyId') studyId: string,
    @Param('optionId') optionId: string,
    @CurrentPerson() person: PersonView,
    @Body() { version }: VersionedDto,
  ): Promise<OptionView> {
    return this.commands.execute(new RemoveOption(studyId, person.id, optionId, version));
  }

  @Post(':optionId/restore')
  @HttpCode(200)
  @ApiOperation({ summary: 'Bring a removed option back to its place' })
  @ZodResponse({ status: 200, description: 'The option', type: OptionDto })
  restoreOption(
    @Param('studyId') studyId: string,
    @Param('optionId') optionId: string,
    @CurrentPerson() person: PersonView,
    @Body() { version }: VersionedDto,
  ): Promise<OptionView> {
    return this.commands.execute(new RestoreOption(studyId, person.id, optionId, version));
  }

  @Put(':optionId/ruling')
  @ApiOperation({ summary: 'Rule an option admissible, admissible with conditions, or not admissible' })
  @ZodResponse({ status: 200, description: 'The option', type: OptionDto })
  ruleOnOption(
    @Param('studyId') studyId: string,
    @Param('optionId') optionId: string,
    @CurrentPerson() person: PersonView,
    @Body() ruling: NewRulingDto,
  ): Promise<OptionView> {
    return this.commands.execute(new RuleOnOption(studyId, person.id, optionId, ruling));
  }
}
