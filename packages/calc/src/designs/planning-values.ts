import type { PlanningValuePlace } from '../comparison/planning-values.js';

/** Planning values of any design in which participants are lost, dilute the effect, or vary. */
export const commonPlanningValues: readonly PlanningValuePlace[] = [
  { path: 'outcome.sd', key: 'sd', outcomes: ['continuous'] },
  { path: 'outcome.control', key: 'controlProportion', outcomes: ['binary'] },
  { path: 'outcome.controlSurvival.probability', key: 'controlSurvival', outcomes: ['time-to-event'] },
  { path: 'outcome.controlRate', key: 'controlRate', outcomes: ['count'] },
  { path: 'attrition.participants', key: 'attrition' },
  { path: 'dilution.contamination', key: 'contamination' },
  { path: 'dilution.nonAdherence', key: 'nonAdherence' },
];

/** Those of designs that randomise individuals to arms, for every outcome. */
export const armPlanningValues: readonly PlanningValuePlace[] = [
  ...commonPlanningValues,
  { path: 'outcome.repeated.correlation', key: 'baselineCorrelation', outcomes: ['continuous'] },
  { path: 'outcome.dropoutHazard', key: 'dropoutHazard', outcomes: ['time-to-event'] },
  { path: 'outcome.dispersion', key: 'dispersion', outcomes: ['count'] },
];
