import type { Noun, Treatment } from '@steelyard/api/contract/studies';

export interface NewStudyValues {
  name: string;
  organisation: string;
  question: string;
  outcome: {
    kind: 'continuous' | 'binary';
    label: string;
    unit: string;
    better: 'higher' | 'lower' | undefined;
    difference: number | undefined;
  };
  sd: number | undefined;
  controlProportion: number | undefined;
  participants: Noun;
  clusters: Noun;
  treatments: Treatment[];
  randomises: 'individuals' | 'clusters';
}

/** A form to begin from; whatever has a usual answer is filled in. */
export const newStudyValues = (): NewStudyValues => ({
  name: '',
  organisation: '',
  question: '',
  outcome: { kind: 'continuous', label: '', unit: '', better: undefined, difference: undefined },
  sd: undefined,
  controlProportion: undefined,
  participants: { one: 'participant', many: 'participants' },
  clusters: { one: 'cluster', many: 'clusters' },
  treatments: [{ name: 'Control' }, { name: 'New treatment' }],
  randomises: 'individuals',
});

/** What the form comes to: only what bears on the kind of outcome and on who is randomised. */
export function newStudyBodyOf(values: NewStudyValues) {
  const { outcome, sd, controlProportion, clusters, randomises, ...rest } = values;
  const continuous = outcome.kind === 'continuous';
  const { better, ...asked } = outcome;
  return {
    ...rest,
    randomises,
    outcome: { ...asked, unit: continuous ? outcome.unit : '', ...(better ? { better } : {}) },
    clusters: randomises === 'clusters' ? clusters : null,
    ...(continuous && sd !== undefined ? { sd } : {}),
    ...(!continuous && controlProportion !== undefined ? { controlProportion } : {}),
  };
}
