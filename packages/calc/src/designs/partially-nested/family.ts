import type { OutcomeModel } from '../../outcomes/outcome-model.js';
import type { RequestFor } from '../../request.js';
import { armLabels, groupSizes, minimumBaseUnits, recruitedFor, roundingReach } from '../allocation.js';
import { groupedCautions } from '../cluster-cautions.js';
import type { Family, Layout } from '../family.js';
import { requirePlainOutcome } from '../plain-outcome.js';
import { commonPlanningValues } from '../planning-values.js';
import { armVariances, satterthwaiteDf } from './formula.js';
import { type PartiallyNestedDesign, partiallyNestedSchema } from './schema.js';
import { steps } from './steps.js';

const arms = armLabels(2);
const treatmentGroups = { one: 'treatment group', many: 'treatment groups' };

/** Individuals are randomised; those in the active arm are then treated in groups. */
export const partiallyNested: Family<PartiallyNestedDesign> = {
  name: 'Partially nested',
  schema: partiallyNestedSchema,
  combines: { continuous: ['superiority', 'non-inferiority'] },
  planningValues: [...commonPlanningValues, { path: 'design.icc', key: 'icc' }],
  reallocation: (design) => ({
    base: 'active',
    perUnit: design.groupSize,
    fewestOpposite: 2,
    at: (units, opposite) => ({ ...design, allocation: [opposite, units * design.groupSize] }),
  }),
  plan(request) {
    requirePlainOutcome(request.outcome);
    const { design } = request;
    const { icc, groupSize } = design;
    const scale = scaleOf(design);
    const sizesOf = (units: number) => groupSizes(units, scale).reverse();
    return {
      unitName: 'treatment groups in the active arm',
      arms,
      hasDf: true,
      minimumUnits: minimumBaseUnits(scale),
      lookBelow: roundingReach(scale),
      groupUnits: sizesOf,
      analyse: ([controls = 0, groups = 0], [outcome]) => {
        const { variances, effect } = outcome as OutcomeModel;
        const shares = armVariances(controls, groups, groupSize, icc);
        const standardError = Math.sqrt(variances[0] * (shares[0] + shares[1]));
        return {
          df: satterthwaiteDf(shares, controls, groups),
          dfAtMost: controls + groups - 2,
          contrasts: [{ arm: 1, versus: 0, effect, standardError }],
        };
      },
      layout: (units) => nestedLayout(request, sizesOf(units)),
      cautions: ({ groups }) => {
        const count = groups[1]?.units as number;
        const { reference } = request.test;
        return groupedCautions(treatmentGroups, { fewest: count, total: count, icc, reference });
      },
      steps: (result, outcomes) => steps(request, result, outcomes[0] as OutcomeModel),
    };
  },
};

/** What a treatment group counts in the active arm, and how many control participants go with it. */
function scaleOf({ groupSize, allocation = [1, 1] }: PartiallyNestedDesign): [number, number] {
  const [control = 1, active = 1] = allocation;
  return [1, (groupSize * control) / active];
}

function nestedLayout(
  { design, attrition }: RequestFor<PartiallyNestedDesign>,
  sizes: readonly number[],
): Layout {
  const groups = sizes.map((units, arm) => {
    const participants = arm === 0 ? units : units * design.groupSize;
    const recruited = recruitedFor(participants, attrition?.participants);
    return { label: arms[arm] as string, units, participants, recruited };
  });
  return {
    groups,
    arms: groups.map(({ label, recruited }) => ({
      label,
      exposures: recruited,
      measurements: recruited,
      clusterPeriods: 0,
    })),
  };
}
