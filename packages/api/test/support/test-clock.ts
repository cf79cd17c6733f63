import { Clock } from '../../src/common/clock.js';

export const minute = 60_000;
export const day = 24 * 60 * minute;

/** A clock that moves when it is told to. */
export class TestClock extends Clock {
  private time = new Date('2026-03-02T09:00:00Z');

  advance(milliseconds: number): void {
    this.time = new Date(this.time.getTime() + milliseconds);
  }

  protected override current(): Date {
    return this.time;
  }
}
