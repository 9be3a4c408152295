import { randomUUID } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import type { Tx } from '../database/connection.js';
import { MailRepository } from './mail.repository.js';
import { MailTransport, type Letter } from './mail-transport.js';

/** Writes letters. They are kept in the database first, so that none is lost with a connection or a restart. */
@Injectable()
export class MailService {
  constructor(
    private readonly mails: MailRepository,
    private readonly transport: MailTransport,
  ) {}

  /** Puts a letter into the outbox, in the transaction of the act that it tells of. */
  post(tx: Tx, at: string, { to, subject, body }: Letter): void {
    const waits = this.transport.connected;
    this.mails.insert(tx, {
      id: randomUUID(),
      to,
      subject: subject.replaceAll(/\s+/g, ' '),
      body,
      writtenAt: at,
      state: waits ? 'waiting' : 'local',
      nextTryAt: waits ? at : null,
    });
  }
}
