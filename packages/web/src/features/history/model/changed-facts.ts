import type { AuditEntryView, AuditFacts } from '@steelyard/api/contract/audit';
import { planningValueKeys, planningValueTraits } from '@steelyard/calc';
import { figure, percent } from '../../../shared/format/numbers';
import { factName } from './fact-name';

/** A fact as it was and as it is; undefined where it was not there. */
export interface ChangedFact {
  path: string;
  name: string;
  before: string | undefined;
  after: string | undefined;
}

/** What an entry changed, fact by fact, in the order they were told. */
export function changedFacts({ what, before, after }: AuditEntryView): ChangedFact[] {
  const paths = new Set([...Object.keys(before ?? {}), ...Object.keys(after ?? {})]);
  return [...paths].map((path) => ({
    path,
    name: factName(path),
    before: shown(before, path, what),
    after: shown(after, path, what),
  }));
}

function shown(facts: AuditFacts | null, path: string, what: string): string | undefined {
  const fact = facts?.[path];
  if (fact === undefined) return undefined;
  if (fact === null || fact === '') return 'none';
  if (typeof fact === 'boolean') return fact ? 'yes' : 'no';
  if (/(^|\.)treatments\.\d+$/.test(path)) return `treatment ${Number(fact) + 1}`;
  if (typeof fact === 'number') return isProportion(path, what) ? percent(fact, 10) : figure(fact, 12);
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

const isCode = (path: string) => /(^|\.)(kind|strategy)$/.test(path);
