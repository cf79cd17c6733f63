import { randomUUID } from 'node:crypto';
import { p } from '@mikro-orm/sqlite';

/** What every aggregate has; `version` counts its changes, for optimistic locking. */
export const aggregateProperties = {
  id: p.uuid().primary(),
  version: p.integer().version(),
  createdAt: p.datetime(),
  changedAt: p.datetime(),
};

export function newAggregate(now: Date) {
  return { id: randomUUID(), createdAt: now, changedAt: now };
}
