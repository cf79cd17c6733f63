import type { OptionPlan } from '@steelyard/calc';
import { capitalised, counted } from '../../../shared/format/lists';
import { groupSizes } from './arms';
import type { FamilyUi, StructureFormProps } from './family-ui';

/** Each participant receives the treatments one after another, in the order of a sequence. */
export const crossover: FamilyUi = {
  name: 'Crossover',
  describes:
    'Each participant receives both treatments, one after the other; for lasting, stable conditions.',
  refusal: ({ plan }) =>
    plan.outcome.kind === 'continuous' ? undefined : 'A crossover is computed for a continuous outcome only.',
  start: () => ({
    family: 'crossover',
    treatments: [0, 1],
    structure: { sequences: ['AB', 'BA'] },
    overrides: {},
  }),
  whole: (plan) => ({ ...plan, structure: { sequences: ['AB', 'BA'], ...plan.structure } }),
  summary(plan, size, { participants }) {
    const sequences = sequencesOf(plan);
    const periods = counted(sequences[0]?.length ?? 0, 'period', 'periods');
    return size
      ? `${groupSizes(size.groups.map((group) => group.participants))} ${participants.many}, ${periods}`
      : `${counted(sequences.length, 'sequence', 'sequences')}, ${periods}`;
  },
  sizeNoun: (_, { participants }) => `${capitalised(participants.many)} in each sequence`,
  schematic(plan) {
    const sequences = sequencesOf(plan);
    return {
      periods: [...(sequences[0] ?? '')].map((_, period) => `Period ${period + 1}`),
      sequences: sequences.map((sequence) => ({
        name: `Sequence ${sequence}`,
        cells: [...sequence].map((letter) => letter.charCodeAt(0) - 'A'.charCodeAt(0)),
      })),
    };
  },
  Structure: CrossoverStructure,
};

function CrossoverStructure({ plan, study }: StructureFormProps) {
  const [a, b] = plan.treatments.map((treatment) => study.treatments[treatment]?.name ?? '');
  return (
    <p>
      Two sequences, half of the {study.participants.many} in each: AB gives {a}, then {b}; BA the other way
      round. Each is compared with themselves.
    </p>
  );
}

function sequencesOf({ structure }: OptionPlan): string[] {
  return Array.isArray(structure.sequences) ? structure.sequences.map(String) : [];
}
