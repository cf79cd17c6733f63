import type { OptionPlan } from '@steelyard/calc';
import { capitalised, counted } from '../../../shared/format/lists';
import { count } from '../../../shared/format/numbers';
import { areEqual, sharesOf, treated, twoArms } from './arms';
import { clustersUnnamed, inEachCluster, sized } from './cluster';
import type { Cell, FamilyUi, Schematic, StartPlan, StudyWords } from './family-ui';
import type { StructurePart } from './structure-part';

/** As many sequences, and as many periods, as are computed and drawn. */
export const mostPeriods = 60;

interface PeriodFace {
  name: string;
  describes: string;
  suits: FamilyUi['suits'];
  structure: StartPlan['structure'];
  /** What each sequence goes through, period by period. */
  scheduleOf(structure: OptionPlan['structure']): Cell[][];
  /** What its sequences are called: arms or sequences. */
  groups?: 'arms';
  /** What the form shows and asks for before what all designs over periods have in common. */
  parts(plan: OptionPlan, words: StudyWords): readonly StructurePart[];
}

/** The face of a design whose clusters are measured over periods: all but its schedule is common to them. */
export function periodFace({
  name,
  describes,
  suits,
  structure,
  scheduleOf,
  groups,
  parts,
}: PeriodFace): FamilyUi {
  const rowsOf = (plan: OptionPlan) => scheduleOf(plan.structure);
  return {
    name,
    describes,
    suits,
    refusal: clustersUnnamed,
    start: () => ({ treatments: [0, 1], structure, clusterSize: 20, overrides: {} }),
    arms: twoArms,
    whole: (plan) => ({ ...plan, structure: { ...structure, ...plan.structure } }),
    treated,
    summary(plan, size, { clusters }) {
      const each = size?.clusterSize ?? plan.clusterSize;
      const times = timesMeasured(rowsOf(plan));
      if (size?.clusters === undefined || each === undefined) {
        return times
          ? `${sized(clusters.many, each)}, ${counted(times, 'period', 'periods')}`
          : clusters.many;
      }
      const sizes = `${count(size.clusters)} ${clusters.many} × ${count(each)}`;
      if (times === undefined) return `${sizes} in each period measured`;
      const cohort = times > 1 && size.participants === size.clusters * each;
      return cohort ? `${sizes}, each measured ${times} times` : `${sizes} × ${times}`;
    },
    sizeNoun(plan, { clusters }) {
      const which = areEqual(sharesOf(plan)) ? 'each' : 'the first';
      const group = groups && which === 'the first' ? 'control arm' : groups ? 'arm' : 'sequence';
      return `${capitalised(clusters.many)} in ${group === 'control arm' ? 'the' : which} ${group}`;
    },
    clusterSizeNoun: (words) => `${inEachCluster(words)}, each period`,
    schematic: (plan, words) => periodSchematic(rowsOf(plan), plan, groups && words.arms),
    structure: (plan, _, words) => [
      ...parts(plan, words),
      { part: 'cohort' },
      {
        part: 'shares',
        legend: `${capitalised(words.clusters.many)} by ${groups ? 'arm' : 'sequence'}`,
        says: `How many ${words.clusters.many} each has beside the others.`,
        of: periodSchematic(rowsOf(plan), plan, groups && words.arms).sequences.map((row) => row.name),
        unequal: `${groups ? 'Arms' : 'Sequences'} take unequal numbers of ${words.clusters.many}`,
      },
      {
        part: 'switch',
        key: 'decay',
        label: 'Correlation fades with time',
        says: 'The cluster autocorrelation then counts once for each period apart, so that distant periods resemble each other less; otherwise any two periods are equally alike.',
      },
    ],
  };
}

/** How often each cluster is measured; undefined where it differs between sequences. */
function timesMeasured(rows: readonly Cell[][]): number | undefined {
  const times = rows.map((cells) => cells.filter((cell) => typeof cell === 'number').length);
  return areEqual(times) ? times[0] : undefined;
}

function periodSchematic(
  rows: readonly Cell[][],
  plan: OptionPlan,
  arms: readonly string[] | undefined,
): Schematic {
  const shares = sharesOf(plan);
  const shared = !areEqual(shares) && shares.length === rows.length;
  return {
    periods: (rows[0] ?? []).map((_, period) => `Period ${period + 1}`),
    sequences: rows.map((cells, row) => {
      const share = shared ? Number(shares[row]) : Number.NaN;
      return {
        name: arms?.[row] ?? `Sequence ${row + 1}`,
        cells,
        ...(share > 0 ? { share, note: `share ${Number(share.toPrecision(3))}` } : {}),
      };
    }),
  };
}
