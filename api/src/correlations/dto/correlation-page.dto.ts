import type { Bound, CorrelationDefinition, Stretch } from '@merestone/engine';
import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import { STANDINGS, type Standing } from '../../common/standing.js';
import { BASES_OF_BOUNDS, NATURES } from '../../revisions/dto/finding.dto.js';
import { PHASES } from './correlation-query.dto.js';

class BoundEndDto {
  @ApiProperty({ type: Number })
  readonly value!: number;

  @ApiProperty({ enum: NATURES })
  readonly nature!: (typeof NATURES)[number];

  @ApiPropertyOptional({ type: Boolean, default: true })
  readonly closed?: boolean;

  @ApiPropertyOptional({ type: Number })
  readonly reach?: number;

  @ApiPropertyOptional({ type: [String] })
  readonly beyond?: string[];
}

class StretchDto implements Stretch {
  @ApiPropertyOptional({ type: BoundEndDto })
  readonly lo?: BoundEndDto;

  @ApiPropertyOptional({ type: BoundEndDto })
  readonly hi?: BoundEndDto;
}

export class ListedBound {
  @ApiProperty({ type: String })
  readonly symbol!: string;

  @ApiProperty({ type: String })
  readonly name!: string;

  @ApiProperty({ type: String })
  readonly unit!: string;

  @ApiProperty({ enum: BASES_OF_BOUNDS })
  readonly basis!: Bound['basis'];

  @ApiProperty({ type: [StretchDto] })
  readonly stretches!: StretchDto[];
}

export class ListedCorrelation {
  @ApiProperty({ type: String })
  readonly slug!: string;

  @ApiProperty({ type: String })
  readonly title!: string;

  @ApiProperty({ type: [String] })
  readonly authors!: string[];

  @ApiProperty({ type: Number, nullable: true })
  readonly year!: number | null;

  @ApiProperty({ type: String })
  readonly geometry!: string;

  @ApiProperty({ type: String })
  readonly geometryName!: string;

  @ApiProperty({ enum: PHASES })
  readonly phase!: CorrelationDefinition['phase'];

  @ApiProperty({ enum: STANDINGS })
  readonly standing!: Standing;

  @ApiProperty({ type: Number })
  readonly revision!: number;

  @ApiProperty({ type: String })
  readonly summary!: string;

  @ApiProperty({ enum: ['published-example', 'expression-seen', 'from-memory'] })
  readonly verification!: CorrelationDefinition['verification']['status'];

  @ApiProperty({ type: [ListedBound] })
  readonly bounds!: ListedBound[];
}

export class FacetCount {
  @ApiProperty({ type: String })
  readonly value!: string;

  @ApiProperty({ type: String })
  readonly label!: string;

  @ApiProperty({ type: Number })
  readonly count!: number;
}

export class CorrelationFacets {
  @ApiProperty({ type: [FacetCount] })
  readonly geometry!: FacetCount[];

  @ApiProperty({ type: [FacetCount] })
  readonly phase!: FacetCount[];

  @ApiProperty({ type: [FacetCount] })
  readonly standing!: FacetCount[];
}

export class CorrelationPage {
  @ApiProperty({ type: [ListedCorrelation] })
  readonly items!: ListedCorrelation[];

  @ApiProperty({ type: String, nullable: true })
  readonly nextCursor!: string | null;

  @ApiProperty({ type: Number })
  readonly total!: number;

  @ApiProperty({ type: CorrelationFacets, description: 'Each counted without the filter on itself' })
  readonly facets!: CorrelationFacets;
}
