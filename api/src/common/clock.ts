/** The time, injected, so that expiry can be tested without waiting. */
export class Clock {
  now(): Date {
    return new Date();
  }
}
