import {
  COEFFICIENT_BASES,
  type CoefficientBasis,
  type DrivingForce,
  type InputValue,
} from '@merestone/engine';
import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import { Type } from 'class-transformer';
import {
  ArrayMaxSize,
  IsArray,
  IsIn,
  IsInt,
  IsNumber,
  IsObject,
  IsOptional,
  IsString,
  Max,
  MaxLength,
  Min,
  MinLength,
  ValidateNested,
} from 'class-validator';
import { IsInputMap, IsNameMap } from './is-map.js';

const FORCE_KINDS = ['concentration', 'partial-pressure', 'mole-fraction'] as const;

export class InputValueDto implements InputValue {
  @ApiProperty({ type: Number })
  @IsNumber()
  readonly value!: number;

  @ApiPropertyOptional({ type: String, maxLength: 40, description: "The sheet's own unit when left out" })
  @IsOptional()
  @IsString()
  @MinLength(1)
  @MaxLength(40)
  readonly unit?: string;
}

export class DeviationDto {
  @ApiProperty({ type: String, description: 'Symbol of the finding it answers' })
  @IsString()
  @MaxLength(60)
  readonly symbol!: string;

  @ApiProperty({ type: String, minLength: 20, maxLength: 2000 })
  @IsString()
  @MaxLength(2000)
  readonly reason!: string;
}

export class DrivingForceDto implements DrivingForce {
  @ApiProperty({ enum: FORCE_KINDS })
  @IsIn(FORCE_KINDS)
  readonly kind!: DrivingForce['kind'];

  @ApiProperty({ type: InputValueDto })
  @IsObject()
  @ValidateNested()
  @Type(() => InputValueDto)
  readonly interface!: InputValueDto;

  @ApiProperty({ type: InputValueDto })
  @IsObject()
  @ValidateNested()
  @Type(() => InputValueDto)
  readonly bulk!: InputValueDto;
}

const VALUE = { $ref: '#/components/schemas/InputValueDto' };

export class EvaluationBody {
  @ApiPropertyOptional({
    type: Number,
    description: 'The approved one, else the latest the caller may see, when left out',
  })
  @IsOptional()
  @IsInt()
  @Min(1)
  @Max(1_000_000)
  readonly revision?: number;

  @ApiProperty({
    type: 'object',
    additionalProperties: VALUE,
    description: 'Quantities or groups by symbol; `rho.T` for T of the equation that fills rho',
  })
  @IsInputMap()
  readonly inputs!: Record<string, InputValue>;

  @ApiPropertyOptional({
    type: 'object',
    additionalProperties: { type: 'string' },
    description: 'Row by table name',
  })
  @IsOptional()
  @IsNameMap()
  readonly rows?: Record<string, string>;

  @ApiPropertyOptional({
    type: 'object',
    additionalProperties: { type: 'string' },
    description: 'Property equation by the symbol it fills',
  })
  @IsOptional()
  @IsNameMap()
  readonly equations?: Record<string, string>;

  @ApiPropertyOptional({ enum: COEFFICIENT_BASES, isArray: true })
  @IsOptional()
  @IsArray()
  @ArrayMaxSize(COEFFICIENT_BASES.length)
  @IsIn(COEFFICIENT_BASES, { each: true })
  readonly bases?: CoefficientBasis[];

  @ApiPropertyOptional({ type: [DeviationDto] })
  @IsOptional()
  @IsArray()
  @ArrayMaxSize(40)
  @ValidateNested({ each: true })
  @Type(() => DeviationDto)
  readonly deviations?: DeviationDto[];

  @ApiPropertyOptional({ type: DrivingForceDto })
  @IsOptional()
  @IsObject()
  @ValidateNested()
  @Type(() => DrivingForceDto)
  readonly drivingForce?: DrivingForceDto;
}
