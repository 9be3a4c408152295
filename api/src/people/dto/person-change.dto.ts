import type { Role } from '../../common/roles.js';
import { PersonName, Reason, RoleList } from './person-fields.js';

export class PersonChangeDto {
  @PersonName({ optional: true })
  readonly name?: string;

  @RoleList({ optional: true })
  readonly roles?: Role[];
}

export class ReasonDto {
  @Reason()
  readonly reason!: string;
}
