import type { Feasible } from '../appraisal.js';
import type { Hold } from './study-plan.js';
import type { WeighedOption } from './weigh.js';

export interface Noun {
  one: string;
  many: string;
}

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

interface Standing {
  option: WeighedOption;
  appraisal: Feasible;
}

/** Which option comes out ahead and by how much, in one headline and one sentence. */
export function verdict(weighed: readonly WeighedOption[], words: VerdictWords): Verdict {
  if (weighed.length === 0) {
    return { headline: 'No options yet.', detail: 'Add a candidate design to weigh it.' };
  }
  const standing = weighed.flatMap((option) =>
    option.appraisal?.feasible ? [{ option, appraisal: option.appraisal }] : [],
  );
  const [only] = standing;
  const absent = missingSentence(weighed);
  if (!only) return { headline: 'No option can be sized as it stands.', detail: absent };
  if (standing.length === 1) return { headline: aloneHeadline(only, words), detail: absent };
  return compare(standing, words, absent);
}

function aloneHeadline({ option, appraisal }: Standing, words: VerdictWords): string {
  const size = `${count(appraisal.recruited)} ${noun(words.participants, appraisal.recruited)}`;
  const facts = [size, ...cost(appraisal, words), ...time(appraisal)];
  return `${option.letter} takes ${list(facts)}.`;
}

function compare(standing: readonly Standing[], words: VerdictWords, absent: string): Verdict {
  const measures: { words: string; of: (appraisal: Feasible) => number | undefined }[] = [
    { words: 'costs least', of: ({ costs }) => costs?.total },
    { words: 'ends first', of: ({ timeline }) => timeline?.months },
    { words: `recruits the fewest ${words.participants.many}`, of: ({ recruited }) => recruited },
  ];
  const wins = measures.flatMap(({ words: what, of }) => {
    const leader = strictlyLeast(standing, of);
    return leader ? [{ leader, what }] : [];
  });
  const [ahead] = wins;
  if (!ahead) return { headline: 'The options come out level.', detail: absent };
  const leader = ahead.leader;
  const won = wins.filter((win) => win.leader === leader).map((win) => win.what);
  const others = wins
    .filter((win) => win.leader !== leader)
    .map((win) => `${win.leader.option.letter} ${win.what}`);
  const behind = standing
    .filter((each) => each !== leader)
    .map((each) => `${each.option.letter} takes ${difference(each.appraisal, leader.appraisal, words)}`);
  const held =
    words.hold.kind === 'power' ? `At power ${percent(words.hold.power)} ` : 'At the sizes entered ';
  return {
    headline: `${held}${leader.option.letter} ${list(won)}.`,
    detail: sentences([list(others), behind.join('; '), absent]),
  };
}

function difference(appraisal: Feasible, against: Feasible, words: VerdictWords): string {
  const parts: string[] = [];
  const more = appraisal.recruited - against.recruited;
  if (more !== 0)
    parts.push(
      `${count(Math.abs(more))} ${more > 0 ? 'more' : 'fewer'} ${noun(words.participants, Math.abs(more))}`,
    );
  if (appraisal.costs && against.costs) {
    const extra = appraisal.costs.total - against.costs.total;
    parts.push(`${money(Math.abs(extra), words.currency)} ${extra >= 0 ? 'more' : 'less'}`);
  }
  if (appraisal.timeline && against.timeline) {
    const later = Math.round(appraisal.timeline.months) - Math.round(against.timeline.months);
    if (later !== 0)
      parts.push(
        `${Math.abs(later)} ${Math.abs(later) === 1 ? 'month' : 'months'} ${later > 0 ? 'longer' : 'less'}`,
      );
  }
  return parts.length === 0 ? 'the same' : list(parts);
}

function strictlyLeast(
  standing: readonly Standing[],
  of: (appraisal: Feasible) => number | undefined,
): Standing | undefined {
  const values = standing.map((each) => of(each.appraisal));
  if (values.some((value) => value === undefined)) return undefined;
  const least = Math.min(...(values as number[]));
  return values.filter((value) => value === least).length === 1 ? standing[values.indexOf(least)] : undefined;
}

function missingSentence(weighed: readonly WeighedOption[]): string {
  return sentences(
    weighed.map(({ letter, appraisal, error }) => {
      if (error) return `${letter} cannot be computed: ${withoutStop(error.message)}`;
      if (appraisal && !appraisal.feasible)
        return `${letter} cannot reach the power: ${withoutStop(appraisal.infeasible.message)}`;
      return '';
    }),
  );
}

const withoutStop = (message: string) => message.replace(/\.$/, '');
const noun = ({ one, many }: Noun, n: number) => (n === 1 ? one : many);
const count = (n: number) => Math.round(n).toLocaleString('en-GB');
const percent = (proportion: number) => `${Number((100 * proportion).toPrecision(4))}\u202f%`;
const cost = ({ costs }: Feasible, { currency }: VerdictWords) =>
  costs ? [money(costs.total, currency)] : [];
const time = ({ timeline }: Feasible) => (timeline ? [`${Math.round(timeline.months)} months`] : []);

/** Thousands of the currency, as in 19 k€; whole units below ten thousand. */
export function money(amount: number, currency: string): string {
  const sign = symbols[currency] ?? currency;
  const thousands = Math.abs(amount) >= 10_000;
  const figure = Math.round(thousands ? amount / 1000 : amount).toLocaleString('en-GB');
  return thousands ? `${figure}\u202fk${sign}` : `${figure}\u202f${sign}`;
}

const symbols: Record<string, string> = { EUR: '€', GBP: '£', USD: '$' };

function list(parts: readonly string[]): string {
  const kept = parts.filter((part) => part !== '');
  return kept.length < 2 ? (kept[0] ?? '') : `${kept.slice(0, -1).join(', ')} and ${kept.at(-1)}`;
}

function sentences(parts: readonly string[]): string {
  return parts
    .filter((part) => part !== '')
    .map((part) => `${part}.`)
    .join(' ');
}
