import type { Finding } from '@merestone/engine';
import { ApiProperty } from '@nestjs/swagger';

const KINDS = ['within', 'near', 'outside', 'past-reach', 'between', 'unchecked'] as const;
export const NATURES = ['data', 'regime', 'definition', 'physical'] as const;
export const BASES_OF_BOUNDS = ['stated', 'handbook', 'common-practice', 'none'] as const;

/** A value held against its bound. */
export class FindingDto implements Finding {
  @ApiProperty({
    type: String,
    description: 'Symbol on the sheet; `rho.T` for T of the equation that fills rho',
  })
  readonly symbol!: string;

  @ApiProperty({ enum: KINDS })
  readonly kind!: Finding['kind'];

  @ApiProperty({ type: Number, nullable: true })
  readonly value!: number | null;

  @ApiProperty({ type: String })
  readonly unit!: string;

  @ApiProperty({ type: Number, nullable: true })
  readonly lo!: number | null;

  @ApiProperty({ type: Number, nullable: true })
  readonly hi!: number | null;

  @ApiProperty({ type: Boolean })
  readonly loClosed!: boolean;

  @ApiProperty({ type: Boolean })
  readonly hiClosed!: boolean;

  @ApiProperty({ enum: NATURES, nullable: true, type: String })
  readonly nature!: Finding['nature'];

  @ApiProperty({ enum: BASES_OF_BOUNDS })
  readonly basis!: Finding['basis'];

  @ApiProperty({
    type: Number,
    nullable: true,
    description: 'Value over the upper limit, or lower limit over value',
  })
  readonly ratio!: number | null;

  @ApiProperty({ type: Boolean, description: 'Whether a reasoned deviation may be recorded' })
  readonly deviable!: boolean;

  @ApiProperty({ type: [String], description: 'Sheets named as holding on the other side' })
  readonly beyond!: string[];

  @ApiProperty({ type: String })
  readonly message!: string;
}
