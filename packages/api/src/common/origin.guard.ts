import { type CanActivate, type ExecutionContext, Inject, Injectable } from '@nestjs/common';
import type { Request } from 'express';
import { appSettings, type Settings } from '../settings/settings.js';
import { forbidden } from './problem.js';

const readingMethods = new Set(['GET', 'HEAD', 'OPTIONS']);

/** Refuses changes that a page of another site asks for with the person's cookie. */
@Injectable()
export class OriginGuard implements CanActivate {
  constructor(@Inject(appSettings.KEY) private readonly settings: Settings) {}

  canActivate(context: ExecutionContext): boolean {
    const request = context.switchToHttp().getRequest<Request>();
    if (readingMethods.has(request.method) || this.isOwn(request)) return true;
    throw forbidden('This request came from a page of another site.');
  }

  /** Programs other than browsers send neither header; they carry no one's cookie unasked. */
  private isOwn({ headers }: Request): boolean {
    const site = headers['sec-fetch-site'];
    if (site !== undefined && site !== 'same-origin' && site !== 'none') return false;
    const { origin } = headers;
    if (origin === undefined || origin === this.settings.url) return true;
    return URL.canParse(origin) && new URL(origin).host === headers.host;
  }
}
