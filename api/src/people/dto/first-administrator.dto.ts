import { ApiProperty } from '@nestjs/swagger';
import { Transform, type TransformFnParams } from 'class-transformer';
import { IsEmail, IsString, MaxLength, MinLength } from 'class-validator';

const SHORTEST_PASSWORD = 12;

function trimmed({ value }: TransformFnParams): unknown {
  return typeof value === 'string' ? value.trim() : value;
}

export class FirstAdministratorBody {
  @ApiProperty({ type: String, description: "The token of the link that the server's terminal shows" })
  @IsString()
  @MaxLength(200)
  readonly token!: string;

  @ApiProperty({ type: String, maxLength: 120 })
  @Transform(trimmed)
  @IsString()
  @MinLength(2)
  @MaxLength(120)
  readonly name!: string;

  @ApiProperty({ type: String, format: 'email' })
  @Transform(trimmed)
  @IsEmail()
  @MaxLength(254)
  readonly email!: string;

  @ApiProperty({ type: String, format: 'password', minLength: SHORTEST_PASSWORD })
  @IsString()
  @MinLength(SHORTEST_PASSWORD)
  @MaxLength(256)
  readonly password!: string;
}
