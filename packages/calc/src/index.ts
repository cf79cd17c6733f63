export type {
  Appraisal,
  ArmLoad,
  Caution,
  CautionCode,
  ComparisonResult,
  CostLine,
  CostSheet,
  CurvePoint,
  Feasible,
  Group,
  Infeasible,
  Step,
  Timeline,
} from './appraisal.js';
export { appraise } from './appraise.js';
export { type LeverOffer, leversOf } from './comparison/levers.js';
export { type LimitKey, type Limits, limitKeys, limitsSchema, type Use } from './comparison/limits.js';
export {
  type PlanningValueKey,
  type PlanningValuePlace,
  type PlanningValueUnit,
  planningValueKeys,
  planningValueTraits,
} from './comparison/planning-values.js';
export {
  type QuestionOutcome,
  type QuestionPlan,
  questionOutcomeSchema,
  questionPlanSchema,
  targetOf,
} from './comparison/question-plan.js';
export { planningValueFor, planningValuesOf, requestOf, type Study } from './comparison/request-of.js';
export type { Standing } from './comparison/standing.js';
export {
  type Hold,
  holdSchema,
  type LedgerEntry,
  ledgerEntrySchema,
  type OptionPlan,
  optionPlanSchema,
  type Ruling,
  rulingSchema,
  type StudyCosts,
  studyCostsSchema,
} from './comparison/study-plan.js';
export { difference, type Verdict, type VerdictWords, verdict } from './comparison/verdict.js';
export { letterOf, type WeighedOption, type WeighInput, weigh } from './comparison/weigh.js';
export { money, type Noun } from './comparison/wording.js';
export { type CurveSpec, curve } from './curve.js';
export { type Design, type FamilyId, families, familyIds } from './designs/registry.js';
export { CalcError, type CalcErrorCode, calcErrorCodes } from './errors.js';
export { explain } from './explain.js';
export type { Best } from './optimise/best.js';
export { cheapest } from './optimise/cheapest.js';
export { optimalAllocation, optimalClusterSize } from './optimise/closed-forms.js';
export { mostPower } from './optimise/most-power.js';
export { paretoFront, type Weighed } from './optimise/pareto-front.js';
export { type SearchPlan, searchPlanSchema } from './optimise/search-plan.js';
export { type AppraisalRequest, appraisalRequestSchema, parseRequest } from './parse-request.js';
export {
  type Aim,
  type Attrition,
  type Comparisons,
  type CostPlan,
  costPlanSchema,
  type Dilution,
  type Hypothesis,
  type Outcome,
  type OutcomeKind,
  type TestPlan,
  type TimelinePlan,
  testSchema,
  timelinePlanSchema,
} from './request.js';
