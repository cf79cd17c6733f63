import {
  appraise,
  CalcError,
  families,
  type Hold,
  type LedgerEntry,
  type OptionPlan,
  planningValuesOf,
  requestOf,
} from '@steelyard/calc';
import { invalid } from '../common/problem.js';
import { planningValueFigures } from '../contract/planning-values.js';
import type { Study } from '../studies/study.entity.js';

type Issue = { path: string; message: string };

/**
 * Refuses figures that no design can have, at their paths. A plan that is merely incomplete, or that cannot be
 * computed yet, is a draft and may be stored: the weighing says what it lacks.
 */
export function checkPlan(study: Study, ledger: LedgerEntry[], plan: OptionPlan, hold: Hold): void {
  const issues = [
    ...treatmentIssues(plan, study.treatments.length),
    ...overrideIssues(plan),
    ...structureIssues(study, ledger, plan, hold),
  ];
  if (issues.length > 0) throw invalid(issues);
}

function treatmentIssues({ treatments }: OptionPlan, known: number): Issue[] {
  const distinct = new Set(treatments).size === treatments.length;
  if (distinct && treatments.every((treatment) => treatment < known)) return [];
  const message = `Name each treatment once, by its place among the study’s ${known}.`;
  return [{ path: 'plan.treatments', message }];
}

function overrideIssues({ overrides }: OptionPlan): Issue[] {
  return Object.entries(overrides).flatMap(([key, override]) => {
    const { error } = planningValueFigures[key as keyof typeof overrides].safeParse(override?.value);
    return (error?.issues ?? []).map(({ message }) => ({ path: `plan.overrides.${key}.value`, message }));
  });
}

/** What the family's own schema says of the design, and its formula of the size as entered. */
function structureIssues(study: Study, ledger: LedgerEntry[], plan: OptionPlan, hold: Hold): Issue[] {
  const { design, ...request } = requestOf({ question: study.plan, ledger, costs: null, hold }, plan);
  const fromLedger = new Set(planningValuesOf(plan.family).map(({ path }) => path));
  const { error } = families[plan.family].schema.safeParse(design);
  const issues = (error?.issues ?? [])
    .flatMap(({ path, message, ...issue }) => {
      const fields = issue.code === 'unrecognized_keys' ? issue.keys.map((key) => [...path, key]) : [path];
      return fields.map((field) => ({ path: ['design', ...field].join('.'), message }));
    })
    .filter(({ path }) => !fromLedger.has(path) && isStated(path, design));
  if (issues.length > 0 || plan.units === undefined) return issues.map(ownPath);
  try {
    appraise({ ...request, design, aim: { find: 'power', units: plan.units } } as Parameters<
      typeof appraise
    >[0]);
    return [];
  } catch (error) {
    if (!(error instanceof CalcError)) throw error;
    return error.path === 'aim.units' ? [ownPath(error)] : [];
  }
}

function isStated(path: string, design: unknown): boolean {
  const [, ...keys] = path.split('.');
  return (
    keys.reduce<unknown>((part, key) => (part as Record<string, unknown> | undefined)?.[key], design) !==
    undefined
  );
}

/** Where the option keeps what the request calls by this path. */
function ownPath({ path, message }: Issue): Issue {
  if (path === 'aim.units') return { path: 'plan.units', message };
  if (path === 'design.clusterSize') return { path: 'plan.clusterSize', message };
  return { path: path.replace(/^design/, 'plan.structure'), message };
}
