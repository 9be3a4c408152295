import type { InputValue } from '@merestone/engine';
import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import { IsIn, IsOptional, IsString, Matches, MaxLength } from 'class-validator';
import { IsInputMap } from '../../evaluations/dto/is-map.js';

const PHASES = ['gas', 'liquid'] as const;

/** A duty: the geometry and what is known, by names of the quantity dictionary. */
export class CandidatesBody {
  @ApiProperty({ type: String })
  @IsString()
  @MaxLength(80)
  @Matches(/^[a-z0-9]+(-[a-z0-9]+)*$/, { message: 'must be the slug of a geometry' })
  readonly geometry!: string;

  @ApiPropertyOptional({ enum: PHASES })
  @IsOptional()
  @IsIn(PHASES)
  readonly phase?: (typeof PHASES)[number];

  @ApiProperty({
    type: 'object',
    additionalProperties: { $ref: '#/components/schemas/InputValueDto' },
    description: "By dictionary name, such as `gas-density`; without a unit in the dictionary's own",
  })
  @IsInputMap('names')
  readonly inputs!: Record<string, InputValue>;
}
