import { constants } from 'node:zlib';
import type { NestApplicationOptions } from '@nestjs/common';
import type { NestExpressApplication } from '@nestjs/platform-express';
import compression, { type CompressionOptions } from 'compression';
import cookieParser from 'cookie-parser';
import type { NextFunction, Request, Response } from 'express';
import { refuseNulInBody, refuseNulInPath } from './no-nul.js';
import { serveOpenApi } from './open-api.js';
import { securityHeaders } from './security-headers.js';
import { appSettings, type Settings } from './settings/settings.js';
import { serveWebBuild } from './web-build.js';

/** Bodies are JSON alone; open connections do not hold up the end. */
export const appOptions: NestApplicationOptions = { bodyParser: false, forceCloseConnections: true };

/** Harder than is usual: scripts are fetched once and kept, and the rest is small. */
const compressionOptions: CompressionOptions = {
  level: constants.Z_BEST_COMPRESSION,
  brotli: { params: { [constants.BROTLI_PARAM_QUALITY]: 6 } },
};

/** What the running server and its tests have in common. */
export function configureApp(app: NestExpressApplication, webBuild?: string): void {
  const current = app.get<Settings>(appSettings.KEY);
  // Behind TLS there is a proxy on this machine, which knows the address that attempts come from.
  if (current.secureCookies) app.set('trust proxy', 'loopback');
  app.use(securityHeaders(current));
  app.use(compression(compressionOptions));
  app.use('/api', (_: Request, response: Response, next: NextFunction) => {
    response.set('Cache-Control', 'no-store');
    next();
  });
  app.use('/api', refuseNulInPath);
  app.use(cookieParser());
  app.useBodyParser('json', { reviver: refuseNulInBody });
  app.setGlobalPrefix('api');
  serveOpenApi(app);
  serveWebBuild(app, webBuild);
}
