import type { Feasible } from '../appraisal.js';
import type { Found } from '../numeric/branch-and-bound.js';
import { bestAt, fitsWithin } from '../optimise/best.js';
import { isEndless } from '../optimise/most-power.js';
import { leastReaching, mostPowerful } from '../optimise/searches.js';
import { loadAt, type Sized, type SizedLoad, type Space, spaceOf } from '../optimise/space.js';
import { type AppraisalRequest, parseRequest } from '../parse-request.js';
import { largestCount } from '../request.js';
import { breaks, type LimitKey, type Limits, loadOf, type Use, usesOf } from './limits.js';

/** How an option stands against the power asked for and the limits. */
export interface Standing {
  /** Reaches the power and breaks no limit. */
  fits: boolean;
  reachesPower: boolean;
  uses: Use[];
  /** The limits it breaks; the first is the binding one. */
  breaches: Use[];
  /** The most power the limits leave it, where it breaks one, over every cluster size. */
  within: {
    units: number;
    clusterSize?: number;
    clusters?: number;
    participants: number;
    power: number;
  } | null;
  /** The smallest change of limits that would admit it; none where another cluster size fits as it is. */
  relaxation: { changes: { limit: LimitKey; from: number; to: number }[]; clusterSize?: number } | null;
}

export function standingOf(
  limits: Limits,
  power: number,
  request: AppraisalRequest,
  appraisal: Feasible,
): Standing {
  const uses = usesOf(limits, loadOf(request, appraisal));
  const breaches = uses.filter(breaks);
  const reachesPower = appraisal.power >= power - 1e-12;
  const standing = { reachesPower, uses, breaches };
  if (reachesPower && breaches.length === 0)
    return { ...standing, fits: true, within: null, relaxation: null };
  const sizes = sizesOf(limits, parseRequest(request), appraisal.clusterSize);
  return {
    ...standing,
    fits: false,
    within: breaches.length === 0 ? null : mostPowerWithin(limits, power, sizes),
    relaxation: smallestRelaxation(limits, power, sizes),
  };
}

/** The sizes an option may take: any cluster size where that has a limit, else up to its own. */
interface Sizes {
  space: Space;
  own: number | undefined;
}

function sizesOf(limits: Limits, request: AppraisalRequest, own: number | undefined): Sizes {
  if (own === undefined) return { space: spaceOf(request, {}), own };
  const to = limits.participantsPerCluster === undefined ? own : largestCount;
  return { space: spaceOf(request, { clusterSize: { from: 1, to } }), own };
}

/** The most power among sizes that break no limit; where nothing limits the number, the fewest that reach it. */
function mostPowerWithin(limits: Limits, power: number, { space }: Sizes): Standing['within'] {
  const fits = fitsWithin(limits);
  const { found } = isEndless(space, fits)
    ? leastReaching(space, power, (load) => (fits(load) ? [load.clusters ?? 0, load.recruited] : undefined))
    : mostPowerful(space, fits);
  const best = found && bestAt(found.at, true);
  if (!best?.found) return null;
  const { units, clusterSize, clusters, participants, power: reached } = best.appraisal;
  return {
    units,
    participants,
    power: reached,
    ...(clusterSize && { clusterSize }),
    ...(clusters && { clusters }),
  };
}

type BreachScore = [limits: number, share: number, clusters: number, recruits: number];

/**
 * The limits that would have to move, and how far: of all sizes that reach the power those that break the fewest
 * limits, of these by the smallest share, of these the option's own cluster size, else the fewest clusters.
 */
function smallestRelaxation(limits: Limits, power: number, { space, own }: Sizes): Standing['relaxation'] {
  const breachesOf = (load: SizedLoad) => usesOf(limits, load).filter(breaks);
  const score = (load: SizedLoad): BreachScore => {
    const breaches = breachesOf(load);
    const share = Math.max(0, ...breaches.map(({ over, allowed }) => over / allowed));
    return [breaches.length, share, load.clusters ?? 0, load.recruited];
  };
  const { found } = leastReaching(space, power, score, ownSize(space, power, own, score));
  if (!found) return null;
  const { clusterSize } = found.at;
  return {
    changes: breachesOf(loadAt(found.at)).map(({ limit, allowed, taken }) => ({
      limit,
      from: allowed,
      to: taken,
    })),
    ...(clusterSize === undefined || clusterSize === own ? {} : { clusterSize }),
  };
}

/** The option at its own cluster size, which only a smaller relaxation replaces. */
function ownSize(
  space: Space,
  power: number,
  own: number | undefined,
  score: (load: SizedLoad) => BreachScore,
): Found<Sized> | undefined {
  const outer = own === undefined ? [] : [own];
  const { found } = leastReaching({ ...space, box: { low: outer, high: outer } }, power, score);
  if (!found) return undefined;
  const [count, share] = score(loadAt(found.at));
  return { at: found.at, score: [count, share, 0, 0] };
}
