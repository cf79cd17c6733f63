import type { OutcomeKind } from '../request.js';

/** The uncertain inputs a study keeps in its ledger; each family names which of them it draws on. */
export const planningValueKeys = [
  'sd',
  'sdActive',
  'controlProportion',
  'controlSurvival',
  'dropoutHazard',
  'controlRate',
  'dispersion',
  'rateCv',
  'baselineCorrelation',
  'withinPersonCorrelation',
  'icc',
  'iccSubcluster',
  'clusterAutocorrelation',
  'individualAutocorrelation',
  'clusterSizeCv',
  'attrition',
  'clusterAttrition',
  'contamination',
  'nonAdherence',
] as const;

export type PlanningValueKey = (typeof planningValueKeys)[number];

/** `outcome` is the outcome's own unit, `proportion` runs from 0 to 1, `number` has no unit. */
export type PlanningValueUnit = 'outcome' | 'proportion' | 'number';

export const planningValueTraits: Record<PlanningValueKey, { label: string; unit: PlanningValueUnit }> = {
  sd: { label: 'Standard deviation', unit: 'outcome' },
  sdActive: { label: 'Standard deviation, active arm', unit: 'outcome' },
  controlProportion: { label: 'Control proportion', unit: 'proportion' },
  controlSurvival: { label: 'Control survival', unit: 'proportion' },
  dropoutHazard: { label: 'Dropout hazard per month', unit: 'number' },
  controlRate: { label: 'Control rate', unit: 'number' },
  dispersion: { label: 'Dispersion of the counts', unit: 'number' },
  rateCv: { label: 'Between-cluster CV of the rate', unit: 'number' },
  baselineCorrelation: { label: 'Correlation with baseline', unit: 'number' },
  withinPersonCorrelation: { label: 'Within-person correlation', unit: 'number' },
  icc: { label: 'ICC', unit: 'number' },
  iccSubcluster: { label: 'ICC within a subcluster', unit: 'number' },
  clusterAutocorrelation: { label: 'Cluster autocorrelation', unit: 'number' },
  individualAutocorrelation: { label: 'Individual autocorrelation', unit: 'number' },
  clusterSizeCv: { label: 'CV of cluster size', unit: 'number' },
  attrition: { label: 'Attrition', unit: 'proportion' },
  clusterAttrition: { label: 'Loss of whole clusters', unit: 'proportion' },
  contamination: { label: 'Contamination', unit: 'proportion' },
  nonAdherence: { label: 'Non-adherence', unit: 'proportion' },
};

/** Where a family's requests take a planning value, and for which outcomes where not for all. */
export interface PlanningValuePlace {
  path: string;
  key: PlanningValueKey;
  outcomes?: readonly OutcomeKind[];
}
