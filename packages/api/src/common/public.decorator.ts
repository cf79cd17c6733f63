import { Reflector } from '@nestjs/core';

/** Opens a route to people who have not signed in; every other route is closed to them. */
export const Public = Reflector.createDecorator<void, true>({ transform: () => true });
