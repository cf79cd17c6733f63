import { Module } from '@nestjs/common';
import { ChangeProfileHandler } from './commands/change-profile.handler.js';
import { CreatePersonHandler } from './commands/create-person.handler.js';
import { InvitePersonHandler } from './commands/invite-person.handler.js';
import { RenewLinkHandler } from './commands/renew-link.handler.js';
import { Passwords } from './passwords.js';
import { PeopleController } from './people.controller.js';
import { WhichPeopleHandler } from './queries/which-people.handler.js';
import { WhichProfileHandler } from './queries/which-profile.handler.js';

@Module({
  controllers: [PeopleController],
  providers: [
    ChangeProfileHandler,
    CreatePersonHandler,
    InvitePersonHandler,
    Passwords,
    RenewLinkHandler,
    WhichPeopleHandler,
    WhichProfileHandler,
  ],
  exports: [Passwords],
})
export class PeopleModule {}
