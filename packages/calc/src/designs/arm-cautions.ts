import type { Caution } from '../appraisal.js';
import type { OutcomeModel } from '../outcomes/outcome-model.js';
import type { ContinuousOutcome, RequestFor, TimelinePlan, TimeToEventOutcome } from '../request.js';
import type { Layout } from './family.js';
import { smallCountsCautions } from './small-counts.js';

/** What arms of individuals should be warned of at this size. */
export function armCautions(
  { outcome, timeline }: RequestFor<unknown>,
  allocation: readonly number[],
  layout: Layout,
  outcomes: readonly OutcomeModel[],
): Caution[] {
  if (outcome.kind === 'continuous') return continuousCautions(outcome, allocation, layout);
  const counts = smallCountsCautions(layout, outcomes);
  return outcome.kind === 'time-to-event'
    ? [...counts, ...accrualCautions(outcome, timeline, layout)]
    : counts;
}

function continuousCautions(
  outcome: ContinuousOutcome,
  allocation: readonly number[],
  layout: Layout,
): Caution[] {
  const cautions: Caution[] = [];
  const participants = layout.groups.reduce((sum, group) => sum + group.participants, 0);
  const unequalArms = allocation.some((share) => share !== allocation[0]);
  if (outcome.sdActive !== undefined && outcome.sdActive !== outcome.sd && unequalArms) {
    cautions.push({
      code: 'unequal-sd',
      message:
        'Arms of unequal size with unequal SDs: plan the analysis for unequal variances too, since a pooled test would have the wrong type I error here.',
      source: 'Welch 1947',
    });
  }
  if (outcome.repeated && outcome.repeated.baselines > 0 && participants < 40) {
    cautions.push({
      code: 'small-ancova',
      message:
        'Adjusting for a baseline with fewer than 40 participants costs slightly more precision than is allowed for here; a factor of about 1 + 1/(N − 4) on the variance is left out.',
      source: 'Borm, Fransen & Lemmens 2007',
    });
  }
  return cautions;
}

/** Events are counted over the outcome's accrual; the timeline should take as long to recruit this size. */
function accrualCautions(
  { accrual }: TimeToEventOutcome,
  timeline: TimelinePlan | undefined,
  layout: Layout,
): Caution[] {
  if (timeline?.accrualPerMonth === undefined) return [];
  const months = layout.groups.reduce((sum, group) => sum + group.recruited, 0) / timeline.accrualPerMonth;
  if (Math.abs(accrual - months) <= 0.1 * months + 1e-9) return [];
  return [
    {
      code: 'accrual',
      message: `Events are expected over ${Number(accrual.toFixed(1))} months of accrual, but at the timeline’s rate this size takes ${months.toFixed(1)} months to recruit. Bring the two together.`,
    },
  ];
}
