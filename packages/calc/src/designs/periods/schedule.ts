/** What a sequence does in one period: control, active, unmeasured while it crosses over, or unmeasured. */
export type Cell = 0 | 1 | 'transition' | null;

/** A row per sequence, a column per period. */
export type Schedule = readonly (readonly Cell[])[];

export const isMeasured = (cell: Cell): cell is 0 | 1 => cell === 0 || cell === 1;

export const measuredPeriods = (row: readonly Cell[]): number => row.filter(isMeasured).length;

/** Can treatment be told from period, that is, is there a period in which both are measured? */
export function isEstimable(schedule: Schedule): boolean {
  return (schedule[0] ?? []).some((_, period) => {
    const column = schedule.map((row) => row[period]);
    return column.includes(0) && column.includes(1);
  });
}

/** One sequence crosses over after the baseline periods, then one more each period. */
export function wedgeSchedule(steps: number, baselinePeriods: number, transitionPeriods: number): Schedule {
  const periods = baselinePeriods + steps + transitionPeriods;
  return Array.from({ length: steps }, (_, sequence) => {
    const crossing = baselinePeriods + sequence;
    return Array.from({ length: periods }, (_, period): Cell => {
      if (period < crossing) return 0;
      return period < crossing + transitionPeriods ? 'transition' : 1;
    });
  });
}
