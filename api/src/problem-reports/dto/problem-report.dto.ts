import { ApiProperty } from '@nestjs/swagger';
import { Transform, Type, type TransformFnParams } from 'class-transformer';
import { IsIn, IsInt, IsString, Max, MaxLength, Min, MinLength } from 'class-validator';
import {
  REPORT_OUTCOMES,
  REPORT_SEVERITIES,
  type ReportOutcome,
  type ReportSeverity,
} from '../../common/problem-report.js';
import { NamedPerson } from '../../revisions/dto/named-person.dto.js';

const SHORTEST_TEXT = 10;
const LONGEST_TEXT = 4000;

function trimmed({ value }: TransformFnParams): unknown {
  return typeof value === 'string' ? value.trim() : value;
}

export class CorrelationParams {
  @ApiProperty({ type: String })
  @MaxLength(200)
  readonly slug!: string;
}

export class ProblemReportParams {
  @ApiProperty({ type: Number, minimum: 1 })
  @Type(() => Number)
  @IsInt()
  @Min(1)
  @Max(Number.MAX_SAFE_INTEGER)
  readonly id!: number;
}

export class ProblemReportBody {
  @ApiProperty({ type: Number, minimum: 1, description: 'Number of the revision it is about' })
  @IsInt()
  @Min(1)
  @Max(1_000_000)
  readonly revision!: number;

  @ApiProperty({ type: String, minLength: SHORTEST_TEXT, maxLength: LONGEST_TEXT })
  @Transform(trimmed)
  @IsString()
  @MinLength(SHORTEST_TEXT)
  @MaxLength(LONGEST_TEXT)
  readonly text!: string;

  @ApiProperty({ enum: REPORT_SEVERITIES })
  @IsIn(REPORT_SEVERITIES)
  readonly severity!: ReportSeverity;
}

export class ProblemReportAnswerBody {
  @ApiProperty({ type: String, minLength: SHORTEST_TEXT, maxLength: LONGEST_TEXT })
  @Transform(trimmed)
  @IsString()
  @MinLength(SHORTEST_TEXT)
  @MaxLength(LONGEST_TEXT)
  readonly text!: string;

  @ApiProperty({ enum: REPORT_OUTCOMES })
  @IsIn(REPORT_OUTCOMES)
  readonly outcome!: ReportOutcome;
}

export class ProblemReportAnswer {
  @ApiProperty({ enum: REPORT_OUTCOMES })
  readonly outcome!: ReportOutcome;

  @ApiProperty({ type: String })
  readonly text!: string;

  @ApiProperty({ type: NamedPerson })
  readonly by!: NamedPerson;

  @ApiProperty({ type: String, format: 'date-time' })
  readonly at!: string;
}

export class ProblemReportAbilities {
  @ApiProperty({ type: Boolean })
  readonly answer!: boolean;
}

export class ProblemReport {
  @ApiProperty({ type: Number })
  readonly id!: number;

  @ApiProperty({ type: String })
  readonly slug!: string;

  @ApiProperty({ type: Number })
  readonly revision!: number;

  @ApiProperty({ type: String, description: 'The content it speaks of' })
  readonly hash!: string;

  @ApiProperty({ enum: REPORT_SEVERITIES })
  readonly severity!: ReportSeverity;

  @ApiProperty({ type: String })
  readonly text!: string;

  @ApiProperty({ type: NamedPerson })
  readonly by!: NamedPerson;

  @ApiProperty({ type: String, format: 'date-time' })
  readonly at!: string;

  @ApiProperty({ type: ProblemReportAnswer, nullable: true, description: 'Null while it is open' })
  readonly answer!: ProblemReportAnswer | null;

  @ApiProperty({ type: ProblemReportAbilities })
  readonly abilities!: ProblemReportAbilities;
}

export class ProblemReportsResponse {
  @ApiProperty({ type: [ProblemReport] })
  readonly items!: ProblemReport[];
}
