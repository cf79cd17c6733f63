import type { Timeline } from '../appraisal.js';
import type { DesignPlan } from '../designs/family.js';
import type { TimelinePlan } from '../request.js';

export interface Recruitment {
  recruited: number;
  recruitedPerCluster?: number | undefined;
}

/**
 * Months from start-up to close-out; a phase whose figure is missing is left out and named in `missing`.
 *
 * Formula: recruitment = recruited / accrual per month, or the recruited size of a cluster over its own
 * accrual; then one follow-up, or periods with a washout between each two. Clusters that recruit within their
 * periods have neither. Units: months, real.
 */
export function scheduleOf(
  plan: TimelinePlan,
  { recruited, recruitedPerCluster }: Recruitment,
  periods: DesignPlan['periods'],
): { timeline: Timeline; missing: string[] } {
  const phases: Timeline['phases'] = [];
  const missing: string[] = [];
  let elapsed = 0;
  const add = (label: string, months: number | undefined, figure: string) => {
    if (months === undefined) {
      if (!missing.includes(figure)) missing.push(figure);
      return;
    }
    phases.push({ label, from: elapsed, to: elapsed + months });
    elapsed += months;
  };

  add('Start-up', plan.startUp, 'start-up');
  const within = periods?.recruitment === 'within';
  if (!within) add('Recruitment', recruitmentMonths(plan, recruited, recruitedPerCluster), 'accrual');
  if (periods === undefined) {
    add('Follow-up', plan.followUp, 'follow-up');
  } else {
    for (let period = 1; period <= periods.count; period += 1) {
      if (!within && period > 1 && plan.washout !== undefined)
        add(`Washout ${period - 1}`, plan.washout, 'washout');
      add(`Period ${period}`, plan.period, 'period');
    }
  }
  add('Close-out', plan.closeOut, 'close-out');
  return { timeline: { months: elapsed, phases }, missing };
}

function recruitmentMonths(
  plan: TimelinePlan,
  recruited: number,
  recruitedPerCluster: number | undefined,
): number | undefined {
  if (plan.accrualPerMonth !== undefined) return recruited / plan.accrualPerMonth;
  if (plan.accrualPerClusterPerMonth === undefined || recruitedPerCluster === undefined) return undefined;
  return recruitedPerCluster / plan.accrualPerClusterPerMonth;
}
