import type { Found, Score } from '../numeric/branch-and-bound.js';
import { smallestInteger } from '../numeric/integer-search.js';
import { largestCount } from '../request.js';
import { leastReaching, mostPowerful } from './searches.js';
import { loadAt, powerAt, type Sized, type SizedLoad, type Space } from './space.js';
import { startingShape } from './starting-shape.js';

/** The best size that reaches the power in the proportions of the closed forms. */
export function startReaching(
  space: Space,
  power: number,
  score: (load: SizedLoad) => Score | undefined,
): Found<Sized> | undefined {
  const along = alongShape(space);
  const units = smallestInteger((count) => powerAt(along(count).at) >= power, {
    from: space.fewestUnits,
    to: largestCount,
  });
  if (units === undefined) return undefined;
  return leastReaching(along(units).space, power, score).found;
}

/** The most powerful size that fits in the proportions of the closed forms. */
export function startFitting(space: Space, fits: (load: SizedLoad) => boolean): Found<Sized> | undefined {
  const along = alongShape(space);
  const tooMany = smallestInteger((count) => !fits(loadAt(along(count).at)), {
    from: space.fewestUnits,
    to: largestCount,
  });
  if (tooMany === undefined || tooMany === space.fewestUnits) return undefined;
  return mostPowerful(along(tooMany - 1).space, fits).found;
}

/** Designs of one shape, and the space narrowed to each. */
function alongShape(space: Space): (units: number) => { at: Sized; space: Space } {
  const shape = space.box.low.length === 0 ? {} : startingShape(space);
  return (units) => {
    const { outer, inner } = space.near(units, shape);
    return { at: space.at(outer, inner), space: { ...space, box: { low: outer, high: outer } } };
  };
}
