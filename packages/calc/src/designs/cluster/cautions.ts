import type { Caution } from '../../appraisal.js';
import type { RequestFor } from '../../request.js';
import { groupedCautions } from '../cluster-cautions.js';
import type { Layout } from '../family.js';
import type { Clustering } from './clustering.js';
import type { ClusterDesign } from './schema.js';

/** What a cluster design should be warned of at this size. */
export function clusterCautions(
  { design, test }: RequestFor<ClusterDesign>,
  { icc, rateCv }: Clustering,
  layout: Layout,
): Caution[] {
  const clusters = layout.groups.map((group) => group.units);
  const cautions = groupedCautions(
    { one: 'cluster', many: 'clusters' },
    {
      fewest: Math.min(...clusters),
      total: clusters.reduce((sum, count) => sum + count, 0),
      icc: icc ?? Number.NaN,
      reference: test.reference,
    },
  );
  if (rateCv === 0) {
    cautions.push({
      code: 'icc-zero',
      message:
        'A CV of the rate of 0 takes all clusters to have one rate; plan with a small positive value unless you can show otherwise.',
      source: 'Hayes & Bennett 1999',
    });
  }
  if (design.clusterSizeCv === undefined) {
    cautions.push({
      code: 'equal-sizes',
      message: `All clusters are taken to be of one size. Unequal sizes cost power${rateCv === undefined ? ': state their coefficient of variation' : ', which is not allowed for with rates'}.`,
      source: 'Eldridge, Ashby & Kerry 2006',
    });
  }
  return cautions;
}
