import { newPlanningValueSchema } from '@steelyard/api/contract/planning-values';
import type { PlanningValueView } from '@steelyard/api/contract/studies';
import type { Line } from './lines';

export interface LineValues {
  value: number | undefined;
  low: number | undefined;
  high: number | undefined;
  source: string;
}

export const lineValuesOf = (stored: PlanningValueView | null): LineValues => ({
  value: stored?.value,
  low: stored?.low ?? undefined,
  high: stored?.high ?? undefined,
  source: stored?.source ?? '',
});

export const lineBodyOf =
  ({ key, family }: Line) =>
  ({ value, low, high, source }: LineValues, version: number | null) => ({
    key,
    family,
    value,
    low: low ?? null,
    high: high ?? null,
    source,
    version,
  });

/** The line as typed, where it can be computed with. */
export function typedLine(line: Line, values: LineValues) {
  const source = values.source.trim() || 'not said yet';
  return newPlanningValueSchema.safeParse(lineBodyOf(line)({ ...values, source }, null)).data;
}

export const lineFields: Record<string, string> = {
  value: 'Value',
  low: 'Lowest',
  high: 'Highest',
  source: 'Source',
};
