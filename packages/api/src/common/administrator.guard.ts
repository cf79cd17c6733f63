import { type CanActivate, type ExecutionContext, Injectable } from '@nestjs/common';
import type { SignedInRequest } from './current-person.decorator.js';
import { forbidden } from './problem.js';

@Injectable()
export class AdministratorGuard implements CanActivate {
  canActivate(context: ExecutionContext): boolean {
    const { person } = context.switchToHttp().getRequest<SignedInRequest>();
    if (person?.administrator) return true;
    throw forbidden('This is for administrators alone.');
  }
}
