/** Whole numbers of 1 and more, from `low` to `high` in each dimension. */
export interface Box {
  low: readonly number[];
  high: readonly number[];
}

/** Scores are compared in the order of their parts; the smaller is better. */
export type Score = readonly number[];

export interface Found<T> {
  score: Score;
  at: T;
}

/** What is known of a box: no point in it scores below `bound`, and one point, where it is known, scores as found. */
export interface View<T> {
  bound: Score;
  found?: Found<T> | undefined;
}

export interface Least<T> {
  found: Found<T> | undefined;
  /** False where the search was given up with boxes left that might hold something better. */
  proven: boolean;
}

/**
 * The best point of a box of whole numbers.
 *
 * *Formula*: branch and bound, depth first, the more promising half first; a box is halved on the log scale of its
 * longest side. Exact where `look` tells the truth of every box, and the whole of a box of one point.
 * *Source*: Land & Doig 1960, Econometrica 28:497.
 * @param look  what is known of a box, or undefined where nothing in it will do, or be better than the best so far
 * @param incumbent  a point to begin with: only better ones replace it
 */
export function leastInBox<T>(
  box: Box,
  look: (box: Box, best: Found<T> | undefined) => View<T> | undefined,
  { incumbent, most = 20_000 }: { incumbent?: Found<T> | undefined; most?: number } = {},
): Least<T> {
  let best = incumbent;
  const open: { box: Box; bound: Score }[] = [];
  const see = (next: Box): { box: Box; bound: Score } | undefined => {
    const view = look(next, best);
    if (!view) return undefined;
    if (view.found && (!best || isBetter(view.found.score, best.score))) best = view.found;
    return { box: next, bound: view.bound };
  };
  const first = see(box);
  if (first) open.push(first);
  for (let seen = 1; open.length > 0; seen += 2) {
    if (seen > most) return { found: best, proven: false };
    const { box: next, bound } = open.pop() as { box: Box; bound: Score };
    if (best && !isBetter(bound, best.score)) continue;
    const halves = halve(next)?.flatMap((half) => see(half) ?? []) ?? [];
    const [a, b] = halves;
    if (a && b && isBetter(a.bound, b.bound)) halves.reverse();
    open.push(...halves);
  }
  return { found: best, proven: true };
}

export function isBetter(one: Score, other: Score): boolean {
  const differs = one.findIndex((part, index) => part !== other[index]);
  return differs >= 0 && (one[differs] as number) < (other[differs] as number);
}

function halve({ low, high }: Box): [Box, Box] | undefined {
  const lengths = low.map((from, side) => (high[side] as number) / from);
  const longest = lengths.indexOf(Math.max(...lengths));
  const [from, to] = [low[longest], high[longest]];
  if (from === undefined || to === undefined || from === to) return undefined;
  const middle = Math.min(to - 1, Math.floor(Math.sqrt(from) * Math.sqrt(to)));
  return [
    { low, high: high.with(longest, middle) },
    { low: low.with(longest, middle + 1), high },
  ];
}
