import type { CorrelationDefinition } from '@merestone/engine';
import { ApiProperty } from '@nestjs/swagger';
import { Type } from 'class-transformer';
import { IsInt, Max, Min } from 'class-validator';
import { CORRELATION_DEFINITION } from '../../revisions/dto/definition-schema.js';
import { DifferenceDto } from '../../revisions/dto/difference.dto.js';

const MOST = 1_000_000;

export class DifferencesQuery {
  @ApiProperty({ type: Number, minimum: 1 })
  @Type(() => Number)
  @IsInt()
  @Min(1)
  @Max(MOST)
  readonly from!: number;

  @ApiProperty({ type: Number, minimum: 1 })
  @Type(() => Number)
  @IsInt()
  @Min(1)
  @Max(MOST)
  readonly to!: number;
}

export class ComparedRevision {
  @ApiProperty({ type: Number })
  readonly revision!: number;

  @ApiProperty({ type: String })
  readonly hash!: string;
}

export class DifferencesResponse {
  @ApiProperty({ type: ComparedRevision })
  readonly from!: ComparedRevision;

  @ApiProperty({ type: ComparedRevision })
  readonly to!: ComparedRevision;

  @ApiProperty({ type: [DifferenceDto] })
  readonly differences!: DifferenceDto[];

  @ApiProperty(CORRELATION_DEFINITION)
  readonly before!: CorrelationDefinition;

  @ApiProperty(CORRELATION_DEFINITION)
  readonly after!: CorrelationDefinition;
}
