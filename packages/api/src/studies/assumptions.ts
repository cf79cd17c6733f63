import type { OptionPlan, PlanningValueKey, StudyCosts } from '@steelyard/calc';
import type { z } from 'zod';
import { neededValue, type studyStartSchema } from '../contract/study-start.js';

type Start = z.infer<typeof studyStartSchema>;

/** Where a newcomer’s study has a value that nobody has vouched for yet. */
export const assumed = 'assumed, replace';
const entered = 'Entered with the new study';

interface Line {
  key: PlanningValueKey;
  value: number;
  source: string;
}

/** Round figures that let the first option be weighed at once; the sources say what they are. */
export function assumedLedger(start: Start): Line[] {
  const line = (key: PlanningValueKey, value: number): Line => ({ key, value, source: assumed });
  const needed = neededValue[start.outcome.kind];
  const stated = needed && start[needed];
  return [
    ...(needed === undefined
      ? []
      : stated === undefined
        ? [line(needed, usual(start.outcome))]
        : [{ key: needed, value: stated, source: entered }]),
    ...(start.outcome.kind === 'continuous'
      ? [line('baselineCorrelation', 0.5), line('withinPersonCorrelation', 0.5)]
      : []),
    ...(start.clusters
      ? [
          start.outcome.kind === 'count' ? line('rateCv', 0.25) : line('icc', 0.05),
          line('clusterSizeCv', 0.3),
          line('clusterAutocorrelation', 0.8),
        ]
      : []),
    line('attrition', 0.1),
  ];
}

/** A value to begin with where none was entered: one at which the target is neither tiny nor impossible. */
function usual(outcome: Start['outcome']): number {
  switch (outcome.kind) {
    case 'continuous':
      return 2 * (Math.abs(outcome.difference) || 1);
    case 'binary':
      return 0.5 - outcome.difference / 2;
    case 'time-to-event':
      return 0.6;
    default:
      return 1;
  }
}

export function assumedCosts({ clusters, randomises }: Start): StudyCosts {
  const accrual = randomises === 'clusters' ? { accrualPerClusterPerMonth: 10 } : { accrualPerMonth: 10 };
  return {
    costs: {
      currency: 'EUR',
      fixed: 100_000,
      perMonth: 2_000,
      perRecruited: 300,
      ...(clusters && { perCluster: 2_000 }),
    },
    timeline: { startUp: 6, ...accrual, followUp: 6, period: 6, washout: 1, closeOut: 4 },
  };
}

export function firstOption({ randomises }: Start): { name: string; plan: OptionPlan } {
  const common = { treatments: [0, 1], overrides: {} };
  return randomises === 'clusters'
    ? {
        name: 'Cluster',
        plan: { family: 'cluster', structure: { allocation: [1, 1] }, clusterSize: 20, ...common },
      }
    : { name: 'Parallel', plan: { family: 'parallel', structure: {}, ...common } };
}
