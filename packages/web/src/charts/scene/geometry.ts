import type { Box, Place } from './marks';

export const overlap = (a: Box, b: Box): boolean =>
  a.x < b.x + b.width && b.x < a.x + a.width && a.y < b.y + b.height && b.y < a.y + a.height;

export const within = (inner: Box, outer: Box): boolean =>
  inner.x >= outer.x &&
  inner.y >= outer.y &&
  inner.x + inner.width <= outer.x + outer.width &&
  inner.y + inner.height <= outer.y + outer.height;

export const contains = (box: Box, [x, y]: Place): boolean =>
  x >= box.x && x <= box.x + box.width && y >= box.y && y <= box.y + box.height;

/**
 * A path seen from afar: its ends and, between them, the middle of what lies within each so many pixels. Where its
 * places are further apart than that, it is the path itself.
 */
export function evened(points: readonly Place[], pixels: number): Place[] {
  const [first, last] = [points[0], points.at(-1)];
  if (!first || !last || points.length < 3) return [...points];
  const groups: Place[][] = [];
  for (const point of points.slice(1, -1)) {
    const group = groups.at(-1);
    if (group && distance(group[0] as Place, point) < pixels) group.push(point);
    else groups.push([point]);
  }
  return [first, ...groups.map(middle), last];
}

export const distance = ([x1, y1]: Place, [x2, y2]: Place): number => Math.hypot(x1 - x2, y1 - y2);

function middle(group: readonly Place[]): Place {
  const sum = group.reduce<Place>(([x, y], place) => [x + place[0], y + place[1]], [0, 0]);
  return [sum[0] / group.length, sum[1] / group.length];
}

/** Whether any stretch of a path runs through a box. */
export function runsThrough(points: readonly Place[], box: Box): boolean {
  for (let end = 1; end < points.length; end += 1) {
    if (crosses(points[end - 1] as Place, points[end] as Place, box)) return true;
  }
  return false;
}

/** Whether a segment has a part in a box: what is left of it between the box's four edges. */
function crosses([x1, y1]: Place, [x2, y2]: Place, { x, y, width, height }: Box): boolean {
  if (Math.max(x1, x2) < x || Math.min(x1, x2) > x + width) return false;
  if (Math.max(y1, y2) < y || Math.min(y1, y2) > y + height) return false;
  let [enters, leaves] = [0, 1];
  for (const [from, step, low, high] of [
    [x1, x2 - x1, x, x + width],
    [y1, y2 - y1, y, y + height],
  ] as const) {
    if (step === 0) continue;
    const [a, b] = [(low - from) / step, (high - from) / step];
    enters = Math.max(enters, Math.min(a, b));
    leaves = Math.min(leaves, Math.max(a, b));
  }
  return enters <= leaves;
}

/** Where on a path a place is nearest to it: the stretch's first point and how far along the stretch. */
export function nearestOn(points: readonly Place[], [x, y]: Place): { index: number; share: number } {
  let nearest = { index: 0, share: 0 };
  let least = Number.POSITIVE_INFINITY;
  for (let index = 0; index < points.length; index += 1) {
    const [x1, y1] = points[index] as Place;
    const [x2, y2] = points[index + 1] ?? [x1, y1];
    const length = (x2 - x1) ** 2 + (y2 - y1) ** 2;
    const share =
      length === 0 ? 0 : Math.min(1, Math.max(0, ((x - x1) * (x2 - x1) + (y - y1) * (y2 - y1)) / length));
    const distance = (x1 + share * (x2 - x1) - x) ** 2 + (y1 + share * (y2 - y1) - y) ** 2;
    if (distance < least) {
      least = distance;
      nearest = { index, share };
    }
  }
  return nearest;
}
