import { Body, Controller, Delete, Get, HttpCode, Inject, Put, Req, Res, UseGuards } from '@nestjs/common';
import { CommandBus, QueryBus } from '@nestjs/cqrs';
import { ApiNoContentResponse, ApiOperation, ApiTags } from '@nestjs/swagger';
import type { Request, Response } from 'express';
import { createZodDto, ZodResponse } from 'nestjs-zod';
import { CurrentPerson } from '../common/current-person.decorator.js';
import type { PersonView } from '../contract/access.js';
import {
  changedPasswordSchema,
  changedProfileSchema,
  type ProfileView,
  profileSchema,
} from '../contract/people.js';
import { ChangeProfile } from '../people/commands/change-profile.command.js';
import { WhichProfile } from '../people/queries/which-profile.query.js';
import { appSettings, type Settings } from '../settings/settings.js';
import { AttemptsGuard } from './attempts.guard.js';
import { ChangePassword } from './commands/change-password.command.js';
import { SignOutEverywhere } from './commands/sign-out-everywhere.command.js';
import { sessionCookie, sessionCookieOptions, sessionTokenOf } from './session-cookie.js';

class ProfileDto extends createZodDto(profileSchema) {}
class ChangedProfileDto extends createZodDto(changedProfileSchema) {}
class ChangedPasswordDto extends createZodDto(changedPasswordSchema) {}

/** What a person does with their own account. */
@ApiTags('Profile')
@Controller()
export class ProfileController {
  constructor(
    private readonly commands: CommandBus,
    private readonly queries: QueryBus,
    @Inject(appSettings.KEY) private readonly settings: Settings,
  ) {}

  @Get('profile')
  @ApiOperation({ summary: 'One’s own account' })
  @ZodResponse({ status: 200, description: 'The profile', type: ProfileDto })
  profile(@CurrentPerson() person: PersonView): Promise<ProfileView> {
    return this.queries.execute(new WhichProfile(person.id));
  }

  @Put('profile')
  @ApiOperation({ summary: 'Change one’s own name' })
  @ZodResponse({ status: 200, description: 'The profile', type: ProfileDto })
  changeProfile(
    @CurrentPerson() person: PersonView,
    @Body() profile: ChangedProfileDto,
  ): Promise<ProfileView> {
    return this.commands.execute(new ChangeProfile(person.id, profile));
  }

  @UseGuards(AttemptsGuard)
  @Put('profile/password')
  @HttpCode(204)
  @ApiOperation({ summary: 'Change one’s own password, and sign out everywhere else' })
  @ApiNoContentResponse({ description: 'Changed' })
  changePassword(
    @CurrentPerson() person: PersonView,
    @Body() passwords: ChangedPasswordDto,
    @Req() request: Request,
  ): Promise<void> {
    return this.commands.execute(new ChangePassword(person.id, sessionTokenOf(request) ?? '', passwords));
  }

  @Delete('sessions')
  @HttpCode(204)
  @ApiOperation({ summary: 'Sign out everywhere' })
  @ApiNoContentResponse({ description: 'Signed out' })
  async signOutEverywhere(
    @CurrentPerson() person: PersonView,
    @Res({ passthrough: true }) response: Response,
  ): Promise<void> {
    await this.commands.execute(new SignOutEverywhere(person.id));
    response.clearCookie(sessionCookie, sessionCookieOptions(this.settings));
  }
}
