import { capitalised } from '../../../shared/format/lists';

/** “Costs: per exposure 2” for `costs.perExposure.1`. */
export function factName(path: string): string {
  const reasoned = /^whyNot\.(?<option>.*)$/.exec(path)?.groups?.option;
  if (reasoned) return `Why not “${reasoned}”`;
  const arm = /(^|\.)treatments\.(?<index>\d+)$/.exec(path)?.groups?.index;
  if (arm) return `Arm ${Number(arm) + 1}`;
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
  ['icc', 'ICC'],
  ['sd', 'SD'],
  ['sdActive', 'SD, active arm'],
  ['clusterSizeCv', 'CV of cluster size'],
]);

function stepName(step: string): string {
  if (/^\d+$/.test(step)) return String(Number(step) + 1);
  return terms.get(step) ?? step.replaceAll(/[A-Z]/g, (letter) => ` ${letter.toLowerCase()}`);
}
