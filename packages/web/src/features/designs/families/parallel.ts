import { counted } from '../../../shared/format/lists';
import {
  allocated,
  armShares,
  equalShares,
  groupSizes,
  inEachArm,
  measured,
  parallelSchematic,
  treatedByArm,
  twoArms,
} from './arms';
import type { FamilyUi } from './family-ui';

/** Individuals in two arms side by side. */
export const parallel: FamilyUi = {
  name: 'Parallel',
  describes: 'Two arms side by side; each participant receives one treatment.',
  suits: { randomises: 'individuals' },
  refusal: () => undefined,
  start: () => ({ treatments: [0, 1], structure: equalShares(2), overrides: {} }),
  arms: twoArms,
  whole: allocated,
  treated: treatedByArm,
  summary(plan, size, { participants, arms }) {
    const sizes = size
      ? `${groupSizes(size.groups.map((group) => group.participants))} ${participants.many}`
      : counted(arms.length, 'arm', 'arms');
    return `${sizes}${measured(plan)}`;
  },
  sizeNoun: (plan, { participants }) => inEachArm(participants.many, plan),
  schematic: parallelSchematic,
  structure: (_, { plan: { outcome } }, words) => [
    armShares(words),
    ...(outcome.kind === 'continuous' ? [{ part: 'measurements' } as const] : []),
  ],
};
