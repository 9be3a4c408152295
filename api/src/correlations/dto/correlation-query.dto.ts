import { ApiPropertyOptional } from '@nestjs/swagger';
import { Type } from 'class-transformer';
import { IsIn, IsInt, IsOptional, IsString, Matches, Max, MaxLength, Min } from 'class-validator';
import { STANDINGS, type Standing } from '../../common/standing.js';

export const PHASES = ['gas', 'liquid', 'gas-or-liquid', 'gas-and-liquid'] as const;
export type Phase = (typeof PHASES)[number];

/** What to look for in the register. */
export class CorrelationQuery {
  @ApiPropertyOptional({
    type: String,
    maxLength: 200,
    description: 'Words; each must occur, the last may be begun',
  })
  @IsOptional()
  @IsString()
  @MaxLength(200)
  readonly q?: string;

  @ApiPropertyOptional({ type: String })
  @IsOptional()
  @IsString()
  @Matches(/^[a-z0-9]+(-[a-z0-9]+)*$/, { message: 'must be the slug of a geometry' })
  @MaxLength(80)
  readonly geometry?: string;

  @ApiPropertyOptional({ enum: PHASES, description: '`gas` and `liquid` also find sheets that serve both' })
  @IsOptional()
  @IsIn(PHASES)
  readonly phase?: Phase;

  @ApiPropertyOptional({ enum: STANDINGS })
  @IsOptional()
  @IsIn(STANDINGS)
  readonly standing?: Standing;

  @ApiPropertyOptional({ type: String, description: '`nextCursor` of the page before' })
  @IsOptional()
  @IsString()
  @MaxLength(600)
  readonly cursor?: string;

  @ApiPropertyOptional({ type: Number, minimum: 1, maximum: 100, default: 50 })
  @IsOptional()
  @Type(() => Number)
  @IsInt()
  @Min(1)
  @Max(100)
  readonly limit?: number;
}
