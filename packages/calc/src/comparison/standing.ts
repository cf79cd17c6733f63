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
  /** The most power the limits leave it, where it breaks one, over a spread of cluster sizes. */
  within: {
    units: number;
    clusterSize?: number;
    clusters?: number;
    participants: number;
    power: number;
  } | null;
  /** The smallest change of limits found that would admit it; none where another cluster size fits as it is. */
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
    within: breaches.length === 0 ? null : mostPowerWithin(limits, power, request),
    relaxation: fits ? null : smallestRelaxation(limits, power, request),
  };
}

/** Largest analysed cluster size whose recruits still exist, where that is limited. */
function largestClusterSize(limits: Limits, { attrition }: AppraisalRequest): number | undefined {
  const { participantsPerCluster } = limits;
  if (participantsPerCluster === undefined) return undefined;
  return Math.max(1, Math.floor(participantsPerCluster * (1 - (attrition?.participants ?? 0)) + 1e-9));
}

/** The option's own cluster size and others spread over what the limits allow, where there is one to choose. */
function clusterSizesWithin(limits: Limits, request: AppraisalRequest): (number | undefined)[] {
  if (!('clusterSize' in request.design)) return [undefined];
  const own = request.design.clusterSize;
  const largest = largestClusterSize(limits, request) ?? own;
  const spread = Array.from({ length: 8 }, (_, step) => Math.ceil(largest ** ((step + 1) / 8)));
  return [...new Set([Math.min(own, largest), ...spread])];
}

/** The most power among sizes that break no limit; where nothing limits the number, the size the power asks for. */
function mostPowerWithin(limits: Limits, power: number, request: AppraisalRequest): Standing['within'] {
  const fits = (appraisal: Feasible) => !usesOf(limits, request, appraisal).some(breaks);
  const candidates = clusterSizesWithin(limits, request).flatMap((clusterSize) => {
    const units = mostUnits(request, fits, clusterSize);
    if (units === 0) return [];
    if (Number.isFinite(units)) return [appraiseAt(request, units, clusterSize)];
    const sized = appraise(sizedFor(power, request, clusterSize));
    return sized.feasible ? [sized] : [];
  });
  const best = candidates.reduce<Feasible | null>(
    (most, each) => (most && most.power >= each.power ? most : each),
    null,
  );
  if (!best) return null;
  const { units, clusterSize, clusters, participants } = best;
  return {
    units,
    participants,
    power: best.power,
    ...(clusterSize && { clusterSize }),
    ...(clusters && { clusters }),
  };
}

/**
 * The limits that would have to move, and how far: at each of the cluster sizes above the design is sized for the
 * power, and the one that breaks the fewest limits, by the smallest share, is taken; its own size where it ties.
 */
function smallestRelaxation(
  limits: Limits,
  power: number,
  request: AppraisalRequest,
): Standing['relaxation'] {
  const ways = clusterSizesWithin(limits, request).flatMap((clusterSize) => {
    const appraisal = appraise(sizedFor(power, request, clusterSize));
    if (!appraisal.feasible) return [];
    const breaches = usesOf(limits, request, appraisal).filter(breaks);
    const share = Math.max(0, ...breaches.map(({ over, allowed }) => over / allowed));
    return [{ clusterSize, breaches, share }];
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

function sizedFor(
  power: number,
  request: AppraisalRequest,
  clusterSize: number | undefined,
): AppraisalRequest {
  const design = clusterSize === undefined ? request.design : { ...request.design, clusterSize };
  return { ...request, design, aim: { find: 'size', power } } as AppraisalRequest;
}
