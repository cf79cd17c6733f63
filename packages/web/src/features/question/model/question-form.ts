import { type Basis, type Estimand, newQuestionSchema } from '@steelyard/api/contract/question';
import type { Noun, StudyView, Treatment } from '@steelyard/api/contract/studies';
import type { Hypothesis, QuestionPlan } from '@steelyard/calc';
import { type OutcomeValues, outcomeBodyOf, outcomeValuesOf } from './outcome-values';

export interface TestValues {
  hypothesis: Hypothesis;
  alpha: number | undefined;
  sides: 1 | 2;
  margin: number | undefined;
  reference: 't' | 'normal' | undefined;
}

export interface QuestionValues {
  name: string;
  organisation: string;
  question: string;
  outcomeLabel: string;
  outcomeUnit: string;
  plan: {
    outcome: OutcomeValues;
    test: TestValues;
  };
  basis: { kind: Basis['kind'] | undefined; toWhom: string; why: string };
  estimand: Estimand;
  participants: Noun;
  clusters: Noun;
  treatments: Treatment[];
}

/** A study’s question with every part that its form shows. */
export function questionValuesOf(study: StudyView): QuestionValues {
  const { outcome, test } = study.plan;
  return {
    name: study.name,
    organisation: study.organisation,
    question: study.question,
    outcomeLabel: study.outcomeLabel,
    outcomeUnit: study.outcomeUnit,
    plan: {
      outcome: outcomeValuesOf(outcome),
      test: { ...test, margin: test.margin, reference: test.reference },
    },
    basis: study.basis ?? { kind: undefined, toWhom: '', why: '' },
    estimand: study.estimand ?? {
      population: '',
      treatment: '',
      variable: '',
      intercurrentEvents: [],
      summary: '',
    },
    participants: study.participants,
    clusters: study.clusters ?? { one: '', many: '' },
    treatments: study.treatments,
  };
}

/** What the form comes to: what was left empty is not stated. */
export function questionBodyOf(values: QuestionValues, version: number | null) {
  const { basis, estimand, clusters } = values;
  const saysEstimand =
    estimand.intercurrentEvents.length > 0 ||
    [estimand.population, estimand.treatment, estimand.variable, estimand.summary].some(stated);
  return {
    ...values,
    version,
    plan: { outcome: outcomeBodyOf(values.plan.outcome), test: testBodyOf(values.plan.test) },
    basis: basis.kind || stated(basis.toWhom) || stated(basis.why) ? basis : null,
    estimand: saysEstimand ? estimand : null,
    clusters: stated(clusters.one) || stated(clusters.many) ? clusters : null,
  };
}

/** A superiority test has no margin, the others one side. */
function testBodyOf({ hypothesis, alpha, sides, margin, reference }: TestValues) {
  const superiority = hypothesis === 'superiority';
  return {
    hypothesis,
    alpha,
    sides: superiority ? sides : 1,
    ...(superiority ? {} : { margin }),
    ...(reference ? { reference } : {}),
  };
}

const stated = (text: string | undefined) => (text ?? '').trim() !== '';

/** The question as typed, where options can be computed from it. */
export const typedPlan = (values: QuestionValues): QuestionPlan | undefined =>
  newQuestionSchema.shape.plan.safeParse(questionBodyOf(values, 1).plan).data;

export const basisWords: Record<Basis['kind'], string> = {
  important: 'It is important',
  realistic: 'It is realistic',
  both: 'It is both important and realistic',
};

export const hypothesisWords: Record<Hypothesis, string> = {
  superiority: 'Superiority: there is a difference',
  'non-inferiority': 'Non-inferiority: not worse by the margin',
  equivalence: 'Equivalence: within the margin either way',
};

/** The type I error that is usual: one side of non-inferiority takes half of what two-sided superiority does. */
export const usualAlpha: Record<Hypothesis, number> = {
  superiority: 0.05,
  'non-inferiority': 0.025,
  equivalence: 0.05,
};

export const strategyWords: Record<Estimand['intercurrentEvents'][number]['strategy'], string> = {
  'treatment-policy': 'Treatment policy: the outcome counts whatever happens',
  hypothetical: 'Hypothetical: as if it had not happened',
  composite: 'Composite: it is part of the outcome',
  'while-on-treatment': 'While on treatment: the outcome up to it',
  'principal-stratum': 'Principal stratum: those in whom it would not happen',
};

const labels: Record<string, string> = {
  name: 'Name of the study',
  organisation: 'Organisation',
  question: 'Question',
  outcomeLabel: 'Outcome',
  outcomeUnit: 'Unit',
  'plan.outcome.kind': 'Kind of outcome',
  'plan.outcome.difference': 'Target difference',
  'plan.outcome.better': 'Better is',
  'plan.outcome.method': 'Method of comparison',
  'plan.outcome.hazardRatio': 'Target hazard ratio',
  'plan.outcome.survivalAt': 'Month at which survival is stated',
  'plan.outcome.accrual': 'Accrual',
  'plan.outcome.followUp': 'Follow-up after accrual',
  'plan.outcome.rateRatio': 'Target rate ratio',
  'plan.outcome.exposure': 'Exposure of each participant',
  'plan.outcome.oddsRatio': 'Target odds ratio',
  'plan.outcome.controlProbabilities': 'Shares of the categories',
  'plan.test.hypothesis': 'Hypothesis',
  'plan.test.margin': 'Margin',
  'plan.test.alpha': 'Type I error',
  'plan.test.sides': 'Sides',
  'basis.kind': 'Basis',
  'basis.toWhom': 'To whom',
  'basis.why': 'Why',
  'estimand.population': 'Population',
  'estimand.treatment': 'Treatment',
  'estimand.variable': 'Variable',
  'estimand.summary': 'Population-level summary',
  'participants.one': 'One participant',
  'participants.many': 'Several participants',
  'clusters.one': 'One cluster',
  'clusters.many': 'Several clusters',
};

/** What a part of the form is called. */
export function questionLabel(path: string): string {
  const [part, place, leaf] = path.replace('estimand.', '').split('.');
  if (path.startsWith('plan.outcome.controlProbabilities.')) {
    return `Category ${Number(path.split('.').at(-1)) + 1}`;
  }
  if (part === 'treatments') return `Treatment ${Number(place) + 1}`;
  if (part === 'intercurrentEvents') return `Intercurrent event ${Number(place) + 1}, ${leaf}`;
  return labels[path] ?? path;
}
