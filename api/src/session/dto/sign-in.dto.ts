import { ApiProperty } from '@nestjs/swagger';
import { IsString, MaxLength, MinLength } from 'class-validator';

export class SignInDto {
  @ApiProperty({ type: String, example: 'engineer@merestone.example' })
  @IsString()
  @MinLength(1)
  @MaxLength(254)
  readonly email!: string;

  @ApiProperty({ type: String, format: 'password' })
  @IsString()
  @MinLength(1)
  @MaxLength(256)
  readonly password!: string;
}
