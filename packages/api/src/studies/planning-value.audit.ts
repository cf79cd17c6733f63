import { families, planningValueTraits } from '@steelyard/calc';
import type { PlanningValue } from './planning-value.entity.js';

export function planningValueName({ key, scope }: PlanningValue): string {
  const { label } = planningValueTraits[key];
  const scoped = scope === 'every-family' ? '' : ` for designs of the family ${families[scope].name}`;
  return `planning value “${label}”${scoped}`;
}

export const planningValueFacts = ({ value, low, high, source }: PlanningValue) => ({
  value,
  low: low ?? null,
  high: high ?? null,
  source,
});
