import type { NextFunction, Request, Response } from 'express';
import { notFound } from './common/problem.js';

/** The database's statements end at the character NUL, so none gets in: not by a path … */
export function refuseNulInPath({ url }: Request, _: Response, next: NextFunction): void {
  next(url.includes('%00') ? notFound('There is nothing at this address.') : undefined);
}

/** … and not by a body. */
export function refuseNulInBody(_: string, value: unknown): unknown {
  if (typeof value !== 'string' || !value.includes('\0')) return value;
  throw new SyntaxError('A text holds the character NUL.');
}
