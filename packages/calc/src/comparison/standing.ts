import type { Feasible } from '../appraisal.js';
import { appraise } from '../appraise.js';
import type { AppraisalRequest } from '../parse-request.js';
import { breaks, type LimitKey, type Limits, type Use, usesOf } from './limits.js';
import { appraiseAt, mostUnits } from './most-units.js';

/** How an option stands against the power asked for and the limits. */
export interface Standing {
  /** Reaches the power and breaks no limit. */
  fits: boolean;
  reachesPower: boolean;
  uses: Use[];
  /** The limits it breaks; the first is the binding one. */
  breaches: Use[];
  /** The most power the limits leave it, where it breaks one. */
  within: {
    units: number;
    clusterSize?: number;
    clusters?: number;
    participants: number;
    power: number;
  } | null;
  /** The smallest change of limits that would admit it; with the cluster size that makes do with it. */
  relaxation: { changes: { limit: LimitKey; from: number; to: number }[]; clusterSize?: number } | null;
}

export function standingOf(
  limits: Limits,
  power: number,
  request: AppraisalRequest,
  appraisal: Feasible,
): Standing {
  const uses = usesOf(limits, request, appraisal);
  const breaches = uses.filter(breaks);
  const reachesPower = appraisal.power >= power - 1e-12;
  const fits = reachesPower && breaches.length === 0;
  return {
    fits,
    reachesPower,
    uses,
    breaches,
    within: breaches.length === 0 ? null : mostPowerWithin(limits, request),
    relaxation: fits ? null : smallestRelaxation(limits, power, request),
  };
}

/** Largest analysed cluster size whose recruits still exist, where that is limited. */
function largestClusterSize(limits: Limits, { attrition }: AppraisalRequest): number | undefined {
  const { participantsPerCluster } = limits;
  if (participantsPerCluster === undefined) return undefined;
  return Math.max(1, Math.floor(participantsPerCluster * (1 - (attrition?.participants ?? 0)) + 1e-9));
}

function clusterSizesWithin(limits: Limits, request: AppraisalRequest): (number | undefined)[] {
  if (!('clusterSize' in request.design)) return [undefined];
  const own = request.design.clusterSize;
  const largest = largestClusterSize(limits, request);
  return largest === undefined ? [own] : [...new Set([Math.min(own, largest), largest])];
}

function mostPowerWithin(limits: Limits, request: AppraisalRequest): Standing['within'] {
  const fits = (appraisal: Feasible) => !usesOf(limits, request, appraisal).some(breaks);
  const candidates = clusterSizesWithin(limits, request).flatMap((clusterSize) => {
    const units = mostUnits(request, fits, clusterSize);
    return units === undefined ? [] : [appraiseAt(request, units, clusterSize)];
  });
  const best = candidates.reduce<Feasible | null>(
    (most, each) => (most && most.power >= each.power ? most : each),
    null,
  );
  if (!best) return null;
  const { units, clusterSize, clusters, participants, power } = best;
  return { units, participants, power, ...(clusterSize && { clusterSize }), ...(clusters && { clusters }) };
}

/**
 * The limits that would have to move, and how far: for each cluster size the limits allow, the design is sized for the
 * power, and the one that breaks the fewest limits, by the smallest share, is taken.
 */
function smallestRelaxation(
  limits: Limits,
  power: number,
  request: AppraisalRequest,
): Standing['relaxation'] {
  const ways = clusterSizesWithin(limits, request).flatMap((clusterSize) => {
    const sized: AppraisalRequest = { ...request, aim: { find: 'size', power } };
    const appraisal = appraise(withClusterSize(sized, clusterSize));
    if (!appraisal.feasible) return [];
    const breaches = usesOf(limits, request, appraisal).filter(breaks);
    return [
      { clusterSize, breaches, share: Math.max(0, ...breaches.map(({ over, allowed }) => over / allowed)) },
    ];
  });
  const [least] = ways.sort((a, b) => a.breaches.length - b.breaches.length || a.share - b.share);
  if (!least) return null;
  const own = 'clusterSize' in request.design ? request.design.clusterSize : undefined;
  return {
    changes: least.breaches.map(({ limit, allowed, taken }) => ({ limit, from: allowed, to: taken })),
    ...(least.clusterSize !== undefined && least.clusterSize !== own
      ? { clusterSize: least.clusterSize }
      : {}),
  };
}

function withClusterSize(request: AppraisalRequest, clusterSize: number | undefined): AppraisalRequest {
  return clusterSize === undefined
    ? request
    : ({ ...request, design: { ...request.design, clusterSize } } as AppraisalRequest);
}
