import type { Feasible } from '../appraisal.js';
import { appraise } from '../appraise.js';
import { breaks, type Limits, usesOf } from '../comparison/limits.js';
import type { AppraisalRequest } from '../parse-request.js';
import { requestAt, type Sized, type SizedLoad } from './space.js';

/** The best design of a search, as a request of its own; or why there is none. */
export type Best =
  | {
      found: true;
      request: AppraisalRequest;
      appraisal: Feasible;
      /**
       * That nothing is better has been shown. False where the power may fall as one group alone grows (pooled
       * proportions, events, ordered categories, comparisons tested together), and after very many steps.
       */
      proven: boolean;
    }
  | { found: false; message: string; limitingPower?: number };

export function bestAt(sized: Sized, proven: boolean): Best {
  const request = requestAt(sized);
  const appraisal = appraise(request);
  if (!appraisal.feasible) return { found: false, message: appraisal.infeasible.message };
  return { found: true, request, appraisal, proven };
}

export function fitsWithin(limits: Limits): (load: SizedLoad) => boolean {
  return (load) => !usesOf(limits, load).some(breaks);
}

/** Cost, then recruits, of what fits. */
export function costWithin(limits: Limits): (load: SizedLoad) => [number, number] | undefined {
  const fits = fitsWithin(limits);
  return (load) => (fits(load) ? [load.money ?? 0, load.recruited] : undefined);
}
