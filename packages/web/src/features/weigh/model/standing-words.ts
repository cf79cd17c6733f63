import type { LimitKey } from '@steelyard/calc';
import { list } from '../../../shared/format/lists';
import { money } from '../../../shared/format/money';
import { count, months, percent, power } from '../../../shared/format/numbers';
import type { Weighed, Weighing } from './weighing';

interface Told {
  tone: 'fits' | 'over';
  /** “12 catchments over” */
  what: string;
  /** What is to spare, the most power the limits leave, the smallest relaxation. */
  more: string[];
}

type Words = Pick<Weighing, 'hold' | 'currency' | 'limits'>;

/** How an option stands against the limits and the power asked for, in words; undefined where it has no size. */
export function standingInWords(option: Weighed, words: Words): Told | undefined {
  const { standing, appraisal } = option;
  if (!standing || !appraisal?.feasible) return undefined;
  const amounts = amountsFor(option, words);
  if (standing.fits) {
    const spare = standing.uses
      .filter(({ over }) => over < 0)
      .map(({ limit, over }) => amounts[limit](-over))
      .filter((amount) => amount !== '');
    const limited = standing.uses.length > 0;
    return {
      tone: 'fits',
      what: limited ? 'Fits' : `Reaches ${percent(words.hold.power)}`,
      more: limited ? [spare.length > 0 ? `${list(spare)} to spare` : 'nothing to spare'] : ['no limits set'],
    };
  }
  const over = standing.breaches.map((use) => amounts[use.limit](use.over));
  return {
    tone: 'over',
    what:
      over.length > 0
        ? `${over.join(', ')} over`
        : `${power(appraisal.power)} of the ${percent(words.hold.power)} asked for`,
    more: [...mostWithin(option), ...relaxation(option, words)],
  };
}

function mostWithin({ standing, words }: Weighed): string[] {
  if (!standing || standing.breaches.length === 0) return [];
  const { within } = standing;
  if (!within) return ['no size keeps to the limits'];
  const size =
    within.clusters !== undefined && within.clusterSize !== undefined
      ? `${count(within.clusters)} × ${count(within.clusterSize)}`
      : `${count(within.participants)} ${words.participants.many}`;
  return [`${size} reach ${percent(within.power, 0)}`];
}

function relaxation(option: Weighed, words: Words): string[] {
  const asked = option.standing?.relaxation;
  if (!asked) return ['no relaxation of the limits would do'];
  const limits = asked.changes.map(({ limit, to }) => amountsFor(option, words)[limit](to));
  const size = asked.clusterSize === undefined ? '' : ` at ${count(asked.clusterSize)} each`;
  if (limits.length === 0) {
    return [size ? `fits${size}` : `the size that reaches ${percent(words.hold.power)} fits`];
  }
  return [`fits from ${list(limits)}${size}`];
}

function amountsFor({ words }: Weighed, { currency }: Words): Record<LimitKey, (amount: number) => string> {
  const noun = (amount: number, { one, many }: { one: string; many: string }) =>
    Math.round(amount) === 1 ? one : many;
  return {
    clusters: (amount) => `${count(amount)} ${noun(amount, words.clusters)}`,
    participantsPerCluster: (amount) => `${count(amount)} each`,
    money: (amount) => (amount < 0.5 ? '' : money(amount, currency)),
    months: (amount) => `${months(amount)} ${amount === 1 ? 'month' : 'months'}`,
  };
}

/** Each limit that is set as a chip says it: “≤ 32 catchments”. */
export function limitChips({ limits, study, currency }: Weighing): { limit: LimitKey; says: string }[] {
  const { clusters, participantsPerCluster, money: sum, months: time } = limits.limits;
  const noun = study.clusters ?? { one: 'cluster', many: 'clusters' };
  return [
    ...(clusters === undefined
      ? []
      : [{ limit: 'clusters' as const, says: `${count(clusters)} ${noun.many}` }]),
    ...(participantsPerCluster === undefined
      ? []
      : [{ limit: 'participantsPerCluster' as const, says: `${count(participantsPerCluster)} each` }]),
    ...(sum === undefined ? [] : [{ limit: 'money' as const, says: money(sum, currency) }]),
    ...(time === undefined ? [] : [{ limit: 'months' as const, says: `${months(time)} months` }]),
  ].map(({ limit, says }) => ({ limit, says: `≤ ${says}` }));
}
