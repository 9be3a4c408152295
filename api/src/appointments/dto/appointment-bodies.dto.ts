import { ApiProperty } from '@nestjs/swagger';
import { IsString, Matches, MaxLength, Validate, ValidatorConstraint } from 'class-validator';
import type { ValidatorConstraintInterface } from 'class-validator';
import { Password, Reason } from '../../people/dto/person-fields.js';

const MOST_GEOMETRIES = 200;

/** 'all', or a list of slugs, each once. Whether there are such geometries is for the service to say. */
@ValidatorConstraint({ name: 'scope' })
export class IsScope implements ValidatorConstraintInterface {
  validate(value: unknown): boolean {
    if (value === 'all') return true;
    return (
      Array.isArray(value) &&
      value.length >= 1 &&
      value.length <= MOST_GEOMETRIES &&
      new Set(value).size === value.length &&
      value.every((one) => typeof one === 'string' && one.length <= 100)
    );
  }

  defaultMessage(): string {
    return "geometries must be 'all' or a list of at least one slug, each once";
  }
}

/** A day that exists, as YYYY-MM-DD. */
@ValidatorConstraint({ name: 'day' })
export class IsDay implements ValidatorConstraintInterface {
  validate(value: unknown): boolean {
    if (typeof value !== 'string' || !/^\d{4}-\d{2}-\d{2}$/.test(value)) return false;
    const time = Date.parse(`${value}T00:00:00Z`);
    return !Number.isNaN(time) && new Date(time).toISOString().startsWith(value);
  }

  defaultMessage(): string {
    return 'until must be a day as YYYY-MM-DD';
  }
}

export class ProposalDto {
  @ApiProperty({ type: String, description: "The person's id" })
  @IsString()
  @MaxLength(60)
  readonly person!: string;

  @ApiProperty({
    oneOf: [
      { type: 'string', enum: ['all'] },
      { type: 'array', items: { type: 'string' }, minItems: 1, maxItems: MOST_GEOMETRIES },
    ],
    description: 'Slugs of geometries; all: every one, and property equations too',
  })
  @Validate(IsScope)
  readonly geometries!: 'all' | string[];

  @ApiProperty({ type: String, format: 'date', description: 'Last day, UTC' })
  @Validate(IsDay)
  readonly until!: string;
}

export class ConfirmationDto {
  @Password("The caller's own password, once more")
  readonly password!: string;
}

export class EndDto {
  @Reason()
  readonly reason!: string;
}

export class AppointmentParams {
  @ApiProperty({ type: String })
  @Matches(/^[\w-]{1,60}$/, { message: 'an appointment is named by its id' })
  readonly id!: string;
}
