import { CalcError } from '../errors.js';
import type { Outcome } from '../request.js';

const reasons = {
  sdActive: 'This design is planned with one SD for all arms; leave the active arm’s SD out.',
  repeated: 'This design takes one measurement of each participant; leave the repeated measurements out.',
  method: 'Here proportions are compared with their unpooled variances; leave the method out.',
};

/** Refuses the refinements of an outcome that belong to parallel arms alone. Throws CalcError `unsupported`. */
export function requirePlainOutcome(outcome: Outcome): void {
  for (const field of ['sdActive', 'repeated', 'method'] as const) {
    if (field === 'method' ? outcome.kind !== 'binary' : outcome.kind !== 'continuous') continue;
    if ((outcome as Partial<Record<typeof field, unknown>>)[field] !== undefined) {
      throw new CalcError('unsupported', `outcome.${field}`, reasons[field]);
    }
  }
}
