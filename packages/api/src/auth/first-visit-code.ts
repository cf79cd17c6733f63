import { createHash, randomBytes, timingSafeEqual } from 'node:crypto';
import { Injectable } from '@nestjs/common';

/** What the first visitor proves to be this server's operator with: in memory only, new at each start. */
@Injectable()
export class FirstVisitCode {
  readonly code = randomBytes(15).toString('base64url');

  matches(given: string): boolean {
    return timingSafeEqual(digest(given), digest(this.code));
  }
}

const digest = (text: string) => createHash('sha256').update(text).digest();
