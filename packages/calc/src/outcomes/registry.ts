import { CalcError } from '../errors.js';
import type { Dilution, Outcome } from '../request.js';
import { binaryModel } from './binary.js';
import { continuousModel } from './continuous.js';
import type { OutcomeModel } from './outcome-model.js';

/** Share of the effect that contamination and non-adherence leave. */
export function remainingShare(dilution: Dilution | undefined): number {
  return (1 - (dilution?.contamination ?? 0)) * (1 - (dilution?.nonAdherence ?? 0));
}

/** The outcome of a request, after dilution. Throws CalcError `unsupported` for kinds that are not computed. */
export function outcomeModel(outcome: Outcome, dilution?: Dilution): OutcomeModel {
  const share = remainingShare(dilution);
  if (outcome.kind === 'continuous') return continuousModel(outcome, share);
  if (outcome.kind === 'binary') return binaryModel(outcome, share);
  throw new CalcError('unsupported', 'outcome.kind', `A ${outcome.kind} outcome is not computed yet.`);
}
