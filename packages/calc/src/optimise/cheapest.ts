import { CalcError } from '../errors.js';
import { type AppraisalRequest, parseRequest } from '../parse-request.js';
import { type Best, bestAt, costWithin, fitsWithin } from './best.js';
import { parseSearchPlan, type SearchPlan } from './search-plan.js';
import { leastReaching, mostPowerful } from './searches.js';
import { powerAt, spaceOf } from './space.js';
import { startReaching } from './start.js';

/**
 * The cheapest design that reaches the power of the request's aim, over units and, where the search frees them,
 * cluster size and allocation: on the whole cost plan, in whole numbers, from the closed forms on.
 *
 * Source: branch and bound (Land & Doig 1960), started from Raudenbush 1997, Nam 1973 and Cochran 1977.
 * Accuracy: no whole-numbered design costs less, where `proven`; of those that cost the same, the one that recruits
 * fewest. Checked against enumeration (optimise.test.ts, and enumerated.json in base R).
 * Throws CalcError as `appraise` does, and for a search that does not go with the design or lacks costs.
 */
export function cheapest(request: AppraisalRequest, search: SearchPlan = {}): Best {
  const parsed = parseRequest(request);
  const { within = {}, ...freed } = parseSearchPlan(search);
  if (!('power' in parsed.aim)) {
    throw new CalcError('schema', 'aim.power', 'State the power to be reached.');
  }
  if (!parsed.costs) {
    throw new CalcError('schema', 'costs', 'State the costs: without them no design is the cheapest.');
  }
  const { power } = parsed.aim;
  const space = spaceOf(parsed, freed);
  const score = costWithin(within);
  const { found, proven } = leastReaching(space, power, score, startReaching(space, power, score));
  if (found) return bestAt(found.at, proven);
  const most = mostPowerful(space, fitsWithin(within)).found;
  if (!most) return { found: false, message: 'Not even the smallest size keeps to the limits.' };
  const limitingPower = powerAt(most.at);
  return {
    found: false,
    message: `No size of this design reaches the power within the limits: the most it reaches is ${(100 * limitingPower).toFixed(1)} %.`,
    limitingPower,
  };
}
