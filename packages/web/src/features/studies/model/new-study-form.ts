import type { Noun, Treatment } from '@steelyard/api/contract/studies';
import { neededValue } from '@steelyard/api/contract/study-start';
import { noOutcome, type OutcomeValues, outcomeBodyOf } from '../../question/model/outcome-values';

export interface NewStudyValues {
  name: string;
  organisation: string;
  question: string;
  outcome: OutcomeValues & { label: string; unit: string };
  sd: number | undefined;
  controlProportion: number | undefined;
  controlSurvival: number | undefined;
  controlRate: number | undefined;
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
  outcome: { ...noOutcome, label: '', unit: '' },
  sd: undefined,
  controlProportion: undefined,
  controlSurvival: undefined,
  controlRate: undefined,
  participants: { one: 'participant', many: 'participants' },
  clusters: { one: 'cluster', many: 'clusters' },
  treatments: [{ name: 'Control' }, { name: 'New treatment' }],
  randomises: 'individuals',
});

/** What the form comes to: only what bears on the kind of outcome and on who is randomised. */
export function newStudyBodyOf(values: NewStudyValues) {
  const { outcome, sd, controlProportion, controlSurvival, controlRate, clusters, randomises, ...rest } =
    values;
  const needed = neededValue[outcome.kind];
  const stated = needed && values[needed];
  return {
    ...rest,
    randomises,
    outcome: {
      ...outcomeBodyOf(outcome),
      label: outcome.label,
      unit: outcome.kind === 'continuous' ? outcome.unit : '',
    },
    clusters: randomises === 'clusters' ? clusters : null,
    ...(needed && stated !== undefined ? { [needed]: stated } : {}),
  };
}
