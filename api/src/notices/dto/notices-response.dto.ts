import { ApiProperty } from '@nestjs/swagger';
import { NOTICE_KINDS, type NoticeKind } from '../../common/notice-kinds.js';
import type { NoticeRow } from '../notice.repository.js';

export class NoticeItem {
  @ApiProperty({ type: Number })
  readonly id!: number;

  @ApiProperty({ enum: NOTICE_KINDS })
  readonly kind!: NoticeKind;

  @ApiProperty({ type: String })
  readonly text!: string;

  @ApiProperty({ type: String, description: 'A path in the screens' })
  readonly href!: string;

  @ApiProperty({ type: String, format: 'date-time' })
  readonly at!: string;

  @ApiProperty({ type: Boolean })
  readonly read!: boolean;
}

export class NoticesResponse {
  @ApiProperty({ type: [NoticeItem], description: 'The latest first' })
  readonly items!: NoticeItem[];

  @ApiProperty({ type: Number })
  readonly unread!: number;

  @ApiProperty({ type: String, nullable: true })
  readonly nextCursor!: string | null;
}

export class NoticeChoices {
  @ApiProperty({
    type: 'object',
    properties: Object.fromEntries(NOTICE_KINDS.map((kind) => [kind, { type: 'boolean' }])),
    required: [...NOTICE_KINDS],
    selfRequired: true,
    description: 'Which kinds come by mail, too',
  })
  readonly mail!: Record<NoticeKind, boolean>;
}

export function noticeItem({ id, kind, text, href, at, readAt }: NoticeRow): NoticeItem {
  return { id, kind, text, href, at, read: readAt !== null };
}
