import { Injectable, Logger, type OnApplicationBootstrap, type OnApplicationShutdown } from '@nestjs/common';
import { Clock } from '../common/clock.js';
import { Writer } from '../database/write.js';
import { backOffMinutes, MOST_TRIES } from './back-off.js';
import { MailRepository, type MailRow } from './mail.repository.js';
import { MailTransport } from './mail-transport.js';

const EVERY_MS = 15_000;
const AT_ONCE = 20;

/** Sends what waits in the outbox, again and again with growing pauses. What waits is in the database. */
@Injectable()
export class MailDelivery implements OnApplicationBootstrap, OnApplicationShutdown {
  private readonly logger = new Logger('Mail');
  private timer: NodeJS.Timeout | undefined;
  private running: Promise<void> | undefined;

  constructor(
    private readonly mails: MailRepository,
    private readonly transport: MailTransport,
    private readonly writer: Writer,
    private readonly clock: Clock,
  ) {}

  onApplicationBootstrap(): void {
    if (!this.transport.connected) return;
    this.timer = setInterval(() => void this.deliverDue(), EVERY_MS);
    this.timer.unref();
    void this.deliverDue();
  }

  async onApplicationShutdown(): Promise<void> {
    clearInterval(this.timer);
    await this.running;
  }

  /** Tries every letter that is due. Runs once at a time. */
  deliverDue(): Promise<void> {
    this.running ??= this.deliverAll().finally(() => {
      this.running = undefined;
    });
    return this.running;
  }

  private async deliverAll(): Promise<void> {
    for (const letter of this.mails.due(this.clock.now().toISOString(), AT_ONCE)) await this.deliver(letter);
  }

  private async deliver(letter: MailRow): Promise<void> {
    const tries = letter.tries + 1;
    try {
      await this.transport.send(letter);
      this.update(letter, (at) => ({ state: 'sent', sentAt: at, tries, nextTryAt: null, lastError: null }));
    } catch (error) {
      const lastError = error instanceof Error ? error.message : String(error);
      this.logger.warn(JSON.stringify({ letter: letter.id, tries, error: lastError }));
      this.update(letter, (at) => ({
        state: tries >= MOST_TRIES ? 'failed' : 'waiting',
        tries,
        nextTryAt: new Date(Date.parse(at) + backOffMinutes(tries) * 60_000).toISOString(),
        lastError,
      }));
    }
  }

  private update(letter: MailRow, values: (at: string) => Partial<Omit<MailRow, 'id'>>): void {
    this.writer.writeUnjournalled('mail-delivery', (tx, at) => {
      this.mails.update(tx, letter.id, values(at));
    });
  }
}
