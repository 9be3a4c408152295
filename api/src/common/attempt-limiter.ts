import { Injectable } from '@nestjs/common';
import { Clock } from './clock.js';
import { ApiProblem } from './problem.js';

export interface AttemptLimit {
  /** What is counted, such as `email:somebody@office.example`. */
  readonly key: string;
  readonly limit: number;
  readonly windowSeconds: number;
}

interface Counter {
  count: number;
  readonly until: number;
}

/** An attempt under way. It stays counted unless it succeeds. */
export interface Attempt {
  succeed(): void;
}

/** Counts failing attempts, so that nobody can guess for long. In memory: a restart forgets. */
@Injectable()
export class AttemptLimiter {
  private readonly counters = new Map<string, Counter>();

  constructor(private readonly clock: Clock) {}

  /** Counts the attempt under every key. Throws `too-many-requests` when one of them has reached its limit. */
  begin(limits: readonly AttemptLimit[]): Attempt {
    const now = this.clock.now().getTime();
    this.forgetOld(now);
    for (const { key, limit } of limits) {
      const counter = this.counters.get(key);
      if (counter === undefined || counter.count < limit) continue;
      const retryAfterSeconds = Math.ceil((counter.until - now) / 1000);
      throw new ApiProblem(
        'too-many-requests',
        `There were too many attempts. Try again in ${retryAfterSeconds} seconds.`,
        { retryAfterSeconds },
      );
    }
    const counted = limits.map(({ key, windowSeconds }) => this.count(key, now + windowSeconds * 1000));
    return {
      succeed: () => {
        for (const counter of counted) counter.count -= 1;
      },
    };
  }

  private count(key: string, until: number): Counter {
    const counter = this.counters.get(key) ?? { count: 0, until };
    counter.count += 1;
    this.counters.set(key, counter);
    return counter;
  }

  private forgetOld(now: number): void {
    for (const [key, { until }] of this.counters) if (until <= now) this.counters.delete(key);
  }
}
