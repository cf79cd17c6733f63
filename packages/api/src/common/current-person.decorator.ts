import { createParamDecorator, type ExecutionContext } from '@nestjs/common';
import type { PersonView } from '../contract/access.js';

export interface SignedInRequest {
  person?: PersonView;
}

/** The person who has signed in, on routes that are not public. */
export const CurrentPerson = createParamDecorator((_: undefined, context: ExecutionContext) => {
  const { person } = context.switchToHttp().getRequest<SignedInRequest>();
  if (!person) throw new Error('A public route has no current person.');
  return person;
});
