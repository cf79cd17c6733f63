import { isMeasured, type Schedule } from './schedule.js';

/** Sequences that share periods, directly or through others, each with how treated it is over the first. */
type Component = { sequence: number; offset: number }[];

/**
 * The information on the treatment effect of clusters whose period means differ by little but period and
 * treatment, as at a cluster autocorrelation of 1 and no end of participants.
 *
 * *Formula*: none is a bound where treatment is more than a sequence's part plus a period's part, since
 * differences within clusters then show it. Else x = a + g with a of the sequence, g of the period, and only the
 * clusters' means tell: I = Σ p(a − ā)², p the precision of the means of all clusters of a sequence, ā weighted by
 * it over the sequences that share periods.
 * *Source*: the limit of generalised least squares as V = bJ + wI with w → 0.
 * *Accuracy*: relative w/b (information.test.ts).
 */
export function limitingInformation(schedule: Schedule, precisions: readonly number[]): number {
  let information = 0;
  for (const component of components(schedule)) {
    if (component === undefined) return Number.POSITIVE_INFINITY;
    const of = ({ sequence }: Component[number]) => precisions[sequence] as number;
    const precision = component.reduce((sum, each) => sum + of(each), 0);
    const mean = component.reduce((sum, each) => sum + of(each) * each.offset, 0) / precision;
    information += component.reduce((sum, each) => sum + of(each) * (each.offset - mean) ** 2, 0);
  }
  return information;
}

/** The components of a schedule; undefined for one that a sequence's and a period's part cannot make up. */
function components(schedule: Schedule): (Component | undefined)[] {
  const periods = (schedule[0] ?? []).map((_, period) => period);
  const offsets = new Map<number, number>();
  const found: (Component | undefined)[] = [];
  schedule.forEach((_, start) => {
    if (offsets.has(start)) return;
    offsets.set(start, 0);
    const parts = new Map<number, number>();
    const component: Component = [];
    const queue = [start];
    for (const sequence of queue) {
      const offset = offsets.get(sequence) as number;
      component.push({ sequence, offset });
      for (const period of periods) {
        const cell = schedule[sequence]?.[period] ?? null;
        if (!isMeasured(cell) || parts.has(period)) continue;
        parts.set(period, cell - offset);
        schedule.forEach((row, other) => {
          const next = row[period] ?? null;
          if (!isMeasured(next) || offsets.has(other)) return;
          offsets.set(other, next - (cell - offset));
          queue.push(other);
        });
      }
    }
    const agrees = queue.every((sequence) =>
      periods.every((period) => {
        const cell = schedule[sequence]?.[period] ?? null;
        return (
          !isMeasured(cell) || cell === (offsets.get(sequence) as number) + (parts.get(period) as number)
        );
      }),
    );
    found.push(agrees ? component : undefined);
  });
  return found;
}
