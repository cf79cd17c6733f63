import type { Feasible } from '@steelyard/calc';
import { list } from '../../../shared/format/lists';
import { count, months } from '../../../shared/format/numbers';
import type { Weighed, Weighing } from './weighing';

/** How an option differs from the one that all are told against. */
export interface Difference {
  /** “640 more girls, 63 k€ less, 3 months longer and 0.9 points less power than A”. */
  says: string;
  /** The same as signed figures, where both have one: “+3”. */
  power: string;
  cost: string | undefined;
  months: string | undefined;
}

export const sizeOf = ({ appraisal }: Weighed): Feasible | undefined =>
  appraisal?.feasible ? appraisal : undefined;

/** The option that the others are told against: one that is asked for and has a size. */
export function referenceOf({ options }: Weighing, id: string | undefined): Weighed | undefined {
  return options.find((option) => option.id === id && sizeOf(option));
}

/** The option that one is best told against: the one in force, else the first other that has a size. */
export function counterpartOf(option: Weighed, { options }: Weighing, inForce: Weighed | undefined) {
  if (inForce && inForce.id !== option.id) return inForce;
  return sizeOf(option) && options.find((other) => other.id !== option.id && sizeOf(other));
}

/** What an option takes more or less than another; undefined where either has no size. */
export function differenceFrom(
  option: Weighed,
  reference: Weighed,
  money: (amount: number) => string,
): Difference | undefined {
  const [size, other] = [sizeOf(option), sizeOf(reference)];
  if (!size || !other) return undefined;
  const recruited = size.recruited - other.recruited;
  const cost = size.costs && other.costs && size.costs.total - other.costs.total;
  const longer = size.timeline && other.timeline && tenths(size.timeline.months - other.timeline.months);
  const points = tenths(100 * (size.power - other.power));
  const { one, many } = option.words.participants;
  const parts = [
    told(recruited, (n) => `${count(n)}`, [`more ${one}`, `more ${many}`], [`fewer ${one}`, `fewer ${many}`]),
    cost === undefined || Math.abs(cost) < 0.5
      ? ''
      : `${money(Math.abs(cost))} ${cost > 0 ? 'more' : 'less'}`,
    told(longer ?? 0, months, ['month longer', 'months longer'], ['month shorter', 'months shorter']),
    told(
      points,
      months,
      ['point more power', 'points more power'],
      ['point less power', 'points less power'],
    ),
  ].filter((part) => part !== '');
  return {
    says: parts.length === 0 ? `the same as ${reference.letter}` : `${list(parts)} than ${reference.letter}`,
    power: signed(points, months),
    cost: cost === undefined ? undefined : signed(Math.round(cost), money),
    months: longer === undefined ? undefined : signed(longer, months),
  };
}

const tenths = (value: number): number => Math.round(10 * value) / 10;

/** “3 months longer”, “1 month shorter”; nothing where there is no difference. */
function told(
  difference: number,
  show: (amount: number) => string,
  more: readonly [one: string, many: string],
  less: readonly [one: string, many: string],
): string {
  if (difference === 0) return '';
  const amount = Math.abs(difference);
  const [one, many] = difference > 0 ? more : less;
  return `${show(amount)} ${amount === 1 ? one : many}`;
}

const signed = (value: number, show: (amount: number) => string): string =>
  value === 0 ? '±0' : `${value > 0 ? '+' : '−'}${show(Math.abs(value))}`;
