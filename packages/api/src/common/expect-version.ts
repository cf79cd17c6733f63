import { stale } from './problem.js';

/**
 * Refuses a change made to another version than the one at hand, with a view of that one; null stands for
 * “there is none yet”.
 */
export function expectVersion<T extends { version: number }>(
  current: T | null,
  expected: number | null,
  view: (current: T) => unknown,
): void {
  if ((current?.version ?? null) !== expected) throw stale(current && view(current));
}
