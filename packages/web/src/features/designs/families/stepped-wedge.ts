import type { OptionPlan } from '@steelyard/calc';
import type { Cell } from './family-ui';
import { mostPeriods, periodFace } from './periods';
import { numberAt } from './structure';

/** Clusters cross from control to active one sequence after another, until all have. */
export const steppedWedge = periodFace({
  name: 'Stepped wedge',
  describes:
    'Whole groups change from control to the treatment in turn, until all have it; for a rollout that is coming anyway.',
  suits: { randomises: 'clusters', staged: true },
  structure: { steps: 4, baselinePeriods: 1, transitionPeriods: 0 },
  scheduleOf: wedge,
  parts: (_, { arms: [, active = ''] }) => [
    {
      part: 'whole',
      key: 'steps',
      label: 'Steps',
      hint: `As many sequences: at each step one changes to ${active}.`,
    },
    { part: 'whole', key: 'baselinePeriods', label: 'Periods before the first step' },
    {
      part: 'whole',
      key: 'transitionPeriods',
      label: 'Transition periods',
      hint: 'Periods right after its step in which a sequence is not measured.',
    },
    { part: 'picture' },
  ],
});

function wedge({ steps, baselinePeriods = 1, transitionPeriods = 0 }: OptionPlan['structure']): Cell[][] {
  const sequences = numberAt(steps, 1, mostPeriods);
  const before = numberAt(baselinePeriods, 0, mostPeriods);
  const crossing = numberAt(transitionPeriods, 0, mostPeriods);
  const periods = Math.min(mostPeriods, before + sequences + crossing);
  return Array.from({ length: sequences }, (_, sequence) =>
    Array.from({ length: periods }, (_, period): Cell => {
      const since = period - before - sequence;
      if (since < 0) return 0;
      return since < crossing ? 'crossing' : 1;
    }),
  );
}
