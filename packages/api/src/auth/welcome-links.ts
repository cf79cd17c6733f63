import type { EntityManager } from '@mikro-orm/sqlite';
import { notFound } from '../common/problem.js';
import type { Person } from '../people/person.entity.js';
import { digestOf, newToken } from './token.js';
import { WelcomeLink } from './welcome-link.entity.js';

const sevenDays = 7 * 24 * 60 * 60_000;

/** Makes the one link of a person in the caller's unit of work; one made before no longer opens anything. */
export async function renewWelcomeLink(em: EntityManager, person: Person, now: Date) {
  await em.nativeDelete(WelcomeLink, { person });
  const token = newToken();
  const expiresAt = new Date(now.getTime() + sevenDays);
  em.create(WelcomeLink, { id: digestOf(token), person, createdAt: now, expiresAt });
  return { link: `/welcome/${token}`, expiresAt };
}

export async function openWelcomeLink(em: EntityManager, token: string, now: Date): Promise<WelcomeLink> {
  const link = await em.findOne(
    WelcomeLink,
    { id: digestOf(token), expiresAt: { $gt: now } },
    { populate: ['person'] },
  );
  if (!link) {
    throw notFound('This link has been used, replaced or is older than 7 days. Ask for another one.');
  }
  return link;
}
