import { CommandHandler, type ICommandHandler } from '@nestjs/cqrs';
import { Sessions } from '../sessions.js';
import { SignOut } from './sign-out.command.js';

@CommandHandler(SignOut)
export class SignOutHandler implements ICommandHandler<SignOut> {
  constructor(private readonly sessions: Sessions) {}

  async execute({ token }: SignOut): Promise<void> {
    await this.sessions.end(token);
  }
}
