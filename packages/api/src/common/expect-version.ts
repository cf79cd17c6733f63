import { stale } from './problem.js';

/** Refuses a change made to another version than the one at hand; null stands for "there is none yet". */
export function expectVersion(current: { version: number } | null, expected: number | null): void {
  if ((current?.version ?? null) !== expected) throw stale();
}
