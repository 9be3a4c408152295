import { ApiProperty } from '@nestjs/swagger';

export class GeometryEntry {
  @ApiProperty({ type: String })
  readonly slug!: string;

  @ApiProperty({ type: String })
  readonly name!: string;

  @ApiProperty({ type: String })
  readonly summary!: string;

  @ApiProperty({
    type: String,
    description: 'The length that correlations of this geometry are usually put on',
  })
  readonly characteristicLength!: string;

  @ApiProperty({ type: String })
  readonly velocity!: string;

  @ApiProperty({ type: [String] })
  readonly cautions!: string[];

  @ApiProperty({ type: Number, description: 'Correlations that the caller may see' })
  readonly total!: number;

  @ApiProperty({ type: Number, description: 'Those of them with an approved revision' })
  readonly approved!: number;
}

export class GeometriesResponse {
  @ApiProperty({ type: [GeometryEntry] })
  readonly items!: GeometryEntry[];
}
