import type { OptionPlan } from '@steelyard/calc';
import { periodFace } from './periods';

/** Control, active, or not measured. */
export type ScheduleCell = 0 | 1 | null;

/** Clusters follow whatever sequences one draws up. */
export const clusterSchedule = periodFace({
  name: 'Cluster schedule',
  describes:
    'Whole groups over periods in sequences of your own: what each receives when, and when it is measured.',
  suits: { randomises: 'clusters' },
  structure: {
    schedule: [
      [0, 0, 1],
      [0, 1, 1],
    ],
  },
  scheduleOf: (structure) =>
    scheduleOf(structure).map((row) => row.map((cell) => (cell === null ? 'unmeasured' : cell))),
  parts: () => [{ part: 'schedule' }],
});

export function scheduleOf({ schedule }: OptionPlan['structure']): ScheduleCell[][] {
  const rows = Array.isArray(schedule) ? schedule.filter(Array.isArray) : [];
  return rows.map((row) => row.map((cell) => (cell === 0 || cell === 1 ? cell : null)));
}
