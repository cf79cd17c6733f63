import { z } from 'zod';
import { CalcError } from '../errors.js';

const measure = (name: string) => z.number({ error: `${name} must be a number.` });

const weighedSchema = z.looseObject({
  participants: measure('The participants'),
  cost: measure('The cost'),
  months: measure('The months'),
  power: measure('The power')
    .min(0, 'The power must lie between 0 and 1.')
    .max(1, 'The power must lie between 0 and 1.'),
});

/** What options are weighed by: fewer participants, less money and time, more power. */
export type Weighed = Pick<z.infer<typeof weighedSchema>, 'participants' | 'cost' | 'months' | 'power'>;

/**
 * The items that no other is better than: in their order, with all that tie.
 *
 * Formula: kept where no other item is as good on participants, cost, months and 1 − power and better on one.
 * Source: Pareto 1906, Manuale di economia politica.
 * Throws CalcError `schema` where a measure is missing or not a number.
 */
export function paretoFront<T extends Weighed>(items: readonly T[]): T[] {
  const checked = z.array(weighedSchema).safeParse(items);
  if (!checked.success) {
    const issue = checked.error.issues[0];
    throw new CalcError(
      'schema',
      ['items', ...(issue?.path ?? [])].join('.'),
      issue?.message ?? 'Not a list of items.',
    );
  }
  return items.filter((item) => !items.some((other) => dominates(other, item)));
}

function dominates(one: Weighed, other: Weighed): boolean {
  const gains = [
    other.participants - one.participants,
    other.cost - one.cost,
    other.months - one.months,
    one.power - other.power,
  ];
  return gains.every((gain) => gain >= 0) && gains.some((gain) => gain > 0);
}
