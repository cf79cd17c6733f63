import { EntityManager } from '@mikro-orm/sqlite';
import { Injectable } from '@nestjs/common';
import { Clock } from '../common/clock.js';
import type { PersonView } from '../contract/access.js';
import type { Person } from '../people/person.entity.js';
import { personView } from '../people/person.view.js';
import { Session } from './session.entity.js';
import { digestOf, newToken } from './token.js';

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
    const token = newToken();
    const now = this.clock.now();
    const expiresAt = new Date(now.getTime() + longest);
    em.create(Session, { id: digestOf(token), person, createdAt: now, lastSeenAt: now, expiresAt });
    return { token, expiresAt, person: personView(person) };
  }

  async personOf(token: string): Promise<PersonView | null> {
    const em = this.em.fork();
    const now = this.clock.now();
    const session = await em.findOne(
      Session,
      {
        id: digestOf(token),
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
    await this.em.fork().nativeDelete(Session, { id: digestOf(token) });
  }

  /** Ends every session of a person in the unit of work of the caller; with `but` all except that one. */
  async endAll(em: EntityManager, personId: string, but?: string): Promise<void> {
    await em.nativeDelete(Session, { person: personId, ...(but && { id: { $ne: digestOf(but) } }) });
  }

  async forgetExpired(em: EntityManager): Promise<void> {
    const now = this.clock.now();
    const idleSince = new Date(now.getTime() - longestIdle);
    await em.nativeDelete(Session, {
      $or: [{ expiresAt: { $lte: now } }, { lastSeenAt: { $lte: idleSince } }],
    });
  }
}
