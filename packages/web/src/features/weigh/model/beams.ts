import { sizeOf } from './against';
import type { Fill, Measure, PartsTable } from './beam-measures';
import type { Weighed, Weighing } from './weighing';

/** One part's stretch of a beam, as shares of the whole width. */
export interface BeamPart {
  name: string;
  amount: number;
  from: number;
  width: number;
  fill: Fill;
}

export interface Beam {
  parts: BeamPart[];
  /** Where the limit is drawn through; undefined where there is none, or none within sight. */
  limitAt: number | undefined;
  /** “Cost by arm: Vehicle gel 246 k€, Active gel 244 k€; the limit is 500 k€”. */
  says: string;
  table: PartsTable;
}

/** The scale that all beams share: the longest, or a limit within sight, rounded up to a figure one can read. */
export function beamScale(weighing: Weighing, measure: Measure): number {
  const longest = Math.max(0, ...weighing.options.map((option) => totalOf(option, measure)));
  const limits = weighing.options.map((option) => limitOf(option, weighing, measure) ?? 0);
  return niceCeiling(Math.max(longest, ...limits.filter((limit) => limit <= 2 * longest)));
}

/** An option as a beam; undefined where it has nothing of the measure. */
export function beamOf(
  option: Weighed,
  weighing: Weighing,
  measure: Measure,
  scale: number,
): Beam | undefined {
  const size = sizeOf(option);
  const shares = size ? measure.sharesOf(size, option) : [];
  if (!size || shares.length === 0 || scale === 0) return undefined;
  let from = 0;
  const parts = shares.map((share) => {
    const part = { ...share, from, width: share.amount / scale };
    from += part.width;
    return part;
  });
  const limit = limitOf(option, weighing, measure);
  const told = shares.map(({ name, amount }) => `${name} ${measure.show(amount)}`).join(', ');
  return {
    parts,
    limitAt: limit !== undefined && limit <= scale ? limit / scale : undefined,
    says: `${measure.title}: ${told}${limit === undefined ? '' : `; the limit is ${measure.show(limit)}`}`,
    table: measure.parts(size, option),
  };
}

/** How the parts of these beams are told apart. */
export function beamsLegend({ options }: Weighing, { sharesOf, legend }: Measure): string {
  const shares = options.flatMap((option) => {
    const size = sizeOf(option);
    return size ? sharesOf(size, option) : [];
  });
  return legend(new Set(shares.map(({ fill }) => fill)));
}

/** A table's rows as one sentence, for those who hear it: “Vehicle gel: direct 120 k€, shared 126 k€; …”. */
export function partsInWords({ columns, rows }: PartsTable): string {
  const told = rows.map(([name, ...cells]) => {
    const figures = cells.flatMap((cell, index) =>
      cell === '' ? [] : [`${columns[index + 1]?.toLocaleLowerCase('en-GB')} ${cell}`],
    );
    return `${name}: ${figures.join(', ')}`;
  });
  return `${told.join('; ')}.`;
}

/** What the beams show together: the shortest and the longest. */
export function beamsFinding({ options }: Weighing, measure: Measure): string {
  const known = options.flatMap((option) => {
    const total = totalOf(option, measure);
    return total > 0 ? [{ letter: option.letter, total }] : [];
  });
  const [first] = known;
  if (!first) return 'Nothing can be shown yet.';
  const least = known.reduce((a, b) => (b.total < a.total ? b : a));
  const most = known.reduce((a, b) => (b.total > a.total ? b : a));
  const show = ({ total }: { total: number }) => measure.show(total);
  if (known.length === 1) return `${first.letter} comes to ${show(first)}.`;
  if (least.total === most.total) return `Every beam comes to ${show(first)}.`;
  return `${least.letter} has the shortest beam, ${show(least)}; ${most.letter} the longest, ${show(most)}.`;
}

export function totalOf(option: Weighed, { sharesOf }: Measure): number {
  const size = sizeOf(option);
  return size ? sharesOf(size, option).reduce((sum, { amount }) => sum + amount, 0) : 0;
}

/** The limit as an amount of the measure: for this option alone, where it goes by its clusters. */
function limitOf(option: Weighed, { limits }: Weighing, { limit, limitAt }: Measure): number | undefined {
  const allowed = limits.limits[limit];
  if (allowed === undefined || !limitAt) return allowed;
  const size = sizeOf(option);
  const taken = option.standing?.uses.find((use) => use.limit === limit)?.taken;
  return size && taken ? limitAt(size, allowed, taken) : undefined;
}

const readable = [1, 1.2, 1.5, 2, 2.5, 3, 4, 5, 6, 7, 8, 9, 10];

function niceCeiling(value: number): number {
  if (value <= 0) return 0;
  const magnitude = 10 ** Math.floor(Math.log10(value));
  return (readable.find((step) => step * magnitude >= value) as number) * magnitude;
}
