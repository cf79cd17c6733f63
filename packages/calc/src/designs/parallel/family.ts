import type { Family } from '../family.js';
import { armSteps, individualArmsPlan } from '../individual-arms.js';
import { individualPlanningValues } from '../planning-values.js';
import { type ParallelDesign, parallelSchema } from './schema.js';

/** Two arms of individuals, each participant in one arm. */
export const parallel: Family<ParallelDesign> = {
  name: 'Parallel',
  schema: parallelSchema,
  combines: { continuous: ['superiority'], binary: ['superiority'] },
  planningValues: [
    ...individualPlanningValues,
    { path: 'outcome.sdActive', key: 'sdActive' },
    { path: 'outcome.repeated.correlation', key: 'baselineCorrelation' },
  ],
  plan(request) {
    const allocation = request.design.allocation ?? [1, 1];
    return {
      ...individualArmsPlan(request, allocation),
      equalPair: allocation[0] === allocation[1],
      steps: ({ groupUnits, analysis }, outcomes) => armSteps(request, outcomes, groupUnits, analysis),
    };
  },
};
