import { createHash, randomBytes } from 'node:crypto';
import { EntityManager } from '@mikro-orm/sqlite';
import { Injectable } from '@nestjs/common';
import { Clock } from '../common/clock.js';
import type { PersonView } from '../contract/access.js';
import type { Person } from '../people/person.entity.js';
import { personView } from '../people/person.view.js';
import { Session } from './session.entity.js';

const minute = 60_000;
const day = 24 * 60 * minute;
const longest = 30 * day;
const longestIdle = 7 * day;

export interface StartedSession {
  token: string;
  expiresAt: Date;
  person: PersonView;
}

/** Who is signed in: each session ends 30 days after sign-in, or after 7 days without a request. */
@Injectable()
export class Sessions {
  constructor(
    private readonly em: EntityManager,
    private readonly clock: Clock,
  ) {}

  /** Opens a session in the unit of work of the caller, who flushes it. */
  start(em: EntityManager, person: Person): StartedSession {
    const token = randomBytes(32).toString('base64url');
    const now = this.clock.now();
    const expiresAt = new Date(now.getTime() + longest);
    em.create(Session, { id: digest(token), person, createdAt: now, lastSeenAt: now, expiresAt });
    return { token, expiresAt, person: personView(person) };
  }

  async personOf(token: string): Promise<PersonView | null> {
    const em = this.em.fork();
    const now = this.clock.now();
    const session = await em.findOne(
      Session,
      {
        id: digest(token),
        expiresAt: { $gt: now },
        lastSeenAt: { $gt: new Date(now.getTime() - longestIdle) },
      },
      { populate: ['person'] },
    );
    if (!session) return null;
    if (now.getTime() - session.lastSeenAt.getTime() > minute) {
      await em.nativeUpdate(Session, { id: session.id }, { lastSeenAt: now });
    }
    return personView(session.person);
  }

  async end(token: string): Promise<void> {
    await this.em.fork().nativeDelete(Session, { id: digest(token) });
  }

  async forgetExpired(em: EntityManager): Promise<void> {
    const now = this.clock.now();
    const idleSince = new Date(now.getTime() - longestIdle);
    await em.nativeDelete(Session, {
      $or: [{ expiresAt: { $lte: now } }, { lastSeenAt: { $lte: idleSince } }],
    });
  }
}

const digest = (token: string) => createHash('sha256').update(token).digest('hex');
