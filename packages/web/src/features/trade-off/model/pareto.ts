/**
 * Those of many that no other beats on two counts, of which less is better: ties stay. One pass through them in
 * order, as a picture has thousands of sizes.
 */
export function frontOfPairs<Item>(
  items: readonly Item[],
  burdenOf: (item: Item) => readonly [number, number],
): Set<Item> {
  const sorted = items.map((item) => ({ item, burden: burdenOf(item) }));
  sorted.sort((a, b) => a.burden[0] - b.burden[0] || a.burden[1] - b.burden[1]);
  const front = new Set<Item>();
  let [least, at] = [Number.POSITIVE_INFINITY, Number.NaN];
  for (const { item, burden } of sorted) {
    const tied = burden[1] === least && burden[0] === at;
    if (burden[1] < least || tied) {
      front.add(item);
      [at, least] = burden;
    }
  }
  return front;
}
