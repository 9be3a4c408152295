import { Clock } from '../../src/common/clock.js';

/** A clock that a test can put forward. It runs on from the real time. */
export class TestClock extends Clock {
  private aheadMs = 0;

  override now(): Date {
    return new Date(Date.now() + this.aheadMs);
  }

  forward(minutes: number): void {
    this.aheadMs += minutes * 60_000;
  }
}
