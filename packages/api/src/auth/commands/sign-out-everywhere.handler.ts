import { EntityManager } from '@mikro-orm/sqlite';
import { CommandHandler, type ICommandHandler } from '@nestjs/cqrs';
import { Sessions } from '../sessions.js';
import { SignOutEverywhere } from './sign-out-everywhere.command.js';

@CommandHandler(SignOutEverywhere)
export class SignOutEverywhereHandler implements ICommandHandler<SignOutEverywhere> {
  constructor(
    private readonly em: EntityManager,
    private readonly sessions: Sessions,
  ) {}

  execute({ personId }: SignOutEverywhere): Promise<void> {
    return this.sessions.endAll(this.em.fork(), personId);
  }
}
