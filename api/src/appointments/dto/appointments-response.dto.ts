import { ApiProperty } from '@nestjs/swagger';
import { APPOINTMENT_STATES, type AppointmentState } from '../appointment.policy.js';

export class AppointmentPerson {
  @ApiProperty({ type: String })
  readonly id!: string;

  @ApiProperty({ type: String })
  readonly name!: string;
}

export class AppointmentStep {
  @ApiProperty({ type: String, format: 'date-time' })
  readonly at!: string;

  @ApiProperty({ type: AppointmentPerson })
  readonly by!: AppointmentPerson;
}

export class AppointmentAbilities {
  @ApiProperty({ type: Boolean })
  readonly confirm!: boolean;

  @ApiProperty({ type: Boolean })
  readonly end!: boolean;
}

export class AppointmentItem {
  @ApiProperty({ type: String })
  readonly id!: string;

  @ApiProperty({ type: AppointmentPerson })
  readonly person!: AppointmentPerson;

  @ApiProperty({
    oneOf: [
      { type: 'string', enum: ['all'] },
      { type: 'array', items: { type: 'string' } },
    ],
    description: 'Slugs of geometries; all: every one, and property equations too',
  })
  readonly geometries!: 'all' | string[];

  @ApiProperty({ type: String, format: 'date', description: 'Last day, UTC' })
  readonly until!: string;

  @ApiProperty({ enum: APPOINTMENT_STATES })
  readonly state!: AppointmentState;

  @ApiProperty({ type: AppointmentStep })
  readonly proposed!: AppointmentStep;

  @ApiProperty({ type: AppointmentStep, nullable: true })
  readonly confirmed!: AppointmentStep | null;

  @ApiProperty({ type: AppointmentStep, nullable: true })
  readonly ended!: AppointmentStep | null;

  @ApiProperty({ type: String, nullable: true })
  readonly endReason!: string | null;

  @ApiProperty({ type: AppointmentAbilities, description: 'What the caller may do with it now' })
  readonly abilities!: AppointmentAbilities;
}

export class AppointmentsResponse {
  @ApiProperty({ type: [AppointmentItem], description: 'The latest proposal first' })
  readonly items!: AppointmentItem[];
}
