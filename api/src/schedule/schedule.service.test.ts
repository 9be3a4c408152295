import { Logger } from '@nestjs/common';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { Clock } from '../common/clock.js';
import { ScheduleService } from './schedule.service.js';

class StoppedClock extends Clock {
  override now(): Date {
    return new Date('2026-06-15T12:00:00.000Z');
  }
}

let schedule: ScheduleService;
beforeEach(() => {
  Logger.overrideLogger(false);
  schedule = new ScheduleService(new StoppedClock());
});
afterEach(() => {
  vi.useRealTimers();
});

describe('a tick', () => {
  it('runs every task once, in order, with the time of the clock', async () => {
    const ran: string[] = [];
    for (const name of ['first', 'second']) {
      schedule.add({ name, run: async (at) => void ran.push(`${name} ${at.toISOString()}`) });
    }
    await schedule.tick();
    expect(ran).toEqual(['first 2026-06-15T12:00:00.000Z', 'second 2026-06-15T12:00:00.000Z']);
  });

  it('goes on after a task that fails, now or later', async () => {
    const ran: string[] = [];
    schedule.add({
      name: 'throws',
      run: () => {
        throw new Error('at once');
      },
    });
    schedule.add({ name: 'rejects', run: () => Promise.reject(new Error('later')) });
    schedule.add({ name: 'works', run: () => void ran.push('works') });
    await schedule.tick();
    await schedule.tick();
    expect(ran).toEqual(['works', 'works']);
  });

  it('is not begun a second time while it is under way', async () => {
    let runs = 0;
    let finish: () => void = () => undefined;
    schedule.add({
      name: 'slow',
      run: () =>
        new Promise((resolve) => {
          runs += 1;
          finish = resolve;
        }),
    });
    const first = schedule.tick();
    const second = schedule.tick();
    finish();
    await Promise.all([first, second]);
    expect(runs).toBe(1);
  });

  it('comes at the start and then every minute, until the end', async () => {
    vi.useFakeTimers();
    let runs = 0;
    schedule.add({ name: 'counts', run: () => void (runs += 1) });
    schedule.onApplicationBootstrap();
    await vi.advanceTimersByTimeAsync(0);
    expect(runs).toBe(1);
    await vi.advanceTimersByTimeAsync(120_000);
    expect(runs).toBe(3);
    await schedule.onApplicationShutdown();
    await vi.advanceTimersByTimeAsync(600_000);
    expect(runs).toBe(3);
  });
});
