import { ApiProperty } from '@nestjs/swagger';
import { Matches } from 'class-validator';
import { Password } from '../../people/dto/person-fields.js';
import type { SessionRow } from '../session.repository.js';

const SHORT = 16;

export class SessionItem {
  @ApiProperty({ type: String, description: 'Names the session; opens nothing' })
  readonly id!: string;

  @ApiProperty({ type: String, format: 'date-time' })
  readonly createdAt!: string;

  @ApiProperty({ type: String, format: 'date-time' })
  readonly lastSeenAt!: string;

  @ApiProperty({ type: String, description: 'What the browser says of itself; anybody can say anything' })
  readonly agent!: string;

  @ApiProperty({ type: Boolean, description: 'The one in use' })
  readonly current!: boolean;
}

export class SessionsResponse {
  @ApiProperty({ type: [SessionItem], description: 'The one used last first' })
  readonly items!: SessionItem[];
}

export class SessionParams {
  @ApiProperty({ type: String })
  @Matches(/^[0-9a-f]{16}$/, { message: 'a session is named by 16 hexadecimal digits' })
  readonly id!: string;
}

export class PasswordChangeDto {
  @Password('The present password')
  readonly current!: string;

  @Password('The new one: 8 to 128 characters, 15 or more are better')
  readonly password!: string;
}

/** A part of the id's hash: enough to tell sessions apart. */
export function shortIdOf(idHash: string): string {
  return idHash.slice(0, SHORT);
}

export function sessionItem(row: SessionRow, current: string): SessionItem {
  return {
    id: shortIdOf(row.idHash),
    createdAt: row.startedAt,
    lastSeenAt: row.seenAt,
    agent: row.agent ?? '',
    current: row.idHash === current,
  };
}
