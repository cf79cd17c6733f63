import type { PlanningValueKey } from '../comparison/planning-values.js';

/** Planning values of any design in which individuals are lost, dilute the effect, or have an SD. */
export const individualPlanningValues: readonly { path: string; key: PlanningValueKey }[] = [
  { path: 'outcome.sd', key: 'sd' },
  { path: 'outcome.control', key: 'controlProportion' },
  { path: 'attrition.participants', key: 'attrition' },
  { path: 'dilution.contamination', key: 'contamination' },
  { path: 'dilution.nonAdherence', key: 'nonAdherence' },
];
