import { capitalised } from '../../../shared/format/lists';

/** A treatment by its name; by its number where the study no longer has it. */
export const treatmentAt = (place: number, treatments: readonly string[]): string =>
  treatments[place] ?? `treatment ${place + 1}`;

/** “Costs: per exposure, Gel” for `costs.perExposure.1`, in a study whose second treatment is “Gel”. */
export function factName(path: string, treatments: readonly string[]): string {
  const reasoned = /^whyNot\.(?<option>.*)$/.exec(path)?.groups?.option;
  if (reasoned) return `Why not “${reasoned}”`;
  const arm = /(^|\.)treatments\.(?<index>\d+)$/.exec(path)?.groups?.index;
  if (arm) return `Arm ${Number(arm) + 1}`;
  const priced = /^costs\.(?<key>\w+)\.(?<place>\d+)$/.exec(path)?.groups;
  if (priced) {
    return `Costs: ${stepName(priced.key as string)}, ${treatmentAt(Number(priced.place), treatments)}`;
  }
  const [first = '', ...rest] = path.split('.').filter((step) => step !== 'plan');
  const group = rest.length > 0 ? groups.get(first) : undefined;
  return capitalised(
    group ? `${group}: ${rest.map(stepName).join(' ')}` : [first, ...rest].map(stepName).join(' '),
  );
}

/** Parts of what is stored that say where a fact belongs. */
const groups = new Map([
  ['costs', 'costs'],
  ['timeline', 'accrual and months'],
  ['estimand', 'estimand'],
  ['basis', 'basis of the target difference'],
  ['test', 'test'],
  ['outcome', 'outcome'],
  ['hold', 'hold'],
  ['limits', 'limit'],
  ['structure', 'structure'],
  ['overrides', 'override'],
]);

/** Steps whose trade term is not their name spelt out. */
const terms = new Map([
  ['email', 'e-mail'],
  ['followUp', 'follow-up'],
  ['followUps', 'follow-ups'],
  ['startUp', 'start-up'],
  ['closeOut', 'close-out'],
  ['icc', 'ICC'],
  ['sd', 'SD'],
  ['sdActive', 'SD, active arm'],
  ['clusterSizeCv', 'CV of cluster size'],
]);

function stepName(step: string): string {
  if (/^\d+$/.test(step)) return String(Number(step) + 1);
  return terms.get(step) ?? step.replaceAll(/[A-Z]/g, (letter) => ` ${letter.toLowerCase()}`);
}
