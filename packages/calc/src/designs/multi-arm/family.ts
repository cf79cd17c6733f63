import { CalcError } from '../../errors.js';
import type { Family } from '../family.js';
import { armSteps, individualArmsPlan } from '../individual-arms.js';
import { individualPlanningValues } from '../planning-values.js';
import { type MultiArmDesign, multiArmSchema } from './schema.js';

/** Three or more arms of individuals, each active arm compared with the shared control. */
export const multiArm: Family<MultiArmDesign> = {
  name: 'Multi-arm',
  schema: multiArmSchema,
  combines: { continuous: ['superiority'], binary: ['superiority'] },
  planningValues: [
    ...individualPlanningValues,
    { path: 'outcome.repeated.correlation', key: 'baselineCorrelation' },
  ],
  plan(request) {
    const { outcome, design } = request;
    if (outcome.kind === 'continuous' && outcome.sdActive !== undefined) {
      throw new CalcError(
        'unsupported',
        'outcome.sdActive',
        'Designs with more than two arms pool one SD over all arms; leave the active arm’s SD out.',
      );
    }
    return {
      ...individualArmsPlan(request, design.allocation),
      comparisons: design.comparisons,
      steps: ({ groupUnits, analysis }, outcomes) => armSteps(request, outcomes, groupUnits, analysis),
    };
  },
};
