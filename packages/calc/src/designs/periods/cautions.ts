import type { Caution } from '../../appraisal.js';
import type { OutcomeModel } from '../../outcomes/outcome-model.js';
import type { RequestFor } from '../../request.js';
import { groupedCautions } from '../cluster-cautions.js';
import type { Layout } from '../family.js';
import { smallCountsCautions } from '../small-counts.js';
import { measuredPeriods, type Schedule } from './schedule.js';
import type { PeriodsDesign } from './schema.js';

/** Clusters below which the degrees of freedom, clusters − 2, are a convention that simulation contradicts. */
const enoughClusters = 12;

/** What a design over cluster periods should be warned of at this size. */
export function periodCautions(
  { design, test, timeline }: RequestFor<PeriodsDesign>,
  layout: Layout,
  fewestInArm: (clusters: readonly number[]) => number,
): Caution[] {
  const clusters = layout.groups.map((group) => group.units);
  const total = clusters.reduce((sum, count) => sum + count, 0);
  const cautions = groupedCautions(
    { one: 'cluster', many: 'clusters' },
    { fewest: fewestInArm(clusters), total, icc: design.icc, reference: test.reference },
  );
  if (total < enoughClusters) {
    cautions.push({
      code: 'few-clusters-period',
      message: `With ${total} clusters an analysis on clusters − 2 degrees of freedom keeps its type I error only roughly. Simulated mixed models erred either way, for a nominal 5 %: 0.1 % in a wedge of 4 clusters and 3 % in one of 8, but 6 to 7 % in cluster crossovers of 4 to 6 and in a baseline design of 8. Simulate the analysis you plan.`,
      source: 'Simulation of mixed models on period means; after Li et al. 2021',
    });
  }
  if (Math.min(...clusters) === 1) {
    cautions.push({
      code: 'one-per-sequence',
      message:
        'A sequence has a single cluster: its differences from the others cannot be told from its sequence, and losing it loses the sequence.',
      source: 'Hussey & Hughes 2007; Li et al. 2021',
    });
  }
  if (design.clusterSizeCv === undefined) {
    cautions.push({
      code: 'equal-sizes',
      message:
        'All clusters are taken to be of one size in every period. Unequal sizes cost power: state their coefficient of variation.',
      source: 'Eldridge, Ashby & Kerry 2006',
    });
  }
  return [...cautions, ...accrualCautions(timeline, layout)];
}

/** The caution of proportions whose rarer outcome is expected too seldom in an arm, over all its periods. */
export function rareOutcomeCautions(
  schedule: Schedule,
  cohort: boolean,
  layout: Layout,
  outcomes: readonly OutcomeModel[],
): Caution[] {
  const arms = layout.arms.map(({ label }, arm) => ({
    label,
    units: 0,
    recruited: 0,
    participants: layout.groups.reduce((sum, { participants }, index) => {
      const row = schedule[index] ?? [];
      const inOneCell = participants / (cohort ? 1 : measuredPeriods(row));
      return sum + inOneCell * row.filter((cell) => cell === arm).length;
    }, 0),
  }));
  return smallCountsCautions({ ...layout, groups: arms }, outcomes);
}

/** Within its periods a cluster has one period to recruit its participants in. */
function accrualCautions(timeline: RequestFor<PeriodsDesign>['timeline'], layout: Layout): Caution[] {
  const { accrualPerClusterPerMonth: accrual, period } = timeline ?? {};
  const size = layout.recruitedPerCluster ?? 0;
  if (accrual === undefined || period === undefined || size <= accrual * period * (1 + 1e-9)) return [];
  return [
    {
      code: 'accrual',
      message: `At ${Number(accrual.toPrecision(4))} a month a cluster takes ${(size / accrual).toFixed(1)} months to recruit ${size} participants, longer than a period of ${Number(period.toPrecision(4))}. Lengthen the periods, or plan fewer participants in each.`,
    },
  ];
}
