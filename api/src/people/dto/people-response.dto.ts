import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import { ROLES, type Role } from '../../common/roles.js';
import { hasJoined, type Person } from '../person.js';

const MANAGED = 'Only for administrators';

export class PersonEntry {
  @ApiProperty({ type: String })
  readonly id!: string;

  @ApiProperty({ type: String })
  readonly name!: string;

  @ApiProperty({ enum: ROLES, isArray: true })
  readonly roles!: Role[];

  @ApiPropertyOptional({ type: String, description: MANAGED })
  readonly email?: string;

  @ApiPropertyOptional({ type: Boolean, description: MANAGED })
  readonly active?: boolean;

  @ApiPropertyOptional({ type: Boolean, description: `${MANAGED}: was invited and has not joined yet` })
  readonly invited?: boolean;

  @ApiPropertyOptional({ type: String, format: 'date-time', nullable: true, description: MANAGED })
  readonly lastSignIn?: string | null;
}

export class PeopleResponse {
  @ApiProperty({ type: [PersonEntry] })
  readonly items!: PersonEntry[];
}

/** A person as administrators see them. */
export class ManagedPerson {
  @ApiProperty({ type: String })
  readonly id!: string;

  @ApiProperty({ type: String })
  readonly name!: string;

  @ApiProperty({ type: String })
  readonly email!: string;

  @ApiProperty({ enum: ROLES, isArray: true })
  readonly roles!: Role[];

  @ApiProperty({ type: Boolean })
  readonly active!: boolean;

  @ApiProperty({ type: Boolean, description: 'Was invited and has not joined yet' })
  readonly invited!: boolean;

  @ApiProperty({ type: String, format: 'date-time', nullable: true })
  readonly lastSignIn!: string | null;
}

export function peopleResponse(people: readonly Person[]): PeopleResponse {
  return { items: people.map(({ id, name, roles }) => ({ id, name, roles: [...roles] })) };
}

export function managedPerson(person: Person, lastSignIn: string | null): ManagedPerson {
  const { id, name, email, roles, active } = person;
  return { id, name, email, roles: [...roles], active, invited: !hasJoined(person), lastSignIn };
}
