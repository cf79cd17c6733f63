import { Body, Controller, Delete, Get, Param, Put } from '@nestjs/common';
import { CommandBus, QueryBus } from '@nestjs/cqrs';
import { ApiOperation, ApiTags } from '@nestjs/swagger';
import { createZodDto, ZodResponse } from 'nestjs-zod';
import { CurrentPerson } from '../common/current-person.decorator.js';
import type { PersonView } from '../contract/access.js';
import { type MembersView, membersSchema, newMemberSchema } from '../contract/members.js';
import { RemoveMember } from './commands/remove-member.command.js';
import { SetMember } from './commands/set-member.command.js';
import { WhichMembers } from './queries/which-members.query.js';

class MembersDto extends createZodDto(membersSchema) {}
class NewMemberDto extends createZodDto(newMemberSchema) {}

@ApiTags('Members')
@Controller('studies/:studyId/members')
export class MembersController {
  constructor(
    private readonly commands: CommandBus,
    private readonly queries: QueryBus,
  ) {}

  @Get()
  @ApiOperation({ summary: 'The members of a study, each with their role' })
  @ZodResponse({ status: 200, description: 'The members', type: MembersDto })
  members(@Param('studyId') studyId: string, @CurrentPerson() person: PersonView): Promise<MembersView> {
    return this.queries.execute(new WhichMembers(studyId, person.id));
  }

  @Put()
  @ApiOperation({ summary: 'Add a person who has an account, or change a member’s role' })
  @ZodResponse({ status: 200, description: 'The members', type: MembersDto })
  setMember(
    @Param('studyId') studyId: string,
    @CurrentPerson() person: PersonView,
    @Body() member: NewMemberDto,
  ): Promise<MembersView> {
    return this.commands.execute(new SetMember(studyId, person.id, member));
  }

  @Delete(':memberId')
  @ApiOperation({ summary: 'Remove a member, named by the person’s id' })
  @ZodResponse({ status: 200, description: 'The members that remain', type: MembersDto })
  removeMember(
    @Param('studyId') studyId: string,
    @Param('memberId') memberId: string,
    @CurrentPerson() person: PersonView,
  ): Promise<MembersView> {
    return this.commands.execute(new RemoveMember(studyId, person.id, memberId));
  }
}
