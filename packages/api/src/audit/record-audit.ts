import { isDeepStrictEqual } from 'node:util';
import type { EntityManager } from '@mikro-orm/sqlite';
import type { AuditAction, AuditFacts } from '../contract/audit.js';
import type { Person } from '../people/person.entity.js';
import type { Study } from '../studies/study.entity.js';
import { AuditEntry } from './audit-entry.entity.js';

/** What was done to what; `before` and `after` are told as far as they differ. */
export interface Deed {
  action: AuditAction;
  what: string;
  before?: object;
  after?: object;
}

interface Circumstances {
  at: Date;
  by: Person | null;
  study: Study | null;
}

/** Writes an entry in the caller's unit of work; a change that changes nothing leaves none. */
export function recordAudit(em: EntityManager, { action, what, before, after }: Deed, when: Circumstances) {
  if (before && after && isDeepStrictEqual(factsOf(before), factsOf(after))) return;
  em.create(AuditEntry, {
    ...when,
    action,
    what,
    before: before ? differing(before, after) : null,
    after: after ? differing(after, before) : null,
  });
}

function differing(these: object, those: object = {}): AuditFacts {
  const others = factsOf(those);
  const facts = Object.entries(factsOf(these)).filter(([path, fact]) => others[path] !== fact);
  return Object.fromEntries(facts);
}

/** Every leaf of a JSON value by its path, as in `costs.perExposure.0`. */
function factsOf(value: object, prefix = ''): AuditFacts {
  const leaves = Object.entries(value).flatMap(([key, inner]): [string, AuditFacts[string]][] => {
    const path = `${prefix}${key}`;
    if (inner === undefined) return [];
    return inner !== null && typeof inner === 'object'
      ? Object.entries(factsOf(inner, `${path}.`))
      : [[path, inner]];
  });
  return Object.fromEntries(leaves);
}
