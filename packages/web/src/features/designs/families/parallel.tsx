import { counted } from '../../../shared/format/lists';
import { groupSizes, inEachArm, measured, parallelSchematic } from './arms';
import type { FamilyUi } from './family-ui';

/** Individuals in arms side by side, two or more. */
export const parallel: FamilyUi = {
  summary(plan, size, { participants, arms }) {
    const sizes = size
      ? `${groupSizes(size.groups.map((group) => group.participants))} ${participants.many}`
      : counted(arms.length, 'arm', 'arms');
    return `${sizes}${measured(plan)}`;
  },
  sizeNoun: (plan, { participants }) => inEachArm(participants.many, plan),
  schematic: parallelSchematic,
};
