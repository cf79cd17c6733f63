import { Module } from '@nestjs/common';
import { ThrottlerModule } from '@nestjs/throttler';
import { PeopleModule } from '../people/people.module.js';
import { AccessController } from './access.controller.js';
import { attemptLimits } from './attempts.guard.js';
import { CreateFirstAdministratorHandler } from './commands/create-first-administrator.handler.js';
import { SignInHandler } from './commands/sign-in.handler.js';
import { SignOutHandler } from './commands/sign-out.handler.js';
import { FirstVisitCode } from './first-visit-code.js';
import { HowToEnterHandler } from './queries/how-to-enter.handler.js';
import { SessionController } from './session.controller.js';
import { Sessions } from './sessions.js';

@Module({
  imports: [PeopleModule, ThrottlerModule.forRoot(attemptLimits)],
  controllers: [AccessController, SessionController],
  providers: [
    CreateFirstAdministratorHandler,
    FirstVisitCode,
    HowToEnterHandler,
    Sessions,
    SignInHandler,
    SignOutHandler,
  ],
  exports: [FirstVisitCode, Sessions],
})
export class AuthModule {}
