import { Body, Controller, Get, Param, Post, UseGuards } from '@nestjs/common';
import { CommandBus, QueryBus } from '@nestjs/cqrs';
import { ApiOperation, ApiTags } from '@nestjs/swagger';
import { createZodDto, ZodResponse } from 'nestjs-zod';
import { AdministratorGuard } from '../common/administrator.guard.js';
import { CurrentPerson } from '../common/current-person.decorator.js';
import type { PersonView } from '../contract/access.js';
import {
  type InvitationView,
  invitationSchema,
  newAccountSchema,
  type PeopleView,
  peopleSchema,
} from '../contract/people.js';
import { InvitePerson } from './commands/invite-person.command.js';
import { RenewLink } from './commands/renew-link.command.js';
import { WhichPeople } from './queries/which-people.query.js';

class PeopleDto extends createZodDto(peopleSchema) {}
class NewAccountDto extends createZodDto(newAccountSchema) {}
class InvitationDto extends createZodDto(invitationSchema) {}

@ApiTags('People')
@UseGuards(AdministratorGuard)
@Controller('people')
export class PeopleController {
  constructor(
    private readonly commands: CommandBus,
    private readonly queries: QueryBus,
  ) {}

  @Get()
  @ApiOperation({ summary: 'Everybody who has an account' })
  @ZodResponse({ status: 200, description: 'The people', type: PeopleDto })
  people(): Promise<PeopleView> {
    return this.queries.execute(new WhichPeople());
  }

  @Post()
  @ApiOperation({ summary: 'Give somebody an account, opened by a link that works once' })
  @ZodResponse({ status: 201, description: 'The person and the link', type: InvitationDto })
  invitePerson(@CurrentPerson() person: PersonView, @Body() account: NewAccountDto): Promise<InvitationView> {
    return this.commands.execute(new InvitePerson(person.id, account));
  }

  @Post(':accountId/link')
  @ApiOperation({ summary: 'Make another link for a person; the one before opens nothing any more' })
  @ZodResponse({ status: 201, description: 'The person and the link', type: InvitationDto })
  renewLink(
    @Param('accountId') accountId: string,
    @CurrentPerson() person: PersonView,
  ): Promise<InvitationView> {
    return this.commands.execute(new RenewLink(person.id, accountId));
  }
}
