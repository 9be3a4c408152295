import { Injectable } from '@nestjs/common';
import { outboxResponse, type OutboxResponse } from './dto/outbox-response.dto.js';
import { MailRepository } from './mail.repository.js';

const SHOWN = 200;

/** The latest letters, for the administrator. */
@Injectable()
export class OutboxService {
  constructor(private readonly mails: MailRepository) {}

  list(): OutboxResponse {
    return outboxResponse(this.mails.latest(SHOWN));
  }
}
