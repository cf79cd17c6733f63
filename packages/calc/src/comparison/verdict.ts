import type { Feasible } from '../appraisal.js';
import type { LimitKey, Use } from './limits.js';
import type { Hold } from './study-plan.js';
import type { WeighedOption } from './weigh.js';
import { count, list, money, months, type Noun, noun, percent, sentences } from './wording.js';

export interface VerdictWords {
  hold: Hold;
  currency: string;
  participants: Noun;
  clusters: Noun | null;
}

export interface Verdict {
  headline: string;
  detail: string;
}

type Sized = WeighedOption & { appraisal: Feasible };

/**
 * Which option comes out ahead, and why not the others: by the limits where there are any, by cost, time and number
 * where there are none. Options ruled out are named last and never win.
 */
export function verdict(weighed: readonly WeighedOption[], words: VerdictWords): Verdict {
  if (weighed.length === 0) {
    return { headline: 'No options yet.', detail: 'Add a candidate design to weigh it.' };
  }
  const admitted = weighed.filter(({ ruling }) => ruling?.kind !== 'not-admissible');
  const ruledOut = weighed
    .filter(({ ruling }) => ruling?.kind === 'not-admissible')
    .map(({ letter }) => letter);
  const sized = admitted.filter((option): option is Sized => option.appraisal?.feasible === true);
  const rest = [
    ...admitted.filter((option) => !option.appraisal?.feasible).map(whyNotSized),
    ruledOut.length > 0 ? `${list(ruledOut)} ${ruledOut.length === 1 ? 'is' : 'are'} ruled out` : '',
  ];
  if (sized.length === 0) {
    const headline =
      admitted.length === 0 ? 'Every option is ruled out.' : 'No option can be sized as it stands.';
    return { headline, detail: sentences(rest) };
  }
  const fitting = sized.filter(({ standing }) => standing?.fits ?? true);
  const failing = sized.filter((option) => !fitting.includes(option));
  const limits = sized.some(({ standing }) => standing && standing.uses.length > 0);
  const limited = limits || failing.length > 0;
  const ahead = fitting.length > 1 ? leaderOf(fitting, words) : null;
  return {
    headline: limited
      ? limitHeadline(fitting, admitted.length, ahead, limits)
      : openHeadline(sized, ahead, words),
    detail: sentences([
      ...(ahead?.others ?? []),
      ahead && !limited ? behind(ahead.leader, fitting, words) : '',
      ...failing.map((option) => whyNotFitting(option, words)),
      ...rest,
    ]),
  };
}

/** Every admitted option is counted, also those that could not be sized. */
function limitHeadline(
  fitting: readonly Sized[],
  admitted: number,
  ahead: Leader | null,
  limits: boolean,
): string {
  const [one, many] = limits
    ? ['fits every limit', 'fit every limit']
    : ['reaches the power', 'reach the power'];
  const [only] = fitting;
  if (!only) return `No option ${one}.`;
  if (fitting.length === 1) return `${admitted === 1 ? '' : 'Only '}${only.letter} ${one}.`;
  const who =
    fitting.length === admitted
      ? `Every option ${one}`
      : `${list(fitting.map(({ letter }) => letter))} ${many}`;
  return ahead ? `${who}; ${ahead.leader.letter} ${list(ahead.won)}.` : `${who}.`;
}

function openHeadline(sized: readonly Sized[], ahead: Leader | null, words: VerdictWords): string {
  const [first] = sized;
  if (first && sized.length === 1) {
    const { recruited, costs, timeline } = first.appraisal;
    const facts = [
      `${count(recruited)} ${noun(words.participants, recruited)}`,
      costs ? money(costs.total, words.currency) : '',
      timeline ? months(timeline.months) : '',
    ];
    return `${first.letter} takes ${list(facts)}.`;
  }
  if (!ahead) return 'No option is ahead of all others on any count.';
  const held = {
    power: `At power ${percent(words.hold.power)}`,
    budget: 'Within the budget',
    sizes: 'At the sizes entered',
  };
  return `${held[words.hold.kind]} ${ahead.leader.letter} ${list(ahead.won)}.`;
}

interface Leader {
  leader: Sized;
  won: string[];
  /** What others lead on, as in “B ends first”. */
  others: string[];
}

function leaderOf(options: readonly Sized[], { hold, participants }: VerdictWords): Leader | null {
  const measures: [string, (appraisal: Feasible) => number | undefined][] = [
    ['has the most power', ({ power }) => (hold.kind === 'power' ? undefined : -power)],
    ['costs least', ({ costs }) => costs?.total],
    ['ends first', ({ timeline }) => timeline?.months],
    [`recruits the fewest ${participants.many}`, ({ recruited }) => recruited],
  ];
  const wins = measures.flatMap(([what, of]) => {
    const leader = strictlyLeast(options, of);
    return leader ? [{ leader, what }] : [];
  });
  const leader = wins[0]?.leader;
  if (!leader) return null;
  return {
    leader,
    won: wins.filter((win) => win.leader === leader).map((win) => win.what),
    others: wins.filter((win) => win.leader !== leader).map((win) => `${win.leader.letter} ${win.what}`),
  };
}

function behind(leader: Sized, options: readonly Sized[], words: VerdictWords): string {
  return options
    .filter((option) => option !== leader)
    .map(({ letter, appraisal }) => `${letter} takes ${difference(appraisal, leader.appraisal, words)}`)
    .join('; ');
}

/** How much more or less one option takes than another, in words: participants, money, months. */
export function difference(appraisal: Feasible, against: Feasible, words: VerdictWords): string {
  const parts: string[] = [];
  const more = appraisal.recruited - against.recruited;
  const many = Math.abs(more);
  if (more !== 0)
    parts.push(`${count(many)} ${more > 0 ? 'more' : 'fewer'} ${noun(words.participants, many)}`);
  if (appraisal.costs && against.costs) {
    const extra = appraisal.costs.total - against.costs.total;
    if (Math.abs(extra) >= 0.5)
      parts.push(`${money(Math.abs(extra), words.currency)} ${extra > 0 ? 'more' : 'less'}`);
  }
  if (appraisal.timeline && against.timeline) {
    const later = Math.round(appraisal.timeline.months) - Math.round(against.timeline.months);
    if (later !== 0) parts.push(`${months(Math.abs(later))} ${later > 0 ? 'longer' : 'less'}`);
  }
  return parts.length === 0 ? 'the same' : list(parts);
}

function whyNotSized({ letter, appraisal, error }: WeighedOption): string {
  const why = error?.message ?? (appraisal?.feasible === false ? appraisal.infeasible.message : '');
  return `${letter} cannot be ${error ? 'computed' : 'sized'}: ${why.replace(/\.$/, '')}`;
}

function whyNotFitting({ letter, appraisal, standing }: Sized, words: VerdictWords): string {
  const breaches = standing?.breaches ?? [];
  const reasons = breaches.map((use) => breachWords[use.limit](use, words));
  if (standing && !standing.reachesPower) {
    const [reached, asked] = [percent(appraisal.power), percent(words.hold.power)];
    reasons.unshift(
      reached === asked ? `stays just under ${asked}` : `reaches ${reached} of the ${asked} asked for`,
    );
  }
  return `${letter} ${list(reasons)}`;
}

const breachWords: Record<LimitKey, (use: Use, words: VerdictWords) => string> = {
  clusters: ({ over }, { clusters }) =>
    `needs ${count(over)} ${clusters ? noun(clusters, over) : 'clusters'} that do not exist`,
  participantsPerCluster: ({ over }, { participants, clusters }) =>
    `needs ${count(over)} ${noun(participants, over)} more in each ${clusters?.one ?? 'cluster'} than there are`,
  money: ({ over }, { currency }) => `costs ${over < 1 ? 'a little' : money(over, currency)} too much`,
  months: ({ over }) => (over < 0.5 ? 'ends less than a month late' : `ends ${months(over)} late`),
};

function strictlyLeast(
  options: readonly Sized[],
  of: (appraisal: Feasible) => number | undefined,
): Sized | undefined {
  const values = options.map(({ appraisal }) => of(appraisal));
  if (values.some((value) => value === undefined)) return undefined;
  const least = Math.min(...(values as number[]));
  return values.filter((value) => value === least).length === 1 ? options[values.indexOf(least)] : undefined;
}
