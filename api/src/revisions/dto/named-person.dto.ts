import { ApiProperty } from '@nestjs/swagger';

export class NamedPerson {
  @ApiProperty({ type: String })
  readonly id!: string;

  @ApiProperty({ type: String })
  readonly name!: string;
}
