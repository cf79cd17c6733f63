import { quadtree } from 'd3-quadtree';
import { contains, nearestOn } from './geometry';
import type { Place, Scene } from './marks';

export interface Found {
  id: string;
  size: number;
  at: Place;
}

const reach = 26;

/** Finds the size of an option that a pointer is at, among all that are seen. */
export function finderOf({ curves, plot }: Scene): (at: Place) => Found | undefined {
  const all = curves.flatMap(({ id, sizes, places }) =>
    places.flatMap((at, index): Found[] =>
      contains(plot, at) ? [{ id, size: sizes[index] as number, at }] : [],
    ),
  );
  const tree = quadtree<Found>()
    .x(({ at }) => at[0])
    .y(({ at }) => at[1])
    .addAll(all);
  return ([x, y]) => tree.find(x, y, reach);
}

/** The size at which an option's curve comes nearest to a place: a whole number between the curve's ends. */
export function sizeNear({ curves }: Scene, id: string, place: Place): number | undefined {
  const curve = curves.find((each) => each.id === id);
  if (!curve || curve.places.length === 0) return undefined;
  const { index, share } = nearestOn(curve.places, place);
  const from = curve.sizes[index] as number;
  const to = curve.sizes[index + 1] ?? from;
  return Math.round(from + share * (to - from));
}
