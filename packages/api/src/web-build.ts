import { existsSync } from 'node:fs';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import type { NestExpressApplication } from '@nestjs/platform-express';
import type { NextFunction, Request, Response } from 'express';

const webBuild = fileURLToPath(new URL('../../web/dist', import.meta.url));

/** Serves the web application: its hashed files for ever, its one page at every path that names no file. */
export function serveWebBuild(app: NestExpressApplication, folder = webBuild): void {
  const page = join(folder, 'index.html');
  app.useStaticAssets(join(folder, 'assets'), {
    prefix: '/assets',
    index: false,
    immutable: true,
    maxAge: '365d',
  });
  app.useStaticAssets(folder, { index: false, maxAge: 0 });
  app.use((request: Request, response: Response, next: NextFunction) => {
    if (!isPage(request) || !existsSync(page)) return next();
    response.set('Cache-Control', 'no-cache').sendFile(page);
  });
}

const isPage = ({ method, path }: Request) =>
  (method === 'GET' || method === 'HEAD') && !/^\/(api|assets)(\/|$)/.test(path) && !path.includes('.');
