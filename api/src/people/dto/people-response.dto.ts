import { ApiProperty } from '@nestjs/swagger';
import { ROLES, type Role } from '../../common/roles.js';
import type { Person } from '../person.js';

export class PersonEntry {
  @ApiProperty({ type: String })
  readonly id!: string;

  @ApiProperty({ type: String })
  readonly name!: string;

  @ApiProperty({ enum: ROLES, isArray: true })
  readonly roles!: Role[];
}

export class PeopleResponse {
  @ApiProperty({ type: [PersonEntry] })
  readonly items!: PersonEntry[];
}

export function peopleResponse(people: readonly Person[]): PeopleResponse {
  return { items: people.map(({ id, name, roles }) => ({ id, name, roles: [...roles] })) };
}
