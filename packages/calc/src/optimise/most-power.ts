import { CalcError } from '../errors.js';
import { type AppraisalRequest, parseRequest } from '../parse-request.js';
import { largestCount } from '../request.js';
import { type Best, bestAt, costWithin, fitsWithin } from './best.js';
import { parseSearchPlan, type SearchPlan } from './search-plan.js';
import { leastReaching, mostPowerful } from './searches.js';
import { loadAt, powerAt, type SizedLoad, type Space, spaceOf } from './space.js';
import { startFitting } from './start.js';

/**
 * The design with the most power within the limits of the search, over units and, where the search frees them,
 * cluster size and allocation. The size that the request aims at plays no part.
 *
 * Source: branch and bound (Land & Doig 1960), started from Raudenbush 1997, Nam 1973 and Cochran 1977.
 * Accuracy: no whole-numbered design within the limits has more power, where `proven`; of those with the same power,
 * the cheapest. Checked against enumeration (optimise.test.ts, and enumerated.json in base R).
 * Throws CalcError as `appraise` does, for a search that does not go with the design, and where nothing limits the
 * size.
 */
export function mostPower(request: AppraisalRequest, search: SearchPlan): Best {
  const parsed = parseRequest(request);
  const { within = {}, ...freed } = parseSearchPlan(search);
  const space = spaceOf(parsed, freed);
  const fits = fitsWithin(within);
  if (isEndless(space, fits)) {
    throw new CalcError(
      'schema',
      'search.within',
      'Nothing here limits the number of units: state the most money, months or clusters there are.',
    );
  }
  const most = mostPowerful(space, fits, startFitting(space, fits));
  if (!most.found) return { found: false, message: 'Not even the smallest size keeps to the limits.' };
  const frugal = leastReaching(space, powerAt(most.found.at), costWithin(within), {
    at: most.found.at,
    score: costWithin(within)(loadAt(most.found.at)) as number[],
  });
  return bestAt((frugal.found ?? most.found).at, most.proven && frugal.proven);
}

/** Is there no end to the units that fit, in the smallest clusters? */
export function isEndless(space: Space, fits: (load: SizedLoad) => boolean): boolean {
  const { outer, inner } = space.near(largestCount, { clusterSize: 1 });
  return fits(loadAt(space.at(outer, inner)));
}
