import {
  type AppraisalRequest,
  type CurvePoint,
  type LimitKey,
  type QuestionPlan,
  targetOf,
} from '@steelyard/calc';
import { capitalised } from '../../../shared/format/lists';
import { money } from '../../../shared/format/money';
import { count, figure, months, percent, power, withUnit } from '../../../shared/format/numbers';
import type { Weighing } from '../../weigh/model/weighing';

/** What a curve runs over, and what the axes may show: of each the usual first. */
export const overKinds = ['units', 'clusterSize'] as const;
export const acrossKinds = ['cost', 'participants', 'clusters', 'clusterSize', 'months'] as const;
export const upKinds = ['power', 'detectable', 'halfWidth'] as const;

export type Over = (typeof overKinds)[number];
export type Across = (typeof acrossKinds)[number];
export type Up = (typeof upKinds)[number];

/** One size of an option, with all that an axis may show of it. */
export interface SizePoint extends CurvePoint {
  clusterSize?: number;
}

export interface Axis<Kind> {
  kind: Kind;
  label: string;
  of: (point: SizePoint, request: AppraisalRequest) => number | undefined;
  /** On a tick, and in a sentence. */
  tick: (value: number) => string;
  tell: (value: number) => string;
  whole: boolean;
}

export interface AcrossAxis extends Axis<Across> {
  limit?: LimitKey;
  /** “costs least”, “takes the fewest girls” */
  leads: string;
}

export interface UpAxis extends Axis<Up> {
  /** Whether more of it is better; otherwise less is. */
  more: boolean;
}

/** What may be drawn across, in the words of the study. */
export function acrossAxes({ study, currency }: Weighing): Record<Across, AcrossAxis> {
  const participants = study.participants.many;
  const clusters = study.clusters ?? { one: 'cluster', many: 'clusters' };
  return {
    cost: {
      kind: 'cost',
      label: 'Cost',
      of: ({ cost }) => cost,
      tick: (value) => money(value, currency),
      tell: (value) => money(value, currency),
      whole: false,
      limit: 'money',
      leads: 'costs least',
    },
    participants: {
      kind: 'participants',
      label: `${capitalised(participants)} analysed`,
      of: (point) => point.participants,
      tick: count,
      tell: (value) => `${count(value)} ${value === 1 ? study.participants.one : participants}`,
      whole: true,
      leads: `takes the fewest ${participants}`,
    },
    clusters: {
      kind: 'clusters',
      label: `${capitalised(clusters.many)} analysed`,
      of: (point) => point.clusters,
      tick: count,
      tell: (value) => `${count(value)} ${value === 1 ? clusters.one : clusters.many}`,
      whole: true,
      limit: 'clusters',
      leads: `takes the fewest ${clusters.many}`,
    },
    clusterSize: {
      kind: 'clusterSize',
      label: `${capitalised(participants)} in each ${clusters.one}`,
      of: ({ clusterSize }) => clusterSize,
      tick: count,
      tell: (value) => `${count(value)} in each ${clusters.one}`,
      whole: true,
      limit: 'participantsPerCluster',
      leads: `takes the fewest ${participants} in each ${clusters.one}`,
    },
    months: {
      kind: 'months',
      label: 'Months',
      of: (point) => point.months,
      tick: months,
      tell: (value) => `${months(value)} months`,
      whole: false,
      limit: 'months',
      leads: 'ends first',
    },
  };
}

/** What may be drawn upwards. */
export function upAxes({ study }: Weighing): Record<Up, UpAxis> {
  const { outcome, test } = study.plan;
  const level = percent(1 - (test.sides === 2 ? test.alpha : 2 * test.alpha));
  const target = targetAt(study.plan);
  const { kind } = outcome;
  const unit = { continuous: study.outcomeUnit, binary: 'percentage points' }[kind as string] ?? '';
  const shown = (value: number) => {
    if (kind === 'binary') return withUnit(figure(100 * value, 3), '% points');
    return withUnit(figure(value, 3), kind === 'continuous' ? study.outcomeUnit : '');
  };
  const tick = (value: number) =>
    kind === 'binary' ? withUnit(figure(100 * value, 4), '%') : figure(value, 4);
  const scale = target.ratio ? 'log scale' : unit;
  return {
    power: {
      kind: 'power',
      label: 'Power',
      of: (point) => point.power,
      tick: (value) => percent(value),
      tell: power,
      whole: false,
      more: true,
    },
    detectable: {
      kind: 'detectable',
      label: target.ratio ? 'Detectable ratio' : `Detectable difference${unit ? `, ${unit}` : ''}`,
      of: detectableIn,
      tick,
      tell: shown,
      whole: false,
      // A ratio is better the nearer it lies to 1, a difference the nearer to 0.
      more: target.ratio && target.at < 1,
    },
    halfWidth: {
      kind: 'halfWidth',
      label: `Half width of the ${level} interval${scale ? `, ${scale}` : ''}`,
      of: ({ expectedHalfWidth }) => expectedHalfWidth,
      tick,
      tell: (value) => `± ${shown(value)}`,
      whole: false,
      more: false,
    },
  };
}

/** What the study looks for: a difference, as far as it is from 0, or a ratio. */
export function targetAt({ outcome }: QuestionPlan): { at: number; ratio: boolean } {
  const [, target, none] = targetOf(outcome);
  return { at: none === 0 ? Math.abs(target) : target, ratio: none === 1 };
}

/** The detectable target on the same terms; a proportion's difference is from the control's. */
function detectableIn({ detectable }: SizePoint, { outcome }: AppraisalRequest): number | undefined {
  if (detectable === undefined) return undefined;
  if (outcome.kind === 'binary') return Math.abs(detectable - outcome.control);
  return outcome.kind === 'continuous' ? Math.abs(detectable) : detectable;
}
