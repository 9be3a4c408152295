import { ApiProperty } from '@nestjs/swagger';

/** How much was brought in. */
export class ImportedRegister {
  @ApiProperty({ type: Number })
  readonly geometries!: number;

  @ApiProperty({ type: Number })
  readonly correlations!: number;

  @ApiProperty({ type: Number })
  readonly propertyEquations!: number;

  @ApiProperty({ type: Number })
  readonly revisions!: number;

  @ApiProperty({ type: Number, description: 'Entries of the journals that came along' })
  readonly journalEntries!: number;
}
