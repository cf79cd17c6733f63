import { Command } from '@nestjs/cqrs';

export class SignOutEverywhere extends Command<void> {
  constructor(readonly personId: string) {
    super();
  }
}
