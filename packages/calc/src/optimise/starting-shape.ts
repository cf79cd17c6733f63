import { optimalAllocation, optimalClusterSize } from './closed-forms.js';
import { loadAt, type Shape, type Sized, type Space } from './space.js';

const units = 1000;
const [smaller, larger] = [100, 200];

/**
 * The proportions that the closed forms call for, costs and variances taken from the design itself: what a
 * further participant, cluster or unit of either group costs and how much variance it takes away.
 */
export function startingShape(space: Space): Shape {
  const clusterSize = startingClusterSize(space);
  return { clusterSize, ratio: startingRatio(space, clusterSize) };
}

/** SE² = within/m + between in clusters of m, so that two sizes tell the two apart. */
function startingClusterSize(space: Space): number {
  const [small, large, twice] = [
    costAndVariance(space, units, { clusterSize: smaller }),
    costAndVariance(space, units, { clusterSize: larger }),
    costAndVariance(space, 2 * units, { clusterSize: smaller }),
  ];
  const participant = (large.cost - small.cost) / (larger - smaller);
  const cluster = twice.cost - small.cost - participant * smaller;
  const within = (small.variance - large.variance) / (1 / smaller - 1 / larger);
  return optimalClusterSize({ cluster, participant }, { within, between: small.variance - within / smaller });
}

/** SE² = v/n + w/m in groups of n and m: twice as many of one take half of its part away. */
function startingRatio(space: Space, clusterSize: number): number {
  const [equal, moreBase, moreOpposite] = [
    costAndVariance(space, units, { clusterSize, ratio: 1 }),
    costAndVariance(space, 2 * units, { clusterSize, ratio: 1 / 2 }),
    costAndVariance(space, units, { clusterSize, ratio: 2 }),
  ];
  return optimalAllocation(
    [moreBase.cost - equal.cost, moreOpposite.cost - equal.cost],
    [equal.variance - moreBase.variance, equal.variance - moreOpposite.variance],
  );
}

function costAndVariance(space: Space, count: number, shape: Shape): { cost: number; variance: number } {
  const { outer, inner } = space.near(count, shape);
  const sized: Sized = space.at(outer, inner);
  const { bound } = sized;
  const [contrast] = bound.analyse(bound.plan.groupUnits(sized.units), sized.clusterSize).contrasts;
  return { cost: loadAt(sized).money ?? Number.NaN, variance: (contrast?.standardError ?? Number.NaN) ** 2 };
}
