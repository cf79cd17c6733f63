import { CalcError } from '../../errors.js';
import { refuseBeyondSeparate } from '../../tests/multiplicity/registry.js';
import { armsReallocated } from '../allocation.js';
import { armSteps } from '../arm-steps.js';
import type { Family } from '../family.js';
import { individualArmsPlan } from '../individual-arms.js';
import { adjustForBaseline, dropAnArm, largerControl, measureAgain, sharperAdjustment } from '../levers.js';
import { armPlanningValues } from '../planning-values.js';
import { type MultiArmDesign, multiArmSchema } from './schema.js';

/** Three or more arms of individuals, each active arm compared with the shared control. */
export const multiArm: Family<MultiArmDesign> = {
  name: 'Multi-arm',
  schema: multiArmSchema,
  combines: {
    continuous: ['superiority', 'non-inferiority'],
    binary: ['superiority', 'non-inferiority'],
    'time-to-event': ['superiority'],
    count: ['superiority'],
    ordinal: ['superiority'],
  },
  planningValues: armPlanningValues,
  reallocation: (design) => armsReallocated(design, design.allocation),
  levers: [adjustForBaseline, measureAgain, largerControl, sharperAdjustment, dropAnArm],
  plan(request) {
    const { outcome, design } = request;
    if (outcome.kind === 'continuous' && outcome.sdActive !== undefined) {
      throw new CalcError(
        'unsupported',
        'outcome.sdActive',
        'Designs with more than two arms pool one SD over all arms; leave the active arm’s SD out.',
      );
    }
    if (outcome.kind !== 'continuous') {
      refuseBeyondSeparate(design.comparisons, `Comparisons of a ${outcome.kind} outcome are`);
      if (design.comparisons.against === 'all-pairs') {
        throw new CalcError(
          'unsupported',
          'design.comparisons.against',
          'All pairs of arms are compared for a continuous outcome only: compare each arm with control.',
        );
      }
    }
    return {
      ...individualArmsPlan(request, design.allocation, design.comparisons),
      steps: ({ groupUnits, analysis }, outcomes) => armSteps(request, outcomes, groupUnits, analysis),
    };
  },
};
