import { z } from 'zod';
import { limitsSchema } from '../comparison/limits.js';
import { CalcError } from '../errors.js';
import { quantity, wholeNumber } from '../request.js';

const ordered = <T extends { from: number; to: number }>(range: z.ZodType<T>, name: string) =>
  range.refine(({ from, to }) => to >= from, {
    path: ['to'],
    message: `The largest ${name} must not be below the smallest.`,
  });

/** What a search may change besides the number of units, and what it must stay within. */
export const searchPlanSchema = z.strictObject({
  /** Participants analysed per cluster (and period). */
  clusterSize: ordered(
    z.strictObject({
      from: wholeNumber('The smallest cluster size', 1),
      to: wholeNumber('The largest cluster size', 1),
    }),
    'cluster size',
  ).optional(),
  /** Participants or clusters in the first active arm for each one in control; further arms keep their shares. */
  allocation: ordered(
    z.strictObject({
      from: quantity('The smallest ratio of active to control', 0.001, 1000),
      to: quantity('The largest ratio of active to control', 0.001, 1000),
    }),
    'ratio of active to control',
  ).optional(),
  within: limitsSchema.optional(),
});

export type SearchPlan = z.infer<typeof searchPlanSchema>;

/** Checks a search of unknown shape. Throws CalcError `schema` naming the first field at fault. */
export function parseSearchPlan(input: unknown): SearchPlan {
  const checked = searchPlanSchema.safeParse(input);
  if (checked.success) return checked.data;
  const issue = checked.error.issues[0];
  throw new CalcError(
    'schema',
    ['search', ...(issue?.path ?? [])].join('.'),
    issue?.message ?? 'Not a search.',
  );
}
