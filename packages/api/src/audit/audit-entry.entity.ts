import { defineEntity, type InferEntity, p } from '@mikro-orm/sqlite';
import type { AuditAction, AuditFacts } from '../contract/audit.js';
import { Person } from '../people/person.entity.js';
import { Study } from '../studies/study.entity.js';

/** One thing somebody did, written in the transaction that did it; without a study it concerns the site. */
export const AuditEntry = defineEntity({
  name: 'AuditEntry',
  properties: {
    id: p.integer().primary().autoincrement(),
    at: p.datetime().index(),
    by: () => p.manyToOne(Person).nullable(),
    study: () => p.manyToOne(Study).nullable(),
    action: p.string().$type<AuditAction>(),
    what: p.text(),
    before: p.json<AuditFacts>().nullable(),
    after: p.json<AuditFacts>().nullable(),
  },
});

export type AuditEntry = InferEntity<typeof AuditEntry>;
