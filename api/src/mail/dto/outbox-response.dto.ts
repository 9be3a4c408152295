import { ApiProperty } from '@nestjs/swagger';
import { wholeText } from '../letter.js';
import type { MailRow } from '../mail.repository.js';

const STATES = ['local', 'waiting', 'sent', 'failed'] as const;

export class OutboxItem {
  @ApiProperty({ type: String })
  readonly id!: string;

  @ApiProperty({ type: String })
  readonly to!: string;

  @ApiProperty({ type: String })
  readonly subject!: string;

  @ApiProperty({
    type: String,
    description: 'A link that lets somebody in is shown only where there is no mail server to send it',
  })
  readonly body!: string;

  @ApiProperty({ type: String, format: 'date-time' })
  readonly at!: string;

  @ApiProperty({ enum: STATES, description: 'local: there is no mail server, it is read here' })
  readonly state!: (typeof STATES)[number];

  @ApiProperty({ type: Number })
  readonly tries!: number;

  @ApiProperty({ type: String, nullable: true })
  readonly lastError!: string | null;
}

export class OutboxResponse {
  @ApiProperty({ type: [OutboxItem], description: 'The latest first' })
  readonly items!: OutboxItem[];
}

export function outboxResponse(rows: readonly MailRow[]): OutboxResponse {
  return {
    items: rows.map((row) => ({
      id: row.id,
      to: row.to,
      subject: row.subject,
      body: row.state === 'local' ? wholeText(row) : row.body,
      at: row.writtenAt,
      state: row.state,
      tries: row.tries,
      lastError: row.lastError,
    })),
  };
}
