import type { Appraisal } from '../appraisal.js';
import { appraise } from '../appraise.js';
import type { FamilyId } from '../designs/registry.js';
import { CalcError } from '../errors.js';
import type { AppraisalRequest } from '../parse-request.js';
import { requestOf, type Study } from './request-of.js';
import type { OptionPlan } from './study-plan.js';

export interface WeighInput extends Study {
  options: readonly { id: string; name: string; plan: OptionPlan }[];
}

/** An option with its request and what the calculation answers, or why it could not. */
export interface WeighedOption {
  id: string;
  letter: string;
  name: string;
  family: FamilyId;
  request: AppraisalRequest;
  appraisal: Appraisal | null;
  error: { code: string; path: string; message: string } | null;
}

/** Computes every option of a study under its hold; one that errs is kept, with its error. */
export function weigh({ options, ...study }: WeighInput): WeighedOption[] {
  return options.map(({ id, name, plan }, position) => {
    const request = requestOf(study, plan) as AppraisalRequest;
    const option = { id, letter: letterOf(position), name, family: plan.family, request };
    try {
      return { ...option, appraisal: appraise(request), error: null };
    } catch (error) {
      if (!(error instanceof CalcError)) throw error;
      return { ...option, appraisal: null, error: error.toJSON() };
    }
  });
}

/** A, B, … Z, AA, AB… by position. */
export function letterOf(position: number): string {
  const last = String.fromCharCode(65 + (position % 26));
  return position < 26 ? last : letterOf(Math.floor(position / 26) - 1) + last;
}
