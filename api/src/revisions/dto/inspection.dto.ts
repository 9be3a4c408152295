import {
  INSPECTION_TOPICS,
  type InspectionReport,
  type InspectionTopic,
  type Remark,
} from '@merestone/engine';
import { ApiProperty } from '@nestjs/swagger';
import { CheckReportDto } from './check-report.dto.js';

export class RemarkDto implements Remark {
  @ApiProperty({ enum: ['passed', 'warning', 'error'] })
  readonly verdict!: Remark['verdict'];

  @ApiProperty({ enum: INSPECTION_TOPICS })
  readonly topic!: InspectionTopic;

  @ApiProperty({ type: String, description: 'Path in the definition; empty for the whole' })
  readonly field!: string;

  @ApiProperty({ type: String })
  readonly message!: string;
}

/** What the machine found on a submitted sheet. Errors stop a submission, warnings travel along. */
export class InspectionReportDto implements InspectionReport {
  @ApiProperty({ type: Boolean })
  readonly passed!: boolean;

  @ApiProperty({ type: [RemarkDto] })
  readonly remarks!: RemarkDto[];

  @ApiProperty({ type: [CheckReportDto] })
  readonly checks!: CheckReportDto[];
}

export class InspectionSummary {
  @ApiProperty({ type: Boolean })
  readonly passed!: boolean;

  @ApiProperty({ type: Number })
  readonly warnings!: number;

  @ApiProperty({ type: Number })
  readonly errors!: number;
}
