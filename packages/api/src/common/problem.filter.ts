import { randomUUID } from 'node:crypto';
import { STATUS_CODES } from 'node:http';
import { OptimisticLockError, UniqueConstraintViolationException } from '@mikro-orm/sqlite';
import { type ArgumentsHost, Catch, type ExceptionFilter, HttpException, Logger } from '@nestjs/common';
import { CalcError } from '@steelyard/calc';
import type { Response } from 'express';
import type { Problem } from '../contract/problem.js';
import { invalid, notFound, ProblemError, stale } from './problem.js';

/** Answers every error as `application/problem+json`; what nobody foresaw is logged and stays in the log. */
@Catch()
export class ProblemFilter implements ExceptionFilter {
  private readonly logger = new Logger('Problem');

  catch(error: unknown, host: ArgumentsHost): void {
    const response = host.switchToHttp().getResponse<Response>();
    if (response.headersSent) {
      response.destroy();
      return;
    }
    const problem = this.problemOf(error);
    if (problem.retryAfterSeconds !== undefined)
      response.set('Retry-After', String(problem.retryAfterSeconds));
    response.status(problem.status).type('application/problem+json').send(JSON.stringify(problem));
  }

  private problemOf(error: unknown): Problem {
    const known = knownProblem(error);
    if (known) {
      const { code, detail, status, extra } = known;
      return { ...describe(status), code, detail, ...extra, status };
    }
    const correlationId = randomUUID();
    this.logger.error(`${correlationId} ${error instanceof Error ? (error.stack ?? error.message) : error}`);
    return {
      ...describe(500),
      code: 'internal',
      detail: 'Something went wrong on the server. Its log names the cause under this correlation id.',
      correlationId,
    };
  }
}

const describe = (status: number) => ({
  type: 'about:blank',
  title: STATUS_CODES[status] ?? 'Error',
  status,
});

function knownProblem(error: unknown): ProblemError | null {
  if (error instanceof ProblemError) return error;
  if (error instanceof CalcError) return invalid([{ path: error.path, message: error.message }]);
  if (error instanceof OptimisticLockError || error instanceof UniqueConstraintViolationException)
    return stale();

  const status = statusOf(error);
  if (status === 404) return notFound('There is nothing at this address.');
  if (status >= 400 && status < 500) {
    return new ProblemError('unreadable', 'The request could not be read: send JSON.', { status });
  }
  return null;
}

/** Nest's own exceptions and the body parser's errors both carry a status. */
function statusOf(error: unknown): number {
  if (error instanceof HttpException) return error.getStatus();
  const { status } = (error ?? {}) as { status?: unknown };
  return typeof status === 'number' ? status : 500;
}
