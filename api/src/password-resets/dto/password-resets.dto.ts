import { ApiProperty } from '@nestjs/swagger';
import { IsString, MaxLength, MinLength } from 'class-validator';
import { Password } from '../../people/dto/person-fields.js';

/** Any text is taken for an address: what is none belongs to nobody, and the answer does not say so. */
export class ResetRequestDto {
  @ApiProperty({ type: String })
  @IsString()
  @MinLength(1)
  @MaxLength(254)
  readonly email!: string;
}

export class ResetDto {
  @Password('8 to 128 characters, 15 or more are better')
  readonly password!: string;
}

export class ResetAskedResponse {
  @ApiProperty({ type: String, description: 'The same for every address' })
  readonly message!: string;
}

export const RESET_ASKED: ResetAskedResponse = {
  message: 'If somebody here has this address, a letter is on its way there. Its link holds for an hour.',
};
