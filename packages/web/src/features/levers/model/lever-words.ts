import type { LeverOffer } from '@steelyard/calc';
import { list } from '../../../shared/format/lists';
import { money } from '../../../shared/format/money';
import { count, figure, months } from '../../../shared/format/numbers';

interface Words {
  currency: string;
  clusters: { one: string; many: string };
}

/** What a lever takes or gives besides participants, as in “12 k€ less, 3 months longer, 1 more visit each”. */
export function priceWords(
  { cost = 0, months: longer = 0, clusters: more = 0, visits }: LeverOffer,
  words: Words,
): string {
  const moreOrLess = (amount: number) => (amount > 0 ? 'more' : 'less');
  return list([
    ...(Math.abs(cost) < 0.5 ? [] : [`${money(Math.abs(cost), words.currency)} ${moreOrLess(cost)}`]),
    ...(Math.abs(longer) < 0.05
      ? []
      : [`${months(Math.abs(longer))} months ${longer > 0 ? 'longer' : 'shorter'}`]),
    ...(more === 0
      ? []
      : [
          `${count(Math.abs(more))} ${more > 0 ? 'more' : 'fewer'} ${Math.abs(more) === 1 ? words.clusters.one : words.clusters.many}`,
        ]),
    ...(Math.abs(visits) < 1e-9
      ? []
      : [
          `${figure(Math.abs(visits), 3)} ${visits > 0 ? 'more' : 'fewer'} ${Math.abs(visits) === 1 ? 'measurement' : 'measurements'} each`,
        ]),
  ]);
}
