import type { Family } from '../family.js';
import { smallerClusters } from '../levers.js';
import { periodFamily, periodPlan } from '../periods/plan.js';
import { wedgeSchedule } from '../periods/schedule.js';
import { type SteppedWedgeDesign, steppedWedgeSchema } from './schema.js';

/** All clusters begin in control and cross over to active for good, one sequence after the other. */
export const steppedWedge: Family<SteppedWedgeDesign> = {
  ...periodFamily,
  name: 'Stepped-wedge',
  schema: steppedWedgeSchema,
  levers: [smallerClusters],
  plan(request) {
    const { steps, baselinePeriods = 1, transitionPeriods = 0 } = request.design;
    return periodPlan(request, wedgeSchedule(steps, baselinePeriods, transitionPeriods), 'design.steps');
  },
};
