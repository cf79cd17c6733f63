import { CalcError } from '../../errors.js';
import type { RequestFor } from '../../request.js';
import { requirePlainOutcome } from '../plain-outcome.js';
import { designEffect, rateVariancePerCluster, variancePerCluster } from './formula.js';
import type { ClusterDesign } from './schema.js';

/** How members of a cluster resemble each other: by an ICC, or by the CV of the clusters' rates. */
export interface Clustering {
  icc?: number;
  rateCv?: number;
  /** Variance of one cluster's mean or log rate, from that of one participant. */
  perCluster(variance: number, clusterSize: number): number;
  designEffect?(clusterSize: number): number;
}

/** The clustering of a request. Throws CalcError where it lacks one, or states what does not go with its outcome. */
export function clusteringOf({ outcome, design }: RequestFor<ClusterDesign>): Clustering {
  const { icc, rateCv, clusterSizeCv } = design;
  requirePlainOutcome(outcome);
  if (outcome.kind === 'count') {
    refuseForRates(outcome.dispersion, design);
    if (rateCv === undefined) {
      throw new CalcError(
        'schema',
        'design.rateCv',
        'State the between-cluster CV of the rate: rates in clusters cannot be planned without one.',
      );
    }
    return { rateCv, perCluster: (variance, size) => rateVariancePerCluster(variance, rateCv, size) };
  }
  if (rateCv !== undefined) {
    throw new CalcError(
      'unsupported',
      'design.rateCv',
      'The CV of the rate belongs to counts; state the ICC for this outcome.',
    );
  }
  if (icc === undefined) {
    throw new CalcError(
      'schema',
      'design.icc',
      'State the ICC: a cluster design cannot be planned without one.',
    );
  }
  return {
    icc,
    perCluster: (variance, size) => variance * variancePerCluster(icc, size, clusterSizeCv),
    designEffect: (size) => designEffect(icc, size, clusterSizeCv),
  };
}

function refuseForRates(dispersion: number | undefined, { icc, clusterSizeCv }: ClusterDesign): void {
  const refuse = (path: string, message: string) => new CalcError('unsupported', path, message);
  if (icc !== undefined) {
    throw refuse('design.icc', 'Rates in clusters take the CV of the rate between clusters, not an ICC.');
  }
  if (clusterSizeCv) {
    throw refuse(
      'design.clusterSizeCv',
      'Rates in clusters are computed for clusters of one size; leave the CV of cluster size out.',
    );
  }
  if (dispersion !== undefined) {
    throw refuse(
      'outcome.dispersion',
      'Rates in clusters vary by the CV of the rate between clusters; leave the dispersion out.',
    );
  }
}
