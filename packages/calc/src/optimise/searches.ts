import {
  type Box,
  type Found,
  isBetter,
  type Least,
  leastInBox,
  type Score,
} from '../numeric/branch-and-bound.js';
import { smallestInteger } from '../numeric/integer-search.js';
import { loadAt, mostPowerAt, powerAt, type Sized, type SizedLoad, type Space } from './space.js';

/** How many sizes in a row a search tries, where the df leave each less power than it might have. */
const longestWalk = 10_000;

/**
 * The size with the least score among those that reach the power.
 *
 * A box is judged by its corners: nothing in it needs less of the innermost size than its largest sizes do, and
 * nothing costs less than its smallest sizes with that. So it is exact where `mostPowerAt`, and what a size takes,
 * rise with every size.
 *
 * @param score  of what a size takes; undefined where that is too much
 * @param incumbent  sizes to begin with: only better ones replace the best of them
 */
export function leastReaching(
  space: Space,
  power: number,
  score: (load: SizedLoad) => Score | undefined,
  incumbent?: Found<Sized>,
): Least<Sized> {
  let guess: number | undefined;
  let resolved = true;
  const foundAt = (at: Sized): Found<Sized> | undefined => {
    const reached = powerAt(at) >= power ? score(loadAt(at)) : undefined;
    return reached && { score: reached, at };
  };
  /** The first of one design's sizes that reaches the power in fact, unless an earlier one is no better than the best. */
  const firstOf = (outer: readonly number[], from: number, to: number, best: Found<Sized> | undefined) => {
    for (let inner = from; inner <= to && inner < from + longestWalk; inner += 1) {
      const at = space.at(outer, inner);
      const scored = score(loadAt(at));
      if (!scored || (best && !isBetter(scored, best.score))) return undefined;
      if (powerAt(at) >= power) return { score: scored, at };
    }
    resolved &&= to < from + longestWalk;
    return undefined;
  };

  const { found, proven } = leastInBox<Sized>(
    space.box,
    (box, best) => {
      const { low, high } = box;
      const range = space.inner(box);
      const inner = smallestInteger((n) => mostPowerAt(space.at(high, n)) >= power, {
        ...range,
        ...(guess === undefined ? {} : { guess }),
        lookBelow: space.lookBelow,
      });
      if (inner === undefined) return undefined;
      guess = inner;
      if (isPoint(box)) {
        const first = firstOf(high, inner, range.to, best);
        return first && { bound: first.score, found: first };
      }
      const bound = score(loadAt(space.at(low, inner)));
      if (!bound) return undefined;
      const { from, to } = space.inner({ low: high, high });
      const own = Math.max(inner, from);
      return { bound, found: own <= to ? foundAt(space.at(high, own)) : undefined };
    },
    { incumbent, most: space.patience },
  );
  return { found, proven: proven && resolved && space.rises };
}

/**
 * The size with the most power among those that fit: the same search with the corners changed over.
 *
 * @param fits  whether what a size takes is within the limits
 */
export function mostPowerful(
  space: Space,
  fits: (load: SizedLoad) => boolean,
  incumbent?: Found<Sized>,
): Least<Sized> {
  let guess = 64;
  let resolved = true;
  /** The most powerful of one design's sizes, from the largest down to where none could be better than the best. */
  const mostOf = (outer: readonly number[], from: number, to: number, best: Found<Sized> | undefined) => {
    let most = best;
    for (let inner = to; inner >= from && inner > to - longestWalk; inner -= 1) {
      const at = space.at(outer, inner);
      if (most && !isBetter([-mostPowerAt(at)], most.score)) return most;
      const score = [-powerAt(at)];
      if (!most || isBetter(score, most.score)) most = { score, at };
    }
    resolved &&= from > to - longestWalk;
    return most;
  };

  const { found, proven } = leastInBox<Sized>(
    space.box,
    (box, best) => {
      const { low, high } = box;
      const { from, to } = space.inner(box);
      const tooMany = smallestInteger((n) => !fits(loadAt(space.at(low, n))), { from, to, guess });
      if (tooMany === from) return undefined;
      const most = tooMany === undefined ? to : tooMany - 1;
      guess = most;
      if (isPoint(box)) {
        const first = mostOf(low, from, most, best);
        return first && first !== best ? { bound: first.score, found: first } : undefined;
      }
      const own = space.inner({ low, high: low });
      const at = space.at(low, Math.min(most, own.to));
      return {
        bound: [-mostPowerAt(space.at(high, most))],
        found: most < own.from ? undefined : { score: [-powerAt(at)], at },
      };
    },
    { incumbent, most: space.patience },
  );
  return { found, proven: proven && resolved && space.rises };
}

const isPoint = ({ low, high }: Box) => low.every((from, side) => from === high[side]);
