import type { Dilution, RequestFor } from '../request.js';
import { binaryModel } from './binary.js';
import { continuousModel } from './continuous.js';
import { countModel } from './count.js';
import { ordinalModel } from './ordinal.js';
import type { OutcomeModel } from './outcome-model.js';
import { timeToEventModel } from './time-to-event.js';

/** Share of the effect that contamination and non-adherence leave. */
export function remainingShare(dilution: Dilution | undefined): number {
  return (1 - (dilution?.contamination ?? 0)) * (1 - (dilution?.nonAdherence ?? 0));
}

/** The outcome of a request, after dilution. Throws CalcError where an outcome's own conditions do not hold. */
export function outcomeModel({ outcome, dilution, test, attrition }: RequestFor<unknown>): OutcomeModel {
  const share = remainingShare(dilution);
  switch (outcome.kind) {
    case 'continuous':
      return continuousModel(outcome, share);
    case 'binary':
      return binaryModel(outcome, share, test.hypothesis);
    case 'time-to-event':
      return timeToEventModel(outcome, share, test.hypothesis, attrition);
    case 'count':
      return countModel(outcome, share);
    case 'ordinal':
      return ordinalModel(outcome, share);
  }
}
