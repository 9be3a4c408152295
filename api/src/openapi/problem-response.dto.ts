import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import { InspectionReportDto } from '../revisions/dto/inspection.dto.js';

export class FieldProblemResponse {
  @ApiProperty({ type: String, description: 'Path in the request, such as inputs.u.value' })
  readonly field!: string;

  @ApiProperty({ type: String })
  readonly code!: string;

  @ApiProperty({ type: String })
  readonly message!: string;
}

export class AlternativeResponse {
  @ApiProperty({ type: String })
  readonly slug!: string;

  @ApiProperty({ type: String })
  readonly title!: string;

  @ApiProperty({ type: String })
  readonly geometry!: string;
}

/** How every refusal looks (RFC 9457). */
export class ProblemResponse {
  @ApiProperty({ type: String, example: 'urn:merestone:problem:out-of-bounds' })
  readonly type!: string;

  @ApiProperty({ type: String })
  readonly title!: string;

  @ApiProperty({ type: Number })
  readonly status!: number;

  @ApiProperty({ type: String, description: 'What is so and what to do' })
  readonly detail!: string;

  @ApiPropertyOptional({ type: String, description: 'Names one unexpected failure in the log' })
  readonly instance?: string;

  @ApiPropertyOptional({ type: [FieldProblemResponse] })
  readonly fields?: FieldProblemResponse[];

  @ApiPropertyOptional({ type: 'array', items: { type: 'object', additionalProperties: true } })
  readonly findings?: object[];

  @ApiPropertyOptional({ type: [AlternativeResponse] })
  readonly alternatives?: AlternativeResponse[];

  @ApiPropertyOptional({ type: InspectionReportDto, description: 'Of a submission that the machine stopped' })
  readonly inspection?: InspectionReportDto;
}
