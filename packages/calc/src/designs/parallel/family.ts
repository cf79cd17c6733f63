import type { OutcomeModel } from '../../outcomes/outcome-model.js';
import type { Hypothesis } from '../../request.js';
import { armsReallocated } from '../allocation.js';
import { armSteps } from '../arm-steps.js';
import type { DesignPlan, Family, WorkedSize } from '../family.js';
import { individualArmsPlan } from '../individual-arms.js';
import { adjustForBaseline, crossOver, measureAgain } from '../levers.js';
import { armPlanningValues } from '../planning-values.js';
import { eventsRequired, requiredEventsStep } from './events.js';
import { type ParallelDesign, parallelSchema } from './schema.js';

const every: readonly Hypothesis[] = ['superiority', 'non-inferiority', 'equivalence'];

/** Two arms of individuals, each participant in one arm. */
export const parallel: Family<ParallelDesign> = {
  name: 'Parallel',
  schema: parallelSchema,
  combines: { continuous: every, binary: every, 'time-to-event': every, count: every, ordinal: every },
  planningValues: [
    ...armPlanningValues,
    { path: 'outcome.sdActive', key: 'sdActive', outcomes: ['continuous'] },
  ],
  reallocation: (design) => armsReallocated(design, design.allocation),
  levers: [adjustForBaseline, measureAgain, crossOver],
  plan(request) {
    const { outcome, design } = request;
    const allocation = design.allocation ?? [1, 1];
    const plan: DesignPlan = Object.assign(individualArmsPlan(request, allocation), {
      equalPair:
        allocation[0] === allocation[1] && (outcome.kind === 'continuous' || outcome.kind === 'binary'),
      steps: ({ groupUnits, analysis }: WorkedSize, outcomes: readonly OutcomeModel[]) =>
        armSteps(request, outcomes, groupUnits, analysis),
    });
    if (outcome.kind !== 'time-to-event') return plan;
    return {
      ...plan,
      events({ groupUnits: [n0 = 0, n1 = 0] }, [model]) {
        const [p0 = 0, p1 = 0] = model?.eventProbabilities ?? [];
        const required = model && eventsRequired(request, outcome, allocation, model);
        return { expected: n0 * p0 + n1 * p1, ...(required === undefined ? {} : { required }) };
      },
      steps: (result, outcomes) => [
        ...plan.steps(result, outcomes),
        ...outcomes.flatMap((model) => requiredEventsStep(request, outcome, allocation, model)),
      ],
    };
  },
};
