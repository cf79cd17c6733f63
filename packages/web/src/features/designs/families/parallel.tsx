import { counted } from '../../../shared/format/lists';
import { AllocationFields } from '../components/allocation-fields';
import { MeasurementFields } from '../components/measurement-fields';
import { allocated, equalShares, groupSizes, inEachArm, measured, parallelSchematic } from './arms';
import type { FamilyUi, StructureFormProps } from './family-ui';

/** Individuals in arms side by side, two or more. */
export const parallel: FamilyUi = {
  name: 'Parallel',
  describes: 'Two arms side by side; each participant receives one treatment.',
  refusal: () => undefined,
  start: () => ({ family: 'parallel', treatments: [0, 1], structure: equalShares(2), overrides: {} }),
  whole: allocated,
  summary(plan, size, { participants, arms }) {
    const sizes = size
      ? `${groupSizes(size.groups.map((group) => group.participants))} ${participants.many}`
      : counted(arms.length, 'arm', 'arms');
    return `${sizes}${measured(plan)}`;
  },
  sizeNoun: (plan, { participants }) => inEachArm(participants.many, plan),
  schematic: parallelSchematic,
  Structure: ParallelStructure,
};

function ParallelStructure(props: StructureFormProps) {
  return (
    <>
      <AllocationFields {...props} />
      {props.study.plan.outcome.kind === 'continuous' && <MeasurementFields control={props.control} />}
    </>
  );
}
