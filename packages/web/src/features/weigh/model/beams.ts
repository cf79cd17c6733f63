import { money } from '../../../shared/format/money';
import type { Weighed } from './weighing';

/** One arm's stretch of a beam, as shares of the whole width. */
export interface BeamPart {
  name: string;
  cost: number;
  from: number;
  width: number;
  active: boolean;
}

/** The scale that all beams share: the dearest option or the limit, rounded up to a figure one can read. */
export function beamScale(options: readonly Weighed[], limit = 0): number {
  return niceCeiling(Math.max(limit, ...options.map((option) => totalOf(option) ?? 0)));
}

export function beamOf({ appraisal, words }: Weighed, scale: number): BeamPart[] {
  if (!appraisal?.feasible || !appraisal.costs || scale === 0) return [];
  let from = 0;
  return appraisal.costs.arms.map(({ label, total }, arm) => {
    const part = { name: words.arms[arm] ?? label, cost: total, from, width: total / scale, active: arm > 0 };
    from += part.width;
    return part;
  });
}

export function beamInWords(parts: readonly BeamPart[], currency: string, limit?: number): string {
  const arms = parts.map(({ name, cost }) => `${name} ${money(cost, currency)}`).join(', ');
  return `Cost by arm: ${arms}${limit === undefined ? '' : `; the limit is ${money(limit, currency)}`}`;
}

/** What the beams show together: the shortest and the longest. */
export function beamsFinding(options: readonly Weighed[], currency: string): string {
  const known = options.flatMap((option) => {
    const total = totalOf(option);
    return total === undefined ? [] : [{ letter: option.letter, total }];
  });
  const [first] = known;
  if (!first) return 'No cost can be shown yet.';
  const least = known.reduce((a, b) => (b.total < a.total ? b : a));
  const most = known.reduce((a, b) => (b.total > a.total ? b : a));
  if (known.length === 1) return `${first.letter} comes to ${money(first.total, currency)}.`;
  if (least.total === most.total) return `Every beam comes to ${money(first.total, currency)}.`;
  return `${least.letter} has the shortest beam, ${money(least.total, currency)}; ${most.letter} the longest, ${money(most.total, currency)}.`;
}

function totalOf({ appraisal }: Weighed): number | undefined {
  return appraisal?.feasible ? appraisal.costs?.total : undefined;
}

const readable = [1, 1.2, 1.5, 2, 2.5, 3, 4, 5, 6, 8, 10];

function niceCeiling(value: number): number {
  if (value <= 0) return 0;
  const magnitude = 10 ** Math.floor(Math.log10(value));
  return (readable.find((step) => step * magnitude >= value) as number) * magnitude;
}
