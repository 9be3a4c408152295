import { ApiProperty } from '@nestjs/swagger';
import { PERMISSIONS, permissionsOf, type Permission } from '../../common/permissions.js';
import { ROLES, type Role } from '../../common/roles.js';
import type { Person } from '../../people/person.js';

export class SignedInPerson {
  @ApiProperty({ type: String })
  readonly id!: string;

  @ApiProperty({ type: String })
  readonly name!: string;

  @ApiProperty({ type: String })
  readonly email!: string;

  @ApiProperty({ enum: ROLES, isArray: true })
  readonly roles!: Role[];
}

export class SessionResponse {
  @ApiProperty({ type: SignedInPerson })
  readonly person!: SignedInPerson;

  @ApiProperty({
    enum: PERMISSIONS,
    isArray: true,
    description: 'What the roles allow, without regard to an object',
  })
  readonly permissions!: Permission[];
}

export class DemoPerson {
  @ApiProperty({ type: String })
  readonly name!: string;

  @ApiProperty({ type: String })
  readonly email!: string;

  @ApiProperty({ enum: ROLES, isArray: true })
  readonly roles!: Role[];
}

export class DemoPeopleResponse {
  @ApiProperty({ type: [DemoPerson] })
  readonly items!: DemoPerson[];

  @ApiProperty({ type: String, description: 'The password of all of them' })
  readonly password!: string;
}

export function sessionResponse({ id, name, email, roles }: Person): SessionResponse {
  return { person: { id, name, email, roles: [...roles] }, permissions: permissionsOf(roles) };
}

export function demoPeopleResponse(people: readonly Person[], password: string): DemoPeopleResponse {
  return { items: people.map(({ name, email, roles }) => ({ name, email, roles: [...roles] })), password };
}
