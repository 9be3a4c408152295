import { ApiPropertyOptional } from '@nestjs/swagger';
import { IsOptional, IsString, Matches, MaxLength } from 'class-validator';

export class ListJournalDto {
  @ApiPropertyOptional({ type: String, description: 'nextCursor of the page before' })
  @IsOptional()
  @Matches(/^\d{1,15}$/, { message: 'cursor must be the nextCursor of an earlier answer' })
  readonly cursor?: string;

  @ApiPropertyOptional({ type: String, description: '1 to 200; 50 when left out' })
  @IsOptional()
  @Matches(/^([1-9]\d?|1\d\d|200)$/, { message: 'limit must be a whole number from 1 to 200' })
  readonly limit?: string;

  @ApiPropertyOptional({
    type: String,
    description: 'Only what was done to this, such as correlations/some-slug',
  })
  @IsOptional()
  @IsString()
  @MaxLength(300)
  readonly subject?: string;
}
