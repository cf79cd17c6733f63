import type { Problem, ProblemCode } from '../contract/problem.js';

const statuses: Record<ProblemCode, number> = {
  unreadable: 400,
  'signed-out': 401,
  forbidden: 403,
  'not-found': 404,
  stale: 409,
  invalid: 422,
  'too-many-attempts': 429,
  internal: 500,
};

type Extra = Partial<Pick<Problem, 'status' | 'issues' | 'current' | 'retryAfterSeconds'>>;

/** A refusal that people are told about, in the words of `detail`. */
export class ProblemError extends Error {
  readonly status: number;

  constructor(
    readonly code: ProblemCode,
    readonly detail: string,
    readonly extra: Extra = {},
  ) {
    super(detail);
    this.status = extra.status ?? statuses[code];
  }
}

export const notFound = (detail: string) => new ProblemError('not-found', detail);

export const invalid = (issues: { path: string; message: string }[]) =>
  new ProblemError('invalid', issues.map(({ message }) => message).join(' '), { issues });

export const signedOut = (detail = 'Sign in to continue.') => new ProblemError('signed-out', detail);

export const stale = (current?: unknown) =>
  new ProblemError('stale', 'Someone else has changed this in the meantime.', { current });

export const forbidden = (detail: string) => new ProblemError('forbidden', detail);
