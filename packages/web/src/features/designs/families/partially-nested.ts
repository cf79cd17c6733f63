import { capitalised } from '../../../shared/format/lists';
import { count } from '../../../shared/format/numbers';
import { allocated, armShares, equalShares, treatedByArm, twoArms } from './arms';
import type { FamilyUi } from './family-ui';
import { numberAt } from './structure';

/** Individuals are randomised; those in the active arm are then treated in groups. */
export const partiallyNested: FamilyUi = {
  name: 'Partially nested',
  describes:
    'Individuals are randomised; the active treatment is given to them in groups, control to each alone.',
  suits: { randomises: 'individuals', groups: true },
  refusal: () => undefined,
  start: () => ({ treatments: [0, 1], structure: { ...equalShares(2), groupSize: 8 }, overrides: {} }),
  arms: twoArms,
  whole: allocated,
  treated: treatedByArm,
  summary({ structure }, size, { participants }) {
    const [control, active] = size?.groups ?? [];
    const each = count(numberAt(structure.groupSize, 1));
    return control && active
      ? `${count(control.participants)} + ${count(active.units)} groups × ${each} ${participants.many}`
      : `treatment groups of ${each} ${participants.many}`;
  },
  sizeNoun: () => 'Treatment groups in the active arm',
  schematic: ({ structure }, { arms, participants }) => ({
    periods: ['After'],
    sequences: arms.map((name, arm) =>
      arm === 0
        ? { name, cells: [arm] }
        : {
            name,
            note: `in groups of ${count(numberAt(structure.groupSize, 1))} ${participants.many}`,
            cells: [arm],
            nested: 'groups',
          },
    ),
  }),
  structure: (_, __, words) => [
    {
      part: 'whole',
      key: 'groupSize',
      label: `${capitalised(words.participants.many)} in each treatment group`,
      hint: 'The ICC of the ledger is that within these groups.',
    },
    {
      ...armShares(words),
      says: `How many ${words.participants.many} each arm has beside the other; equal shares are 1 and 1.`,
    },
  ],
};
