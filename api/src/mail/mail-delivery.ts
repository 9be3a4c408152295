import { Injectable, Logger, type OnApplicationShutdown, type OnModuleInit } from '@nestjs/common';
import { Clock } from '../common/clock.js';
import { Writer } from '../database/write.js';
import { ScheduleService } from '../schedule/schedule.service.js';
import { backOffMinutes, MOST_TRIES } from './back-off.js';
import { isConnectionLost, isRefusedForGood } from './delivery-failure.js';
import { MailRepository, type MailRow } from './mail.repository.js';
import { MailTransport } from './mail-transport.js';

const AT_ONCE = 50;

/**
 * Sends what waits in the outbox: soon after it was written, then again with growing pauses. What waits is in the
 * database, so that a restart loses nothing; at worst a letter is sent twice, when the program ends between the mail
 * server's word and its being written down.
 */
@Injectable()
export class MailDelivery implements OnModuleInit, OnApplicationShutdown {
  private readonly logger = new Logger('Mail');
  private running: Promise<void> | undefined;
  private ending = false;

  constructor(
    private readonly mails: MailRepository,
    private readonly transport: MailTransport,
    private readonly schedule: ScheduleService,
    private readonly writer: Writer,
    private readonly clock: Clock,
  ) {}

  onModuleInit(): void {
    if (this.transport.connected) this.schedule.add({ name: 'mail', run: () => this.deliverDue() });
  }

  async onApplicationShutdown(): Promise<void> {
    this.ending = true;
    await this.running;
  }

  /** Delivers once the transaction at hand is over. */
  soon(): void {
    setImmediate(() => {
      this.deliverDue().catch((error: unknown) => {
        this.logger.error(error instanceof Error ? error.message : String(error));
      });
    });
  }

  /** Tries every letter that is due. Runs once at a time. */
  deliverDue(): Promise<void> {
    if (this.ending) return Promise.resolve();
    this.running ??= this.deliverAll().finally(() => {
      this.running = undefined;
    });
    return this.running;
  }

  private async deliverAll(): Promise<void> {
    for (const letter of this.mails.due(this.clock.now().toISOString(), AT_ONCE)) {
      const goOn = await this.deliver(letter);
      if (!goOn || this.ending) return;
    }
  }

  /** Whether the next letter is worth a try now. */
  private async deliver(letter: MailRow): Promise<boolean> {
    const tries = letter.tries + 1;
    try {
      await this.transport.send(letter);
    } catch (error) {
      const lastError = error instanceof Error ? error.message : String(error);
      const givenUp = tries >= MOST_TRIES || isRefusedForGood(error);
      this.logger.warn(JSON.stringify({ letter: letter.id, tries, givenUp, error: lastError }));
      this.update(letter, (at) =>
        givenUp
          ? { state: 'failed', tries, nextTryAt: null, lastError, link: null }
          : { tries, nextTryAt: later(at, backOffMinutes(tries)), lastError },
      );
      return !isConnectionLost(error);
    }
    this.update(letter, (at) => ({
      state: 'sent',
      sentAt: at,
      tries,
      nextTryAt: null,
      lastError: null,
      link: null,
    }));
    return true;
  }

  private update(letter: MailRow, values: (at: string) => Partial<Omit<MailRow, 'id'>>): void {
    this.writer.writeUnjournalled('mail-delivery', (tx, at) => {
      this.mails.update(tx, letter.id, values(at));
    });
  }
}

function later(at: string, minutes: number): string {
  return new Date(Date.parse(at) + minutes * 60_000).toISOString();
}
