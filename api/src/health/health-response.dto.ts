import { ApiProperty } from '@nestjs/swagger';

export class HealthResponse {
  @ApiProperty({ enum: ['ok'] })
  readonly status!: 'ok';

  @ApiProperty({ type: String })
  readonly version!: string;

  @ApiProperty({ type: String })
  readonly revision!: string;

  @ApiProperty({ type: Boolean, description: 'Whether office and people are invented' })
  readonly demo!: boolean;
}
