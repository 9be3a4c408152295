import { ApiProperty } from '@nestjs/swagger';
import { IsIn, IsUUID, Matches } from 'class-validator';
import { LICENCES, type Licence } from '../../common/attachment.js';
import { RevisionParams } from '../../revisions/dto/revision-params.dto.js';

const LICENCE_MESSAGE = { message: `licence must be one of ${LICENCES.join(', ')}` };

/** The fields beside the file of a multipart body, which come as text. */
export class AttachmentForm {
  @ApiProperty({ type: String, description: 'Index of the source that the document is of' })
  @Matches(/^\d{1,3}$/, { message: 'source must be the index of a source' })
  readonly source!: string;

  @ApiProperty({ enum: LICENCES })
  @IsIn(LICENCES, LICENCE_MESSAGE)
  readonly licence!: Licence;
}

export class LicenceBody {
  @ApiProperty({ enum: LICENCES })
  @IsIn(LICENCES, LICENCE_MESSAGE)
  readonly licence!: Licence;
}

export class AttachmentParams extends RevisionParams {
  @ApiProperty({ type: String, format: 'uuid' })
  @IsUUID(4)
  readonly id!: string;
}
