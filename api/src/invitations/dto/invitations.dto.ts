import { ApiProperty } from '@nestjs/swagger';
import { ArrayMinSize } from 'class-validator';
import type { Role } from '../../common/roles.js';
import { EmailAddress, Password, PersonName, RoleList } from '../../people/dto/person-fields.js';

export class InvitationDto {
  @PersonName()
  readonly name!: string;

  @EmailAddress()
  readonly email!: string;

  @RoleList()
  @ArrayMinSize(1)
  readonly roles!: Role[];
}

export class AcceptanceDto {
  @Password('8 to 128 characters, 15 or more are better')
  readonly password!: string;

  /** Only the first administrator says who they are. */
  @PersonName({ optional: true })
  readonly name?: string;

  @EmailAddress({ optional: true })
  readonly email?: string;
}

export class InvitationResponse {
  @ApiProperty({ type: String, nullable: true, description: 'null: the first administrator says so' })
  readonly name!: string | null;

  @ApiProperty({ type: String, nullable: true, description: 'null: the first administrator says so' })
  readonly email!: string | null;
}

export class JoinedResponse {
  @ApiProperty({ type: String })
  readonly name!: string;

  @ApiProperty({ type: String, description: 'The address to sign in with' })
  readonly email!: string;
}
