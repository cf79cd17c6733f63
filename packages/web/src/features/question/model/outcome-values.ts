import type { OutcomeKind, QuestionOutcome } from '@steelyard/calc';

type Figure = number | undefined;

/** Everything that a form asks of an outcome, of whichever kind. */
export interface OutcomeValues {
  kind: OutcomeKind;
  better: 'higher' | 'lower' | undefined;
  difference: Figure;
  hazardRatio: Figure;
  survivalAt: Figure;
  accrual: Figure;
  followUp: Figure;
  rateRatio: Figure;
  exposure: Figure;
  oddsRatio: Figure;
  controlProbabilities: Figure[];
  method: string | undefined;
}

const asked: Record<OutcomeKind, readonly (keyof OutcomeValues)[]> = {
  continuous: ['difference'],
  binary: ['difference'],
  'time-to-event': ['hazardRatio', 'survivalAt', 'accrual', 'followUp'],
  count: ['rateRatio', 'exposure'],
  ordinal: ['oddsRatio', 'controlProbabilities'],
};

const nothing: Omit<OutcomeValues, 'kind'> = {
  better: undefined,
  difference: undefined,
  hazardRatio: undefined,
  survivalAt: undefined,
  accrual: undefined,
  followUp: undefined,
  rateRatio: undefined,
  exposure: undefined,
  oddsRatio: undefined,
  controlProbabilities: [undefined, undefined, undefined],
  method: undefined,
};

export const noOutcome: OutcomeValues = { kind: 'continuous', ...nothing };

/** An outcome with every part that a form shows. */
export function outcomeValuesOf(outcome: QuestionOutcome): OutcomeValues {
  return { ...nothing, ...outcome };
}

/** What the values come to: only what bears on the kind of outcome. */
export function outcomeBodyOf(values: OutcomeValues): Record<string, unknown> {
  const { kind, better, method } = values;
  return {
    kind,
    ...Object.fromEntries(asked[kind].map((field) => [field, values[field]])),
    ...(better ? { better } : {}),
    ...(method && (kind === 'binary' || kind === 'time-to-event') ? { method } : {}),
  };
}

export const kindWords: Record<OutcomeKind, { name: string; says: string }> = {
  continuous: { name: 'Continuous', says: 'a measured amount, compared by its mean' },
  binary: { name: 'Binary', says: 'it happens or it does not, compared by proportions' },
  'time-to-event': { name: 'Time to an event', says: 'when it happens, compared by a hazard ratio' },
  count: { name: 'Count', says: 'how often it happens, compared by a rate ratio' },
  ordinal: { name: 'Ordinal', says: 'ordered categories, compared by an odds ratio' },
};

/** What may be better of each kind, in the outcome's own words. */
export const betterWords: Record<OutcomeKind, Record<'higher' | 'lower', string>> = {
  continuous: { higher: 'A higher value', lower: 'A lower value' },
  binary: { higher: 'A larger proportion', lower: 'A smaller proportion' },
  'time-to-event': { higher: 'An earlier event', lower: 'A later event or none' },
  count: { higher: 'A higher rate', lower: 'A lower rate' },
  ordinal: { higher: 'The later categories', lower: 'The earlier categories' },
};

/** Whether an effect is a ratio, so that 1 stands for no difference and margins lie above it. */
export const isRatio = (kind: OutcomeKind): boolean => kind !== 'continuous' && kind !== 'binary';
