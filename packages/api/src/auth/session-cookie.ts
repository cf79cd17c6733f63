import type { CookieOptions, Request } from 'express';
import type { Settings } from '../settings/settings.js';

export const sessionCookie = 'steelyard_session';

export function sessionTokenOf(request: Request): string | undefined {
  const token: unknown = request.cookies[sessionCookie];
  return typeof token === 'string' && token !== '' ? token : undefined;
}

export const sessionCookieOptions = ({ secureCookies }: Settings): CookieOptions => ({
  httpOnly: true,
  sameSite: 'lax',
  secure: secureCookies,
  path: '/',
});
