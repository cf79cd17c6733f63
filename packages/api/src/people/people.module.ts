import { Module } from '@nestjs/common';
import { CreatePersonHandler } from './commands/create-person.handler.js';
import { Passwords } from './passwords.js';

@Module({ providers: [CreatePersonHandler, Passwords], exports: [Passwords] })
export class PeopleModule {}
