import { Command } from '@nestjs/cqrs';

export class SignOut extends Command<void> {
  constructor(readonly token: string) {
    super();
  }
}
