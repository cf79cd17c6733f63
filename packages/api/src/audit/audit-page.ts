import type { EntityManager, FilterQuery } from '@mikro-orm/sqlite';
import { notFound } from '../common/problem.js';
import type { AuditEntryView, AuditPage, AuditView } from '../contract/audit.js';
import { AuditEntry } from './audit-entry.entity.js';

/** A page of one study's entries or, with null, of the site's: newest first. */
export async function auditPage(
  em: EntityManager,
  study: string | null,
  { before, limit }: AuditPage,
): Promise<AuditView> {
  const older = before === undefined ? {} : await olderThan(em, study, before);
  const found = await em.find(
    AuditEntry,
    { study, ...older },
    { populate: ['by'], orderBy: { at: 'desc', id: 'desc' }, limit: limit + 1 },
  );
  const entries = found.slice(0, limit);
  return {
    entries: entries.map(auditEntryView),
    next: found.length > limit ? (entries.at(-1)?.id ?? null) : null,
  };
}

async function olderThan(
  em: EntityManager,
  study: string | null,
  id: number,
): Promise<{ $or: FilterQuery<AuditEntry>[] }> {
  const entry = await em.findOne(AuditEntry, { id, study });
  if (!entry) throw notFound('There is no such entry to read on from.');
  return { $or: [{ at: { $lt: entry.at } }, { at: entry.at, id: { $lt: id } }] };
}

const auditEntryView = ({ id, at, by, action, what, before, after }: AuditEntry): AuditEntryView => ({
  id,
  at: at.toISOString(),
  by: by?.name ?? null,
  action,
  what,
  before: before ?? null,
  after: after ?? null,
});
