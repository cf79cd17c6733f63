import type { CostPlanView } from '@steelyard/api/contract/studies';
import { type CostPlan, type StudyCosts, studyCostsSchema, type TimelinePlan } from '@steelyard/calc';

type Figures = (number | undefined)[];

/** Every line, stated or not. */
export interface CostValues {
  costs: { currency: string; perExposure: Figures; perClusterPeriod: Figures } & {
    [key in Exclude<keyof CostPlan, 'currency' | 'perExposure' | 'perClusterPeriod'>]: number | undefined;
  };
  source: string;
  timeline: { [key in keyof Required<TimelinePlan>]: number | undefined };
}

/** A cost plan with one figure for each of so many treatments. */
export function costValuesOf({ costs, timeline, source }: CostPlanView, treatments: number): CostValues {
  const byTreatment = (figures: readonly number[] | undefined): Figures =>
    Array.from({ length: treatments }, (_, place) => figures?.[place]);
  return {
    costs: {
      currency: costs.currency,
      fixed: costs.fixed,
      perArm: costs.perArm,
      perCluster: costs.perCluster,
      perRecruited: costs.perRecruited,
      perMeasurement: costs.perMeasurement,
      perMonth: costs.perMonth,
      overhead: costs.overhead,
      perExposure: byTreatment(costs.perExposure),
      perClusterPeriod: byTreatment(costs.perClusterPeriod),
    },
    source: source ?? '',
    timeline: {
      startUp: timeline.startUp,
      accrualPerMonth: timeline.accrualPerMonth,
      accrualPerClusterPerMonth: timeline.accrualPerClusterPerMonth,
      followUp: timeline.followUp,
      period: timeline.period,
      washout: timeline.washout,
      closeOut: timeline.closeOut,
    },
  };
}

/** What the form comes to: a line left empty is not stated, nor is one by treatment that has no figure at all. */
export function costBodyOf({ costs, timeline, source }: CostValues, version: number | null) {
  const { perExposure, perClusterPeriod, ...rest } = costs;
  return {
    version,
    source: source.trim() || null,
    costs: {
      ...stated(rest),
      ...(perExposure.some(isStated) ? { perExposure: [...perExposure] } : {}),
      ...(perClusterPeriod.some(isStated) ? { perClusterPeriod: [...perClusterPeriod] } : {}),
    },
    timeline: stated(timeline),
  };
}

const isStated = (value: unknown) => value !== undefined && value !== null;

const stated = (lines: object) =>
  Object.fromEntries(Object.entries(lines).filter(([, value]) => isStated(value)));

/** The cost plan as typed, where options can be computed from it. */
export function typedCosts(values: CostValues): StudyCosts | undefined {
  const { costs, timeline } = costBodyOf(values, null);
  return studyCostsSchema.safeParse({ costs, timeline }).data;
}
