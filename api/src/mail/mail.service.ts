import { randomUUID } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import type { Tx } from '../database/connection.js';
import { assertAddress, oneLine, type Letter } from './letter.js';
import { MailDelivery } from './mail-delivery.js';
import { MailRepository } from './mail.repository.js';
import { MailTransport } from './mail-transport.js';

/** Writes letters. They are kept in the database first, so that none is lost with a connection or a restart. */
@Injectable()
export class MailService {
  constructor(
    private readonly mails: MailRepository,
    private readonly transport: MailTransport,
    private readonly delivery: MailDelivery,
  ) {}

  /** Puts a letter into the outbox, in the transaction of the act that it tells of. */
  post(tx: Tx, at: string, { to, subject, body, link = null }: Letter): void {
    assertAddress(to);
    const waits = this.transport.connected;
    this.mails.insert(tx, {
      id: randomUUID(),
      to,
      subject: oneLine(subject),
      body,
      link,
      writtenAt: at,
      state: waits ? 'waiting' : 'local',
      nextTryAt: waits ? at : null,
    });
    if (waits) this.delivery.soon();
  }
}
