import { ApiProperty } from '@nestjs/swagger';
import { IsInt, IsString, Max, MaxLength, Min, ValidateIf } from 'class-validator';
import { PersonName } from '../../people/dto/person-fields.js';

export class Principal {
  @ApiProperty({ type: String })
  readonly id!: string;

  @ApiProperty({ type: String })
  readonly name!: string;
}

export class SettingsResponse {
  @ApiProperty({ type: String })
  readonly officeName!: string;

  @ApiProperty({ type: Number, description: 'How many favourable reviews an approval rests on' })
  readonly reviewsNeeded!: number;

  @ApiProperty({
    type: Principal,
    nullable: true,
    description: 'Who confirms appointments besides the technical authorities',
  })
  readonly principal!: Principal | null;

  @ApiProperty({ type: Number, description: 'Months after which an approved revision is due for review' })
  readonly reviewDueMonths!: number;
}

export class SettingsDto {
  @PersonName()
  readonly officeName!: string;

  @ApiProperty({ type: Number, minimum: 1, maximum: 5 })
  @IsInt()
  @Min(1)
  @Max(5)
  readonly reviewsNeeded!: number;

  @ApiProperty({ type: String, nullable: true, description: "A person's id; null for nobody" })
  @ValidateIf((_: object, value: unknown) => value !== null)
  @IsString()
  @MaxLength(60)
  readonly principal!: string | null;

  @ApiProperty({ type: Number, minimum: 1, maximum: 120 })
  @IsInt()
  @Min(1)
  @Max(120)
  readonly reviewDueMonths!: number;
}
