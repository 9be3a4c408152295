import { ApiProperty } from '@nestjs/swagger';
import {
  ACTIVE_CONTENT,
  LICENCES,
  MEDIA_TYPES,
  type ActiveContent,
  type Licence,
  type MediaType,
} from '../../common/attachment.js';
import { NamedPerson } from '../../revisions/dto/named-person.dto.js';

export class AttachmentItem {
  @ApiProperty({ type: String })
  readonly id!: string;

  @ApiProperty({
    type: Number,
    nullable: true,
    description:
      'Index of the source that it was attached to, as the sources stand now; null when cited no more',
  })
  readonly source!: number | null;

  @ApiProperty({ type: String, nullable: true, description: 'That source as it was cited then' })
  readonly citation!: string | null;

  @ApiProperty({ type: String })
  readonly name!: string;

  @ApiProperty({ enum: MEDIA_TYPES, description: 'Told from the content' })
  readonly mediaType!: MediaType;

  @ApiProperty({ type: Number, description: 'Bytes' })
  readonly size!: number;

  @ApiProperty({ type: String, description: 'SHA-256 of the bytes, hex' })
  readonly sha256!: string;

  @ApiProperty({
    enum: LICENCES,
    description: 'Whether it may leave the office, in an evidence pack for one',
  })
  readonly licence!: Licence;

  @ApiProperty({ enum: ACTIVE_CONTENT, isArray: true, description: 'What of it would act when opened' })
  readonly activeContent!: ActiveContent[];

  @ApiProperty({ type: String, format: 'date-time' })
  readonly at!: string;

  @ApiProperty({ type: NamedPerson })
  readonly by!: NamedPerson;
}

export class AttachmentAbilities {
  @ApiProperty({ type: Boolean })
  readonly add!: boolean;
}

export class AttachmentsResponse {
  @ApiProperty({ type: [AttachmentItem], description: 'The oldest first' })
  readonly items!: AttachmentItem[];

  @ApiProperty({ type: AttachmentAbilities })
  readonly abilities!: AttachmentAbilities;
}
