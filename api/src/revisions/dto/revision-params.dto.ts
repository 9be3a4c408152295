import { ApiProperty } from '@nestjs/swagger';
import { Type } from 'class-transformer';
import { IsInt, Max, MaxLength, Min } from 'class-validator';

/** A slug and a revision's number, as in the path. An unknown slug is not found; a number that is none is malformed. */
export class RevisionParams {
  @ApiProperty({ type: String })
  @MaxLength(200)
  readonly slug!: string;

  @ApiProperty({ type: Number, minimum: 1 })
  @Type(() => Number)
  @IsInt()
  @Min(1)
  @Max(1_000_000)
  readonly number!: number;
}
