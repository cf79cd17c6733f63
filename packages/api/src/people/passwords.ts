import { randomUUID } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import { hash, verify } from '@node-rs/argon2';

/** OWASP's first choice for argon2id, the algorithm this library takes by default. */
const cost = { memoryCost: 19_456, timeCost: 2, parallelism: 1 };

@Injectable()
export class Passwords {
  private readonly nobodys = this.hash(randomUUID());

  hash(password: string): Promise<string> {
    return hash(password, cost);
  }

  /** Takes the same time where there is no hash to compare with, so that nobody learns who has an account. */
  async match(password: string, passwordHash: string | undefined): Promise<boolean> {
    const right = await verify(passwordHash ?? (await this.nobodys), password);
    return right && passwordHash !== undefined;
  }
}
