import { applyDecorators } from '@nestjs/common';
import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import { Type } from 'class-transformer';
import { IsBoolean, IsObject, IsOptional, Matches, ValidateIf, ValidateNested } from 'class-validator';
import type { NoticeKind } from '../../common/notice-kinds.js';

export class ListNoticesDto {
  @ApiPropertyOptional({ type: String, description: 'nextCursor of the page before' })
  @IsOptional()
  @Matches(/^\d{1,15}$/, { message: 'cursor must be the nextCursor of an earlier answer' })
  readonly cursor?: string;

  @ApiPropertyOptional({ type: String, description: '1 to 200; 50 when left out' })
  @IsOptional()
  @Matches(/^([1-9]\d?|1\d\d|200)$/, { message: 'limit must be a whole number from 1 to 200' })
  readonly limit?: string;
}

export class NoticeParams {
  @ApiProperty({ type: String })
  @Matches(/^\d{1,15}$/, { message: 'a notice is named by its number' })
  readonly id!: string;
}

const Choice = () =>
  applyDecorators(
    ApiPropertyOptional({ type: Boolean, description: 'Left out, it stays as it is' }),
    ValidateIf((_: object, value: unknown) => value !== undefined),
    IsBoolean(),
  );

/** Which kinds come by mail. */
export class MailChoices implements Partial<Record<NoticeKind, boolean>> {
  @Choice()
  readonly 'review-asked'?: boolean;

  @Choice()
  readonly comment?: boolean;

  @Choice()
  readonly verdict?: boolean;

  @Choice()
  readonly approval?: boolean;

  @Choice()
  readonly withdrawal?: boolean;

  @Choice()
  readonly reminder?: boolean;

  @Choice()
  readonly appointment?: boolean;

  @Choice()
  readonly report?: boolean;
}

export class NoticeChoicesDto {
  @ApiProperty({ type: MailChoices })
  @IsObject()
  @ValidateNested()
  @Type(() => MailChoices)
  readonly mail!: MailChoices;
}
