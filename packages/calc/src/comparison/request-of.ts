import { type FamilyId, familyOf } from '../designs/registry.js';
import type { OutcomeKind, RequestFor } from '../request.js';
import type { PlanningValueKey, PlanningValuePlace } from './planning-values.js';
import type { QuestionPlan } from './question-plan.js';
import type { Hold, LedgerEntry, OptionPlan, StudyCosts } from './study-plan.js';

export interface Study {
  question: QuestionPlan;
  ledger: readonly LedgerEntry[];
  costs: StudyCosts | null;
  hold: Hold;
}

/** A planning value as one option takes it: from its override, else its family's ledger line, else the general one. */
export function planningValueFor(
  key: PlanningValueKey,
  { family, overrides }: Pick<OptionPlan, 'family' | 'overrides'>,
  ledger: readonly LedgerEntry[],
): number | undefined {
  const line = (of: FamilyId | null) =>
    ledger.find((entry) => entry.key === key && entry.family === of)?.value;
  return overrides[key]?.value ?? line(family) ?? line(null);
}

/** Where a family's planning values go in its requests, for one kind of outcome or for all. */
export function planningValuesOf(family: FamilyId, kind?: OutcomeKind): readonly PlanningValuePlace[] {
  const places = familyOf(family).planningValues;
  return kind ? places.filter(({ outcomes }) => outcomes?.includes(kind) ?? true) : places;
}

/**
 * The request that one option of a study comes to, sized for the power that the study asks for: structure and
 * cluster size from the option, the question from the study, whatever is uncertain from the ledger. Unchecked:
 * `appraise` names what is missing.
 */
export function requestOf(study: Study, option: OptionPlan): RequestFor<unknown> {
  const request: Record<string, Record<string, unknown>> = {
    outcome: outcomeOf(study, option),
    test: { ...study.question.test },
    design: {
      family: option.family,
      ...option.structure,
      ...(option.clusterSize === undefined ? {} : { clusterSize: option.clusterSize }),
    },
    aim: { find: 'size', power: study.hold.power },
    ...moneyOf(study, option),
  };
  const { kind } = study.question.outcome;
  for (const { path, key } of planningValuesOf(option.family, kind)) {
    const value = planningValueFor(key, option, study.ledger);
    if (value !== undefined) place(request, path, value);
  }
  settleLosses(request);
  if (study.question.outcome.kind === 'binary') {
    const { control, ...rest } = request.outcome as { control?: number };
    request.outcome = {
      ...rest,
      control,
      active: (control ?? Number.NaN) + study.question.outcome.difference,
    };
  }
  return request as unknown as RequestFor<unknown>;
}

/** Puts a value where its parent exists; `attrition` and `dilution` are made when first needed. */
function place(request: Record<string, Record<string, unknown>>, path: string, value: number): void {
  const keys = path.split('.');
  const leaf = keys.pop() as string;
  const [part, ...inner] = keys as [string, ...string[]];
  // Unequal SDs give way to repeated measurements, which pool one.
  if (leaf === 'sdActive' && request.outcome?.repeated) return;
  request[part] ??= {};
  let parent: Record<string, unknown> | undefined = request[part];
  for (const key of inner) parent = parent?.[key] as Record<string, unknown> | undefined;
  if (parent) parent[leaf] = value;
}

/** Loss is counted once: a dropout hazard takes the place of attrition. */
function settleLosses(request: Record<string, Record<string, unknown>>): void {
  if (request.outcome?.dropoutHazard === undefined || !request.attrition) return;
  const { participants: _, ...rest } = request.attrition;
  request.attrition = rest;
}

function outcomeOf({ question }: Study, { repeated }: OptionPlan): Record<string, unknown> {
  const { outcome } = question;
  switch (outcome.kind) {
    case 'continuous':
      return { ...outcome, ...(repeated ? { repeated: { ...repeated } } : {}) };
    case 'binary': {
      const { difference: _, ...rest } = outcome;
      return rest;
    }
    case 'time-to-event': {
      const { survivalAt, ...rest } = outcome;
      return { ...rest, controlSurvival: { at: survivalAt } };
    }
    default:
      return { ...outcome };
  }
}

/** The study's costs by treatment, narrowed to those this option compares. */
function moneyOf(
  { costs }: Study,
  { treatments }: OptionPlan,
): Pick<RequestFor<unknown>, 'costs' | 'timeline'> {
  if (!costs) return {};
  const ofTreatments = (figures: readonly number[]) =>
    treatments.map((treatment) => figures[treatment] ?? Number.NaN);
  const { perExposure, perClusterPeriod, ...rest } = costs.costs;
  return {
    costs: {
      ...rest,
      ...(perExposure ? { perExposure: ofTreatments(perExposure) } : {}),
      ...(perClusterPeriod ? { perClusterPeriod: ofTreatments(perClusterPeriod) } : {}),
    },
    timeline: costs.timeline,
  };
}
