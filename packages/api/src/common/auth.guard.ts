import { type CanActivate, type ExecutionContext, Injectable } from '@nestjs/common';
import { Reflector } from '@nestjs/core';
import type { Request } from 'express';
import { sessionTokenOf } from '../auth/session-cookie.js';
import { Sessions } from '../auth/sessions.js';
import type { SignedInRequest } from './current-person.decorator.js';
import { signedOut } from './problem.js';
import { Public } from './public.decorator.js';

/** Every route is closed to people who have not signed in, unless it is marked @Public(). */
@Injectable()
export class AuthGuard implements CanActivate {
  constructor(
    private readonly reflector: Reflector,
    private readonly sessions: Sessions,
  ) {}

  async canActivate(context: ExecutionContext): Promise<boolean> {
    if (this.reflector.getAllAndOverride(Public, [context.getHandler(), context.getClass()])) return true;
    const request = context.switchToHttp().getRequest<Request & SignedInRequest>();
    const token = sessionTokenOf(request);
    const person = token && (await this.sessions.personOf(token));
    if (!person) throw signedOut();
    request.person = person;
    return true;
  }
}
