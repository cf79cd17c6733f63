import {
  Body,
  Controller,
  Delete,
  Get,
  HttpCode,
  Inject,
  Param,
  Post,
  Req,
  Res,
  UseGuards,
} from '@nestjs/common';
import { CommandBus, QueryBus } from '@nestjs/cqrs';
import { ApiNoContentResponse, ApiOperation, ApiTags } from '@nestjs/swagger';
import type { Request, Response } from 'express';
import { createZodDto, ZodResponse } from 'nestjs-zod';
import { CurrentPerson } from '../common/current-person.decorator.js';
import { Public } from '../common/public.decorator.js';
import { firstVisitSchema, type PersonView, personSchema, signInSchema } from '../contract/access.js';
import { type WelcomeView, welcomePasswordSchema, welcomeSchema } from '../contract/people.js';
import { appSettings, type Settings } from '../settings/settings.js';
import { AttemptsGuard } from './attempts.guard.js';
import { CreateFirstAdministrator } from './commands/create-first-administrator.command.js';
import { EnterByLink } from './commands/enter-by-link.command.js';
import { SignIn } from './commands/sign-in.command.js';
import { SignOut } from './commands/sign-out.command.js';
import { WhoIsWelcome } from './queries/who-is-welcome.query.js';
import { sessionCookie, sessionCookieOptions, sessionTokenOf } from './session-cookie.js';
import type { StartedSession } from './sessions.js';

class SignInDto extends createZodDto(signInSchema) {}
class FirstVisitDto extends createZodDto(firstVisitSchema) {}
class WelcomeDto extends createZodDto(welcomeSchema) {}
class WelcomePasswordDto extends createZodDto(welcomePasswordSchema) {}
class PersonDto extends createZodDto(personSchema) {}

@ApiTags('Access')
@Controller()
export class SessionController {
  constructor(
    private readonly commands: CommandBus,
    private readonly queries: QueryBus,
    @Inject(appSettings.KEY) private readonly settings: Settings,
  ) {}

  @Public()
  @UseGuards(AttemptsGuard)
  @Post('first-visit')
  @ApiOperation({ summary: 'Create the administrator of an installation without people, and sign in' })
  @ZodResponse({ status: 201, description: 'The administrator, signed in', type: PersonDto })
  async firstVisit(
    @Body() visit: FirstVisitDto,
    @Res({ passthrough: true }) response: Response,
  ): Promise<PersonView> {
    return this.enter(await this.commands.execute(new CreateFirstAdministrator(visit)), response);
  }

  @Public()
  @Get('welcome/:token')
  @ApiOperation({ summary: 'Whom a one-time link lets in' })
  @ZodResponse({ status: 200, description: 'The person’s name and address', type: WelcomeDto })
  welcome(@Param('token') token: string): Promise<WelcomeView> {
    return this.queries.execute(new WhoIsWelcome(token));
  }

  @Public()
  @UseGuards(AttemptsGuard)
  @Post('welcome/:token')
  @ApiOperation({ summary: 'Set one’s password by a one-time link, and sign in' })
  @ZodResponse({ status: 201, description: 'The person, signed in', type: PersonDto })
  async enterByLink(
    @Param('token') token: string,
    @Body() { password }: WelcomePasswordDto,
    @Res({ passthrough: true }) response: Response,
  ): Promise<PersonView> {
    return this.enter(await this.commands.execute(new EnterByLink(token, password)), response);
  }

  @Public()
  @UseGuards(AttemptsGuard)
  @Post('session')
  @ApiOperation({ summary: 'Sign in' })
  @ZodResponse({ status: 201, description: 'The person, signed in', type: PersonDto })
  async signIn(
    @Body() credentials: SignInDto,
    @Req() request: Request,
    @Res({ passthrough: true }) response: Response,
  ): Promise<PersonView> {
    const started = await this.commands.execute(new SignIn(credentials));
    const former = sessionTokenOf(request);
    if (former) await this.commands.execute(new SignOut(former));
    return this.enter(started, response);
  }

  @Get('session')
  @ApiOperation({ summary: 'Who is signed in' })
  @ZodResponse({ status: 200, description: 'The person', type: PersonDto })
  current(@CurrentPerson() person: PersonView): PersonView {
    return person;
  }

  @Delete('session')
  @HttpCode(204)
  @ApiOperation({ summary: 'Sign out' })
  @ApiNoContentResponse({ description: 'Signed out' })
  async signOut(@Req() request: Request, @Res({ passthrough: true }) response: Response): Promise<void> {
    await this.commands.execute(new SignOut(sessionTokenOf(request) ?? ''));
    response.clearCookie(sessionCookie, sessionCookieOptions(this.settings));
  }

  private enter({ token, expiresAt, person }: StartedSession, response: Response): PersonView {
    response.cookie(sessionCookie, token, { ...sessionCookieOptions(this.settings), expires: expiresAt });
    return person;
  }
}
