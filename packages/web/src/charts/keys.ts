/** A marker as a control: its option, its size and all that the size means, in words. */
export interface ChartHandle {
  id: string;
  label: string;
  valueText: string;
  now: number;
  smallest: number;
  largest: number;
  /** How far the page keys go. */
  page: number;
}

/** The size that a key leads to from another; undefined for a key that leads nowhere. */
export function sizeByKey(key: string, { now, smallest, largest, page }: ChartHandle): number | undefined {
  const size = { Home: smallest, End: largest }[key] ?? now + (stepOf(key, page) ?? Number.NaN);
  return Number.isNaN(size) ? undefined : Math.min(largest, Math.max(smallest, size));
}

function stepOf(key: string, page: number): number | undefined {
  switch (key) {
    case 'ArrowRight':
    case 'ArrowUp':
      return 1;
    case 'ArrowLeft':
    case 'ArrowDown':
      return -1;
    case 'PageUp':
      return page;
    case 'PageDown':
      return -page;
    default:
      return undefined;
  }
}
