import type { PlanningValueView } from '@steelyard/api/contract/studies';
import { families, type PlanningValueKey, planningValuesOf, planningValueTraits } from '@steelyard/calc';
import { figure, percent, withUnit } from '../../../shared/format/numbers';
import type { Weighed } from './weighing';

/** A planning value that an option's figures rest on, in words and units. */
export interface Assumption {
  key: PlanningValueKey;
  label: string;
  /** What the option is computed with. */
  used: string;
  /** The ledger's line: its value, range, source and author; undefined where only an override speaks. */
  ledger:
    | { value: string; range: string | undefined; source: string; setBy: string; setAt: string }
    | undefined;
  /** Why the option takes a value of its own. */
  reason: string | undefined;
}

/** “0.4 to 0.75 · Assumed by the team” */
export const sourceInWords = ({ range, source }: NonNullable<Assumption['ledger']>): string =>
  range === undefined ? source : `${range} · ${source}`;

/** The planning values that reach an option's request, in its family's order, and one whose lack keeps it from being computed. */
export function assumptionsOf(option: Weighed, ledger: PlanningValueView[], unit: string) {
  const { family, plan, request, error } = option;
  return planningValuesOf(family).flatMap(({ path, key }): Assumption[] => {
    const used = numberAt(request, path);
    if (used === undefined && error?.path !== path) return [];
    const show = (value: number) => shown(key, value, unit);
    const line =
      ledger.find((each) => each.key === key && each.family === family) ??
      ledger.find((each) => each.key === key && each.family === null);
    return [
      {
        key,
        label: labelOf(key, line),
        used: used === undefined ? 'not stated' : show(used),
        ledger: line && {
          value: show(line.value),
          range: rangeOf(line, show),
          source: line.source,
          setBy: line.setBy,
          setAt: line.setAt,
        },
        reason: plan.overrides[key]?.reason,
      },
    ];
  });
}

function labelOf(key: PlanningValueKey, line: PlanningValueView | undefined): string {
  const { label } = planningValueTraits[key];
  return line?.family ? `${label}, ${families[line.family].name.toLocaleLowerCase('en-GB')}` : label;
}

function rangeOf({ low, high }: PlanningValueView, show: (value: number) => string): string | undefined {
  if (low !== null && high !== null) return `${show(low)} to ${show(high)}`;
  if (low !== null) return `${show(low)} or more`;
  return high === null ? undefined : `${show(high)} or less`;
}

function shown(key: PlanningValueKey, value: number, outcomeUnit: string): string {
  const { unit } = planningValueTraits[key];
  if (unit === 'proportion') return percent(value, 2);
  return withUnit(figure(value), unit === 'outcome' ? outcomeUnit : '');
}

/** The number at a path such as `outcome.repeated.correlation`, where there is one. */
function numberAt(request: unknown, path: string): number | undefined {
  const value = path
    .split('.')
    .reduce<unknown>((part, key) => (part as Record<string, unknown> | undefined)?.[key], request);
  return typeof value === 'number' ? value : undefined;
}
