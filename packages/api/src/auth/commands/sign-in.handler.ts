import { EntityManager } from '@mikro-orm/sqlite';
import { CommandHandler, type ICommandHandler } from '@nestjs/cqrs';
import { signedOut } from '../../common/problem.js';
import { Passwords } from '../../people/passwords.js';
import { Person } from '../../people/person.entity.js';
import { Sessions, type StartedSession } from '../sessions.js';
import { SignIn } from './sign-in.command.js';

@CommandHandler(SignIn)
export class SignInHandler implements ICommandHandler<SignIn> {
  constructor(
    private readonly em: EntityManager,
    private readonly passwords: Passwords,
    private readonly sessions: Sessions,
  ) {}

  async execute({ credentials: { email, password } }: SignIn): Promise<StartedSession> {
    const em = this.em.fork();
    const person = await em.findOne(Person, { email });
    const right = await this.passwords.match(password, person?.passwordHash);
    if (!person || !right) throw signedOut('The e-mail address or the password is not right.');
    await this.sessions.forgetExpired(em);
    const started = this.sessions.start(em, person);
    await em.flush();
    return started;
  }
}
