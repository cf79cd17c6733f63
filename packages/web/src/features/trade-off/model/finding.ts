import { type Feasible, paretoFront } from '@steelyard/calc';
import { counted, list } from '../../../shared/format/lists';
import { money } from '../../../shared/format/money';
import { months, percent, power } from '../../../shared/format/numbers';
import { familyUiOf } from '../../designs/families/registry';
import { limitChips, standingInWords } from '../../weigh/model/standing-words';
import type { Weighed, Weighing } from '../../weigh/model/weighing';
import type { AcrossAxis } from './axes';
import type { Drawn, Picture } from './picture';

interface Sized extends Drawn {
  size: Feasible;
  burden: number;
}

/**
 * What the picture shows at rest: who leads on the axis across among those that reach the power within the limits.
 * Where the hold is not the power, only of the sizes that they have: others along their curves may do.
 */
export function finding(weighing: Weighing, picture: Picture): string {
  const found = foundAtSizes(weighing, picture);
  if (weighing.hold.kind === 'power') return found;
  return `At these sizes, ${found.replace(/^[A-Z](?=[a-z])/, (letter) => letter.toLocaleLowerCase('en-GB'))}`;
}

function foundAtSizes(weighing: Weighing, { drawn, across }: Picture): string {
  const { hold, limits } = weighing;
  const admitted = drawn.flatMap((each): Sized[] => {
    const { option, now } = each;
    const burden = now && across.of(now, option.request);
    if (!option.appraisal?.feasible || burden === undefined || option.ruling?.kind === 'not-admissible')
      return [];
    return [{ ...each, size: option.appraisal, burden }];
  });
  if (admitted.length === 0) return 'No option that may be chosen has a size on these axes.';
  const limited = Object.values(limits.limits).some((limit) => limit !== undefined);
  const does = `${percent(hold.power)}${limited ? ' within the limits' : ''}`;
  const able = admitted.filter(({ option: { standing } }) =>
    limited ? standing?.fits : standing?.reachesPower,
  );
  const [only] = able;
  if (!only) {
    return noneInWords(admitted, does, weighing);
  }
  if (able.length === 1) {
    const who = admitted.length === 1 ? only.option.letter : `Only ${only.option.letter}`;
    return `${who} reaches ${does}, at ${across.tell(only.burden)}.`;
  }
  return leadInWords(able, across, does);
}

function noneInWords(admitted: readonly Sized[], does: string, weighing: Weighing): string {
  const able = admitted.filter(({ option }) => option.standing?.reachesPower);
  const most = (able.length > 0 ? able : admitted).reduce((a, b) => {
    const fewer = breachesOf(b) - breachesOf(a);
    return fewer < 0 || (fewer === 0 && b.size.power > a.size.power) ? b : a;
  });
  const { letter } = most.option;
  const alone = admitted.length === 1;
  const who = alone ? `${letter} does not reach` : 'No option reaches';
  const reached = power(most.size.power);
  if (able.length === 0) {
    return alone
      ? `${who} ${does}: its power is ${reached}.`
      : `${who} ${does}; ${letter} comes nearest with ${reached}.`;
  }
  const over = standingInWords(most.option, weighing)?.what ?? '';
  return `${who} ${does}${alone ? ': it' : `; ${letter}`} has ${reached} with ${over}.`;
}

const breachesOf = ({ option }: Sized): number => option.standing?.breaches.length ?? 0;

function leadInWords(able: readonly Sized[], across: AcrossAxis, does: string): string {
  const sorted = [...able].sort((a, b) => a.burden - b.burden);
  const [first, second] = sorted as [Sized, Sized];
  const among = `Of the ${counted(able.length, 'option', 'options')} that reach ${does}`;
  const tied = sorted.filter(({ burden }) => across.tell(burden) === across.tell(first.burden));
  if (tied.length > 1) {
    const who = list(tied.map(({ option }) => option.letter).sort());
    return `${among}, ${who} come to the same: ${across.tell(first.burden)}.`;
  }
  return `${among}, ${first.option.letter} ${across.leads}: ${across.tell(first.burden)}, against ${across.tell(second.burden)} for ${second.option.letter}.`;
}

/** What a move did: the option's new size and what it changed since the move began. */
export function moveInWords(before: Weighed, now: Weighed, weighing: Weighing): string {
  const [from, to] = [before.appraisal, now.appraisal];
  if (!to?.feasible) return `${now.letter} cannot be computed at this size.`;
  const size = familyUiOf(now.family).summary(now.plan, to, now.words);
  const parts = [`power ${power(to.power)}`];
  if (from?.feasible) parts.push(...changes(from, to, weighing.currency));
  const turn = turnOf(before, now, percent(weighing.hold.power));
  return `${now.letter} now ${size}: ${parts.join(', ')}${turn}.`;
}

function changes(from: Feasible, to: Feasible, currency: string): string[] {
  const cost = (to.costs?.total ?? 0) - (from.costs?.total ?? 0);
  const time = (to.timeline?.months ?? 0) - (from.timeline?.months ?? 0);
  return [
    ...(Math.abs(cost) < 0.5 ? [] : [`${money(Math.abs(cost), currency)} ${cost > 0 ? 'more' : 'less'}`]),
    ...(Math.abs(time) < 0.05
      ? []
      : [
          `${months(Math.abs(time))} ${Math.abs(time) === 1 ? 'month' : 'months'} ${time > 0 ? 'more' : 'less'}`,
        ]),
  ];
}

function turnOf({ standing: was }: Weighed, { standing: is }: Weighed, asked: string): string {
  if (!is) return '';
  const turns = [
    was?.reachesPower === is.reachesPower
      ? ''
      : is.reachesPower
        ? `reaches ${asked} now`
        : `no longer reaches ${asked}`,
    (was?.breaches.length ?? 0) > 0 === is.breaches.length > 0
      ? ''
      : is.breaches.length > 0
        ? 'now breaks a limit'
        : 'keeps to the limits now',
  ].filter((turn) => turn !== '');
  return turns.length > 0 ? `, ${list(turns)}` : '';
}

/** An option's size with all that it means, as its marker says it. */
export function sizeInWords(option: Weighed, weighing: Weighing): string {
  const { appraisal, family, plan, words } = option;
  if (!appraisal?.feasible) return 'cannot be computed at this size';
  const ruledOut = option.ruling?.kind === 'not-admissible';
  const told = ruledOut ? 'not admissible' : standingInWords(option, weighing)?.what;
  return [
    familyUiOf(family).summary(plan, appraisal, words),
    `power ${power(appraisal.power)}`,
    ...(appraisal.costs ? [money(appraisal.costs.total, weighing.currency)] : []),
    ...(appraisal.timeline ? [`${months(appraisal.timeline.months)} months`] : []),
    ...(told ? [told] : []),
  ].join(', ');
}

/** What the picture cannot show: options without a curve, power out of reach, options beaten on every count. */
export function notes(weighing: Weighing, { drawn, asked, across }: Picture): string[] {
  const reached = percent(asked.power);
  const told = weighing.options.flatMap((option): string[] => {
    const { letter, error, appraisal, words, family, plan } = option;
    const curve = drawn.find((each) => each.option.id === option.id)?.curve;
    if (!curve) {
      const why =
        error?.message ?? (appraisal?.feasible === false ? appraisal.infeasible.message : undefined);
      return [
        why
          ? `${letter} is not drawn. ${why}`
          : `${letter} is not drawn: ${notHere(option, asked.over, across)}`,
      ];
    }
    if (error) return [`${letter} has no marker. ${error.message}`];
    if (appraisal?.feasible === false) return [`${letter} has no marker. ${appraisal.infeasible.message}`];
    if (curve.end && curve.end.size < curve.from) {
      const limit = limitChips(weighing).find((chip) => chip.limit === curve.end?.limit)?.says ?? '';
      return [`${letter} breaks a limit at every size drawn: ${limit}.`];
    }
    if (curve.limitingPower !== undefined && appraisal?.feasible) {
      const most = power(curve.limitingPower);
      const size = familyUiOf(family).sizeNoun(plan, words).toLocaleLowerCase('en-GB');
      return [
        `${letter} cannot reach ${reached} however many ${words.participants.many} each ${words.clusters.one} gives: at most ${most} with ${appraisal.units} ${size}.`,
      ];
    }
    return [];
  });
  return [...told, ...beatenInWords(weighing)];
}

function notHere({ request, words }: Weighed, over: Picture['asked']['over'], across: AcrossAxis): string {
  if (over === 'clusterSize' && !('clusterSize' in request.design))
    return `it has no ${words.clusters.many}.`;
  return `it has nothing on the axis “${across.label}”.`;
}

/** Options that another beats or equals on participants, money, months and power together. */
function beatenInWords({ options }: Weighing): string[] {
  const sized = options.flatMap((option) =>
    option.appraisal?.feasible && option.ruling?.kind !== 'not-admissible'
      ? [{ letter: option.letter, ...countsOf(option.appraisal) }]
      : [],
  );
  const front = paretoFront(sized);
  const beaten = sized.filter((option) => !front.includes(option)).map(({ letter }) => letter);
  if (beaten.length === 0 || front.length === 0) return [];
  const [winners, losers] = [list(front.map(({ letter }) => letter)), list(beaten)];
  const verb = beaten.length === 1 ? 'is' : 'are';
  return [
    `Pareto front on participants, cost, months and power together: ${winners}; ${losers} ${verb} beaten there.`,
  ];
}

const countsOf = ({ recruited, costs, timeline, power: reached }: Feasible) => ({
  participants: recruited,
  cost: costs?.total ?? 0,
  months: timeline?.months ?? 0,
  power: reached,
});
