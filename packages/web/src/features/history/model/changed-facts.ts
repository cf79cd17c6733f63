import type { AuditEntryView, AuditFacts } from '@steelyard/api/contract/audit';
import { familyIds, planningValueKeys, planningValueTraits } from '@steelyard/calc';
import { figure, percent } from '../../../shared/format/numbers';
import { familyUiOf } from '../../designs/families/registry';
import { factName, treatmentAt } from './fact-name';

/** A fact as it was and as it is; undefined where it was not there. */
export interface ChangedFact {
  path: string;
  name: string;
  before: string | undefined;
  after: string | undefined;
}

/** What an entry changed, fact by fact, in the order they were told; `treatments` are the study’s, by place. */
export function changedFacts(
  { what, before, after }: AuditEntryView,
  treatments: readonly string[],
): ChangedFact[] {
  const paths = new Set([...Object.keys(before ?? {}), ...Object.keys(after ?? {})]);
  const facts = [...paths].map((path) => ({
    path,
    name: factName(path, treatments),
    before: shown(before, path, what, treatments),
    after: shown(after, path, what, treatments),
  }));
  // What was missing and now has parts is told by its parts.
  return before && after ? facts.filter((fact) => fact.before !== fact.after) : facts;
}

function shown(
  facts: AuditFacts | null,
  path: string,
  what: string,
  treatments: readonly string[],
): string | undefined {
  const fact = facts?.[path];
  if (fact === undefined) return facts ? 'none' : undefined;
  if (fact === null || fact === '') return 'none';
  if (typeof fact === 'boolean') return fact ? 'yes' : 'no';
  if (/(^|\.)treatments\.\d+$/.test(path)) return treatmentAt(Number(fact), treatments);
  if (typeof fact === 'number') return isProportion(path, what) ? percent(fact, 10) : figure(fact, 12);
  if (/(^|\.)family$/.test(path)) return familyName(fact);
  return isCode(path) ? fact.replaceAll('-', ' ') : fact;
}

const proportionKeys = planningValueKeys.filter((key) => planningValueTraits[key].unit === 'proportion');

/** Whether a figure reads in per cent, as its field does. */
function isProportion(path: string, what: string): boolean {
  const steps = path.split('.');
  if (steps.some((step) => step === 'power' || step === 'alpha')) return true;
  return proportionKeys.some(
    (key) => steps.includes(key) || what.startsWith(`planning value “${planningValueTraits[key].label}”`),
  );
}

function familyName(fact: string): string {
  const family = familyIds.find((id) => id === fact);
  return family ? familyUiOf(family).name : fact;
}

const isCode = (path: string) => /(^|\.)(kind|strategy)$/.test(path);
