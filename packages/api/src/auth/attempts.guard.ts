import type { ExecutionContext } from '@nestjs/common';
import { Injectable } from '@nestjs/common';
import { ThrottlerGuard, type ThrottlerLimitDetail, type ThrottlerModuleOptions } from '@nestjs/throttler';
import type { Request } from 'express';
import { ProblemError } from '../common/problem.js';

const minute = 60_000;

/** Ten attempts a minute at one account from one address, and a hundred from one address at any. */
export const attemptLimits: ThrottlerModuleOptions = {
  setHeaders: false,
  throttlers: [
    {
      name: 'account',
      limit: 10,
      ttl: minute,
      blockDuration: 0,
      getTracker: ({ ip, body }) => `${ip} ${accountOf(body)}`,
    },
    { name: 'address', limit: 100, ttl: minute, blockDuration: 0 },
  ],
};

function accountOf(body: Request['body']): string {
  return typeof body?.email === 'string' ? body.email.trim().toLowerCase() : '';
}

@Injectable()
export class AttemptsGuard extends ThrottlerGuard {
  protected override async throwThrottlingException(
    _: ExecutionContext,
    { timeToBlockExpire }: ThrottlerLimitDetail,
  ): Promise<void> {
    const retryAfterSeconds = Math.max(1, timeToBlockExpire);
    throw new ProblemError('too-many-attempts', 'Too many attempts. Wait a minute and try again.', {
      retryAfterSeconds,
    });
  }
}
