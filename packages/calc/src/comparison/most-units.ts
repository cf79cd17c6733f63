import type { Feasible } from '../appraisal.js';
import { appraise } from '../appraise.js';
import { bind } from '../bind.js';
import { smallestInteger } from '../numeric/integer-search.js';
import { type AppraisalRequest, parseRequest } from '../parse-request.js';
import { largestCount } from '../request.js';

/** The request appraised at a size of one's own choice. */
export function appraiseAt(request: AppraisalRequest, units: number, clusterSize?: number): Feasible {
  const design = clusterSize === undefined ? request.design : { ...request.design, clusterSize };
  const appraisal = appraise({ ...request, design, aim: { find: 'power', units } } as AppraisalRequest);
  if (!appraisal.feasible) throw new Error('A power at a given size is always an answer.');
  return appraisal;
}

/**
 * The most units that `fits` allows: 0 where not even the fewest do, Infinity where there is no end to them.
 * `fits` must not come true again for a larger size: money, months and clusters only grow.
 */
export function mostUnits(
  request: AppraisalRequest,
  fits: (appraisal: Feasible) => boolean,
  clusterSize?: number,
): number {
  const from = bind(parseRequest(request)).plan.minimumUnits;
  const tooMany = smallestInteger((units) => !fits(appraiseAt(request, units, clusterSize)), {
    from,
    to: largestCount,
    guess: 64,
  });
  if (tooMany === undefined) return Number.POSITIVE_INFINITY;
  return tooMany === from ? 0 : tooMany - 1;
}
