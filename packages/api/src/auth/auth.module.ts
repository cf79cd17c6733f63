import { Module } from '@nestjs/common';
import { ThrottlerModule } from '@nestjs/throttler';
import { PeopleModule } from '../people/people.module.js';
import { AccessController } from './access.controller.js';
import { attemptLimits } from './attempts.guard.js';
import { ChangePasswordHandler } from './commands/change-password.handler.js';
import { CreateFirstAdministratorHandler } from './commands/create-first-administrator.handler.js';
import { EnterByLinkHandler } from './commands/enter-by-link.handler.js';
import { SignInHandler } from './commands/sign-in.handler.js';
import { SignOutHandler } from './commands/sign-out.handler.js';
import { SignOutEverywhereHandler } from './commands/sign-out-everywhere.handler.js';
import { FirstVisitCode } from './first-visit-code.js';
import { ProfileController } from './profile.controller.js';
import { HowToEnterHandler } from './queries/how-to-enter.handler.js';
import { WhoIsWelcomeHandler } from './queries/who-is-welcome.handler.js';
import { SessionController } from './session.controller.js';
import { Sessions } from './sessions.js';

@Module({
  imports: [PeopleModule, ThrottlerModule.forRoot(attemptLimits)],
  controllers: [AccessController, ProfileController, SessionController],
  providers: [
    ChangePasswordHandler,
    CreateFirstAdministratorHandler,
    EnterByLinkHandler,
    FirstVisitCode,
    HowToEnterHandler,
    Sessions,
    SignInHandler,
    SignOutEverywhereHandler,
    SignOutHandler,
    WhoIsWelcomeHandler,
  ],
  exports: [FirstVisitCode, Sessions],
})
export class AuthModule {}
