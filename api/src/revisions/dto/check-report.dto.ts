import type { CheckedValue, CheckReport, Problem } from '@merestone/engine';
import { ApiProperty } from '@nestjs/swagger';
import { FindingDto } from './finding.dto.js';

class CheckedValueDto implements CheckedValue {
  @ApiProperty({ type: String })
  readonly symbol!: string;

  @ApiProperty({ type: Number })
  readonly expected!: number;

  @ApiProperty({ type: Number, nullable: true })
  readonly found!: number | null;

  @ApiProperty({ type: Number, nullable: true })
  readonly deviationPercent!: number | null;

  @ApiProperty({ type: String })
  readonly unit!: string;

  @ApiProperty({ type: Boolean })
  readonly passed!: boolean;
}

class CheckProblemDto implements Problem {
  @ApiProperty({ type: String })
  readonly code!: Problem['code'];

  @ApiProperty({ type: String })
  readonly field!: string;

  @ApiProperty({ type: String })
  readonly message!: string;
}

/** What became of one worked check. */
export class CheckReportDto implements CheckReport {
  @ApiProperty({ type: String })
  readonly title!: string;

  @ApiProperty({ enum: ['published', 'computed'] })
  readonly kind!: CheckReport['kind'];

  @ApiProperty({ type: String, nullable: true })
  readonly source!: string | null;

  @ApiProperty({ type: String, nullable: true })
  readonly note!: string | null;

  @ApiProperty({ type: Number })
  readonly tolerancePercent!: number;

  @ApiProperty({ type: Boolean })
  readonly passed!: boolean;

  @ApiProperty({ type: [CheckedValueDto] })
  readonly values!: CheckedValueDto[];

  @ApiProperty({ type: [FindingDto] })
  readonly findings!: FindingDto[];

  @ApiProperty({ type: [CheckProblemDto] })
  readonly problems!: CheckProblemDto[];
}
