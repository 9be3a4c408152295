import { Injectable, Logger, type OnApplicationBootstrap, type OnApplicationShutdown } from '@nestjs/common';
import { Clock } from '../common/clock.js';
import type { ScheduledTask } from './scheduled-task.js';

const EVERY_MS = 60_000;

/**
 * Looks after what is due, every minute. Features add their tasks while the program starts (`onModuleInit`); a task
 * that fails is logged and keeps no other from running.
 */
@Injectable()
export class ScheduleService implements OnApplicationBootstrap, OnApplicationShutdown {
  private readonly logger = new Logger('Schedule');
  private readonly tasks: ScheduledTask[] = [];
  private timer: NodeJS.Timeout | undefined;
  private running: Promise<void> | undefined;

  constructor(private readonly clock: Clock) {}

  add(task: ScheduledTask): void {
    this.tasks.push(task);
  }

  onApplicationBootstrap(): void {
    this.timer = setInterval(() => void this.tick(), EVERY_MS);
    this.timer.unref();
    void this.tick();
  }

  async onApplicationShutdown(): Promise<void> {
    clearInterval(this.timer);
    await this.running;
  }

  /** Runs every task once, in the order in which they were added; a tick under way is not begun a second time. */
  tick(): Promise<void> {
    this.running ??= this.runAll(this.clock.now()).finally(() => {
      this.running = undefined;
    });
    return this.running;
  }

  private async runAll(at: Date): Promise<void> {
    for (const task of this.tasks) {
      try {
        await task.run(at);
      } catch (error) {
        this.logger.error(JSON.stringify({ task: task.name, error: describe(error) }));
      }
    }
  }
}

function describe(error: unknown): string {
  return error instanceof Error ? (error.stack ?? error.message) : String(error);
}
