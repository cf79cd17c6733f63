import type { Appraisal } from '../appraisal.js';
import { appraise } from '../appraise.js';
import type { FamilyId } from '../designs/registry.js';
import { CalcError } from '../errors.js';
import type { AppraisalRequest } from '../parse-request.js';
import type { Limits } from './limits.js';
import { mostUnits } from './most-units.js';
import { requestOf, type Study } from './request-of.js';
import { type Standing, standingOf } from './standing.js';
import type { Hold, OptionPlan, Ruling } from './study-plan.js';

export interface WeighInput extends Study {
  limits?: Limits;
  options: readonly { id: string; name: string; plan: OptionPlan; ruling?: Ruling | null }[];
}

/** An option with its request, what the calculation answers or why it could not, and how it stands. */
export interface WeighedOption {
  id: string;
  letter: string;
  name: string;
  family: FamilyId;
  request: AppraisalRequest;
  appraisal: Appraisal | null;
  error: { code: string; path: string; message: string } | null;
  standing: Standing | null;
  ruling: Ruling | null;
}

/** Computes every option of a study under its hold; one that errs is kept, with its error. */
export function weigh({ options, limits = {}, ...study }: WeighInput): WeighedOption[] {
  return options.map(({ id, name, plan, ruling = null }, position) => {
    const option = { id, letter: letterOf(position), name, family: plan.family, ruling };
    const request = requestOf(study, plan) as AppraisalRequest;
    try {
      const held = { ...request, aim: aimUnder(study.hold, request, plan) };
      const appraisal = appraise(held);
      const standing = appraisal.feasible ? standingOf(limits, study.hold.power, held, appraisal) : null;
      return { ...option, request: held, appraisal, error: null, standing };
    } catch (error) {
      if (!(error instanceof CalcError)) throw error;
      return { ...option, request, appraisal: null, error: error.toJSON(), standing: null };
    }
  });
}

/**
 * What the hold makes of an option: the fewest units that reach the power, the most that the budget buys, or the
 * sizes as entered. Throws CalcError where no size has been entered, and where the budget buys none.
 */
function aimUnder(hold: Hold, request: AppraisalRequest, { units }: OptionPlan): AppraisalRequest['aim'] {
  if (hold.kind === 'power') return { find: 'size', power: hold.power };
  if (hold.kind === 'sizes') {
    if (units === undefined)
      throw new CalcError('schema', 'aim.units', 'Enter a size: the hold keeps the sizes as entered.');
    return { find: 'power', units };
  }
  if (!request.costs)
    throw new CalcError('schema', 'costs', 'State the costs: a budget buys nothing without them.');
  const bought = mostUnits(request, ({ costs }) => (costs?.total ?? 0) <= hold.budget);
  if (bought === 0) {
    throw new CalcError('schema', 'hold.budget', 'The budget does not buy even the smallest size.');
  }
  if (bought === Number.POSITIVE_INFINITY) {
    throw new CalcError(
      'schema',
      'costs',
      'Nothing here costs more for a larger size: a budget sets no end to it.',
    );
  }
  return { find: 'power', units: bought };
}

/** A, B, … Z, AA, AB… by position. */
export function letterOf(position: number): string {
  const last = String.fromCharCode(65 + (position % 26));
  return position < 26 ? last : letterOf(Math.floor(position / 26) - 1) + last;
}
