import type { RequestHandler } from 'express';
import helmet from 'helmet';
import { docsPath } from './open-api.js';
import type { Settings } from './settings/settings.js';

/** The hash of nothing: Fluent's style elements start empty and are filled by script. */
const emptyStyle = "'sha256-47DEQpj8HBSa+/TImW+5JCeuQeRkm5NMpJWZG3hSuFU='";

const directives = {
  defaultSrc: ["'self'"],
  scriptSrc: ["'self'"],
  styleSrc: ["'self'", emptyStyle],
  imgSrc: ["'self'", 'data:'],
  fontSrc: ["'self'"],
  objectSrc: ["'none'"],
  baseUri: ["'none'"],
  formAction: ["'self'"],
  frameAncestors: ["'none'"],
};

export function securityHeaders({ secureCookies }: Settings): RequestHandler {
  const withPolicy = (styleSrc: string[]) =>
    helmet({
      contentSecurityPolicy: { useDefaults: false, directives: { ...directives, styleSrc } },
      strictTransportSecurity: secureCookies,
      xFrameOptions: { action: 'deny' },
    });
  const strict = withPolicy(directives.styleSrc);
  // The documentation's pages bring style elements and attributes of their own.
  const documentation = withPolicy(["'self'", "'unsafe-inline'"]);
  return (request, response, next) => {
    const isDocumentation = request.path === docsPath || request.path.startsWith(`${docsPath}/`);
    (isDocumentation ? documentation : strict)(request, response, next);
  };
}
