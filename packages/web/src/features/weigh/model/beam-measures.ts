import type { Feasible, LimitKey } from '@steelyard/calc';
import { capitalised } from '../../../shared/format/lists';
import { money } from '../../../shared/format/money';
import { count, months } from '../../../shared/format/numbers';
import { familyUiOf } from '../../designs/families/registry';
import type { Weighed, Weighing } from './weighing';

export const beamMeasures = ['cost', 'participants', 'clusters', 'months'] as const;
export type BeamMeasure = (typeof beamMeasures)[number];

/** Control is outlined, active filled; a group that goes through both is striped. */
export type Fill = 'outlined' | 'filled' | 'striped';

/** What one arm, group or phase takes of a measure. */
export interface Share {
  name: string;
  amount: number;
  fill: Fill;
}

/** The figures behind a beam, its parts as rows. */
export interface PartsTable {
  columns: readonly string[];
  rows: readonly (readonly string[])[];
}

/** One thing that beams can show. */
export interface Measure {
  key: BeamMeasure;
  /** “Cost by arm”. */
  title: string;
  /** How its parts are told apart, of those fills that are drawn. */
  legend: (fills: ReadonlySet<Fill>) => string;
  /** Whether the row says its total under the beam, as no column of figures does. */
  totalled: boolean;
  /** What stands in a beam's place where an option has none. */
  absent: string;
  show: (amount: number) => string;
  sharesOf: (size: Feasible, option: Weighed) => Share[];
  parts: (size: Feasible, option: Weighed) => PartsTable;
  /** The limit that is drawn through the beam. */
  limit: LimitKey;
  /** The limit as an amount of this measure, where one unit of it is not one of the limit's. */
  limitAt?: (size: Feasible, allowed: number, taken: number) => number;
}

/** The measures a study's beams can show, cost first; clusters only where an option has some. */
export function measuresOf({ study, currency, options }: Weighing): [Measure, ...Measure[]] {
  const clusters = study.clusters ?? { one: 'cluster', many: 'clusters' };
  const clustered = options.some(({ appraisal }) => appraisal?.feasible && appraisal.clusters !== undefined);
  return [
    costMeasure(currency),
    participantsMeasure(study.participants.many),
    ...(clustered ? [clustersMeasure(clusters.many)] : []),
    monthsMeasure,
  ];
}

const byArm: Measure['legend'] = (fills) =>
  fills.has('striped')
    ? 'Control outlined, active filled, one after the other striped'
    : 'Control outlined, active filled';

function costMeasure(currency: string): Measure {
  const show = (amount: number) => money(amount, currency);
  return {
    key: 'cost',
    title: 'Cost by arm',
    legend: byArm,
    totalled: false,
    absent: 'No costs stated',
    show,
    limit: 'money',
    sharesOf: ({ costs }, { words }) =>
      (costs?.arms ?? []).map(({ label, total }, arm) => ({
        name: words.arms[arm] ?? label,
        amount: total,
        fill: arm > 0 ? 'filled' : 'outlined',
      })),
    parts: ({ costs }, { words }) => {
      const arms = costs?.arms ?? [];
      const sum = (of: 'direct' | 'shared' | 'total') => count(arms.reduce((all, arm) => all + arm[of], 0));
      return {
        columns: [`Arm, ${currency}`, 'Direct', 'Shared', 'Total', 'Each exposure'],
        rows: [
          ...arms.map(({ label, direct, shared, total, perExposure }, arm) => [
            words.arms[arm] ?? label,
            ...[direct, shared, total, perExposure].map(count),
          ]),
          ['Together', sum('direct'), sum('shared'), sum('total'), ''],
        ],
      };
    },
  };
}

function participantsMeasure(many: string): Measure {
  return {
    key: 'participants',
    title: `${capitalised(many)} by arm`,
    legend: (fills) => `All who are recruited. ${byArm(fills)}`,
    totalled: true,
    absent: '',
    show: (amount) => `${count(amount)} ${many}`,
    limit: 'participantsPerCluster',
    limitAt: ({ recruited }, allowed, taken) => (recruited * allowed) / taken,
    sharesOf: (size, option) => byGroup(size, option, ({ recruited }) => recruited),
    parts: (size, option) =>
      groupTable(size, option, ({ participants, recruited }) => [participants, recruited]),
  };
}

function clustersMeasure(many: string): Measure {
  return {
    key: 'clusters',
    title: `${capitalised(many)} by arm`,
    legend: (fills) => `All that are recruited. ${byArm(fills)}`,
    totalled: true,
    absent: `No ${many}: it randomises individuals`,
    show: (amount) => `${count(amount)} ${many}`,
    limit: 'clusters',
    sharesOf: (size, option) =>
      size.clusters === undefined ? [] : byGroup(size, option, ({ recruitedClusters }) => recruitedClusters),
    parts: (size, option) =>
      groupTable(size, option, ({ clusters, recruitedClusters }) => [clusters, recruitedClusters]),
  };
}

type Group = Feasible['groups'][number];
type Counts = Pick<Group, 'participants' | 'recruited' | 'clusters' | 'recruitedClusters'>;

function byGroup(size: Feasible, option: Weighed, of: (group: Group) => number | undefined): Share[] {
  return size.groups.map((group, index) => ({
    name: groupName(option, index, group.label),
    amount: of(group) ?? 0,
    fill: groupFill(option, index),
  }));
}

function groupTable(
  size: Feasible,
  option: Weighed,
  of: (counts: Counts) => (number | undefined)[],
): PartsTable {
  const figures = (values: (number | undefined)[]) =>
    values.map((value) => (value === undefined ? '–' : count(value)));
  return {
    columns: ['Group', 'Analysed', 'Recruited'],
    rows: [
      ...size.groups.map((group, index) => [groupName(option, index, group.label), ...figures(of(group))]),
      ['Together', ...figures(of(size))],
    ],
  };
}

const sequencesOf = ({ family, plan, words }: Weighed) => familyUiOf(family).schematic(plan, words).sequences;

const groupName = (option: Weighed, index: number, label: string): string =>
  sequencesOf(option)[index]?.name ?? label;

function groupFill(option: Weighed, index: number): Fill {
  const given = (sequencesOf(option)[index]?.cells ?? [index]).filter((cell) => typeof cell === 'number');
  if (given.every((arm) => arm === 0)) return 'outlined';
  return given.includes(0) ? 'striped' : 'filled';
}

const monthsMeasure: Measure = {
  key: 'months',
  title: 'Months by phase',
  legend: () =>
    'By phase, as arms run side by side: start-up and close-out outlined, recruitment filled, follow-up or periods striped',
  totalled: false,
  absent: 'No months stated',
  show: (amount) => `${months(amount)} ${amount === 1 ? 'month' : 'months'}`,
  limit: 'months',
  sharesOf: ({ timeline }) => {
    const shares: Share[] = [];
    for (const { label, from, to } of timeline?.phases ?? []) {
      const { name, fill } = phases[label] ?? { name: 'Follow-up and periods', fill: 'striped' as const };
      const last = shares.at(-1);
      if (last?.name === name) last.amount += to - from;
      else shares.push({ name, amount: to - from, fill });
    }
    return shares;
  },
  parts: ({ timeline }) => ({
    columns: ['Phase', 'From', 'To', 'Months'],
    rows: [
      ...(timeline?.phases ?? []).map(({ label, from, to }) => [
        label,
        months(from),
        months(to),
        months(to - from),
      ]),
      ['Start to end', '', '', months(timeline?.months ?? 0)],
    ],
  }),
};

/** The phases that every design has, by the calculation's names; what lies between them is the design's own. */
const phases: Record<string, { name: string; fill: Fill }> = {
  'Start-up': { name: 'Start-up', fill: 'outlined' },
  Recruitment: { name: 'Recruitment', fill: 'filled' },
  'Follow-up': { name: 'Follow-up', fill: 'striped' },
  'Close-out': { name: 'Close-out', fill: 'outlined' },
};
