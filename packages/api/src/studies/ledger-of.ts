import type { EntityManager } from '@mikro-orm/sqlite';
import type { LedgerEntry } from '@steelyard/calc';
import { PlanningValue } from './planning-value.entity.js';
import { ledgerEntryOf } from './planning-value.view.js';
import type { Study } from './study.entity.js';

/** A study's planning values as the comparison takes them. */
export async function ledgerOf(em: EntityManager, study: Study): Promise<LedgerEntry[]> {
  return (await em.find(PlanningValue, { study })).map(ledgerEntryOf);
}
