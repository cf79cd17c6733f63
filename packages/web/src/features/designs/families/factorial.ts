import { capitalised } from '../../../shared/format/lists';
import { count } from '../../../shared/format/numbers';
import { treated } from './arms';
import type { FamilyUi } from './family-ui';

const estimands = [
  {
    value: 'main-effect',
    short: 'main effects',
    label:
      'Main effects. Each treatment is compared with its absence, over all four arms, as if they do not interact.',
  },
  {
    value: 'interaction',
    short: 'interaction',
    label:
      'The interaction. Whether both together do more or less than their effects added; it takes four times as many.',
  },
];

/** Two treatments crossed, 2 × 2. */
export const factorial: FamilyUi = {
  name: 'Factorial',
  describes:
    'Two treatments are crossed: a quarter receives neither, one quarter each of them, and a quarter both.',
  suits: { randomises: 'individuals' },
  refusal: ({ treatments }) =>
    treatments.length < 4
      ? 'Name four treatments in the question: control, one, the other, and both together.'
      : undefined,
  start: () => ({ treatments: [0, 1, 2, 3], structure: { estimand: 'main-effect' }, overrides: {} }),
  arms: () => ({ fewest: 4, most: 4 }),
  roles: ['Neither', 'Treatment A', 'Treatment B', 'A and B together'],
  whole: (plan) => ({ ...plan, structure: { estimand: 'main-effect', ...plan.structure } }),
  treated,
  summary({ structure }, size, { participants }) {
    const estimand = estimands.find(({ value }) => value === structure.estimand)?.short;
    const sizes = size ? `4 × ${count(size.units)} ${participants.many}` : '2 × 2 arms';
    return estimand ? `${sizes}, ${estimand}` : sizes;
  },
  sizeNoun: (_, { participants }) => `${capitalised(participants.many)} in each of the four arms`,
  schematic: (_, { arms }) => ({
    periods: ['After'],
    sequences: arms.map((name, arm) => ({ name, cells: [arm] })),
    crossed: true,
  }),
  structure: () => [{ part: 'choice', key: 'estimand', label: 'What the size is for', choices: estimands }],
};
