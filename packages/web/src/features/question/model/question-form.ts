import { type Basis, type Estimand, newQuestionSchema } from '@steelyard/api/contract/question';
import type { Noun, StudyView, Treatment } from '@steelyard/api/contract/studies';
import type { OutcomeKind, QuestionPlan } from '@steelyard/calc';

export interface QuestionValues {
  name: string;
  organisation: string;
  question: string;
  outcomeLabel: string;
  outcomeUnit: string;
  plan: {
    outcome: {
      kind: OutcomeKind;
      difference: number | undefined;
      better: 'higher' | 'lower' | undefined;
      method: string | undefined;
    };
    test: QuestionPlan['test'] | { alpha: number | undefined };
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
      outcome: {
        kind: outcome.kind,
        difference: outcome.difference,
        better: outcome.better,
        method: outcome.kind === 'binary' ? outcome.method : undefined,
      },
      test,
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
  const { kind, difference, better, method } = values.plan.outcome;
  const { basis, estimand, clusters } = values;
  const saysEstimand =
    estimand.intercurrentEvents.length > 0 ||
    [estimand.population, estimand.treatment, estimand.variable, estimand.summary].some(stated);
  return {
    ...values,
    version,
    plan: {
      ...values.plan,
      outcome: {
        kind,
        difference,
        ...(better ? { better } : {}),
        ...(kind === 'binary' && method ? { method } : {}),
      },
    },
    basis: basis.kind || stated(basis.toWhom) || stated(basis.why) ? basis : null,
    estimand: saysEstimand ? estimand : null,
    clusters: stated(clusters.one) || stated(clusters.many) ? clusters : null,
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
  if (part === 'treatments') return `Treatment ${Number(place) + 1}`;
  if (part === 'intercurrentEvents') return `Intercurrent event ${Number(place) + 1}, ${leaf}`;
  return labels[path] ?? path;
}
