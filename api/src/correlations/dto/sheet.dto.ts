import type { CorrelationDefinition, PropertyEquationDefinition } from '@merestone/engine';
import { ApiProperty } from '@nestjs/swagger';
import { STANDINGS, WITHDRAWAL_CLASSES, type Standing, type WithdrawalClass } from '../../common/standing.js';
import { VERDICTS, type Verdict } from '../../common/verdict.js';
import { CheckReportDto } from '../../revisions/dto/check-report.dto.js';
import {
  CORRELATION_DEFINITION,
  PROPERTY_EQUATION_DEFINITION,
} from '../../revisions/dto/definition-schema.js';
import { InspectionSummary } from '../../revisions/dto/inspection.dto.js';
import { NamedPerson } from '../../revisions/dto/named-person.dto.js';

class SheetRevision {
  @ApiProperty({ type: Number })
  readonly number!: number;

  @ApiProperty({ enum: STANDINGS })
  readonly standing!: Standing;

  @ApiProperty({ type: String })
  readonly hash!: string;

  @ApiProperty({ type: String, format: 'date-time', description: 'When it got this standing' })
  readonly at!: string;
}

class SheetHistoryEntry {
  @ApiProperty({ enum: STANDINGS })
  readonly standing!: Standing;

  @ApiProperty({ type: String, format: 'date-time' })
  readonly at!: string;

  @ApiProperty({ type: NamedPerson })
  readonly by!: NamedPerson;

  @ApiProperty({ type: String, nullable: true })
  readonly note!: string | null;

  @ApiProperty({ enum: WITHDRAWAL_CLASSES, nullable: true, type: String, description: 'Of a withdrawal' })
  readonly class!: WithdrawalClass | null;
}

class SheetReview {
  @ApiProperty({ type: NamedPerson })
  readonly reviewer!: NamedPerson;

  @ApiProperty({ enum: VERDICTS })
  readonly verdict!: Verdict;

  @ApiProperty({ type: String, format: 'date-time' })
  readonly at!: string;

  @ApiProperty({ type: String, nullable: true })
  readonly note!: string | null;

  @ApiProperty({ type: String, description: 'The content it speaks of' })
  readonly hash!: string;

  @ApiProperty({ type: Boolean, description: 'Whether it speaks of the present content' })
  readonly current!: boolean;
}

class SheetComment {
  @ApiProperty({ type: Number })
  readonly id!: number;

  @ApiProperty({ type: String, description: 'Path in the definition; empty for the whole' })
  readonly field!: string;

  @ApiProperty({ type: String })
  readonly text!: string;

  @ApiProperty({ type: NamedPerson })
  readonly by!: NamedPerson;

  @ApiProperty({ type: String, format: 'date-time' })
  readonly at!: string;

  @ApiProperty({ type: String })
  readonly hash!: string;
}

class SheetApproval {
  @ApiProperty({ type: NamedPerson })
  readonly by!: NamedPerson;

  @ApiProperty({ type: String, format: 'date-time' })
  readonly at!: string;

  @ApiProperty({ type: String, description: 'What the signature means, in words' })
  readonly meaning!: string;

  @ApiProperty({ type: String, description: 'The content that was signed' })
  readonly hash!: string;
}

class SheetSuccessor {
  @ApiProperty({ type: String })
  readonly slug!: string;

  @ApiProperty({ type: Number })
  readonly revision!: number;

  @ApiProperty({ type: String })
  readonly title!: string;
}

class SheetWithdrawal {
  @ApiProperty({ type: String })
  readonly reason!: string;

  @ApiProperty({ enum: WITHDRAWAL_CLASSES })
  readonly class!: WithdrawalClass;

  @ApiProperty({ type: NamedPerson })
  readonly by!: NamedPerson;

  @ApiProperty({ type: String, format: 'date-time' })
  readonly at!: string;
}

class SheetSuspension {
  @ApiProperty({ type: String })
  readonly reason!: string;

  @ApiProperty({ type: NamedPerson })
  readonly by!: NamedPerson;

  @ApiProperty({ type: String, format: 'date-time' })
  readonly at!: string;

  @ApiProperty({ type: Number, nullable: true, description: 'The problem report that is being looked into' })
  readonly problemReport!: number | null;
}

class SheetUsage {
  @ApiProperty({ type: Number })
  readonly evaluations!: number;

  @ApiProperty({ type: Number })
  readonly calculations!: number;
}

class SheetEquation {
  @ApiProperty({ type: String })
  readonly slug!: string;

  @ApiProperty({ type: Number })
  readonly revision!: number;

  @ApiProperty({ type: String })
  readonly hash!: string;

  @ApiProperty(PROPERTY_EQUATION_DEFINITION)
  readonly definition!: PropertyEquationDefinition;
}

export class SheetAbilities {
  @ApiProperty({ type: Boolean })
  readonly evaluate!: boolean;

  @ApiProperty({ type: Boolean })
  readonly edit!: boolean;

  @ApiProperty({ type: Boolean })
  readonly submit!: boolean;

  @ApiProperty({ type: Boolean })
  readonly comment!: boolean;

  @ApiProperty({ type: Boolean })
  readonly review!: boolean;

  @ApiProperty({ type: Boolean })
  readonly approve!: boolean;

  @ApiProperty({ type: Boolean })
  readonly decline!: boolean;

  @ApiProperty({ type: Boolean })
  readonly suspend!: boolean;

  @ApiProperty({ type: Boolean })
  readonly reinstate!: boolean;

  @ApiProperty({ type: Boolean })
  readonly withdraw!: boolean;
}

/** A revision of a correlation with all that the office knows about it. */
export class Sheet {
  @ApiProperty({ type: String })
  readonly slug!: string;

  @ApiProperty({ type: String })
  readonly title!: string;

  @ApiProperty({ type: String })
  readonly geometry!: string;

  @ApiProperty({ type: String })
  readonly geometryName!: string;

  @ApiProperty({ enum: STANDINGS })
  readonly standing!: Standing;

  @ApiProperty({ type: Number })
  readonly revision!: number;

  @ApiProperty({ type: Number })
  readonly iteration!: number;

  @ApiProperty({ type: String, description: 'SHA-256 of the RFC 8785 text of the definition; also the ETag' })
  readonly hash!: string;

  @ApiProperty(CORRELATION_DEFINITION)
  readonly definition!: CorrelationDefinition;

  @ApiProperty({ type: NamedPerson })
  readonly originator!: NamedPerson;

  @ApiProperty({ type: [SheetRevision], description: 'Those that the caller may see' })
  readonly revisions!: SheetRevision[];

  @ApiProperty({ type: [SheetHistoryEntry] })
  readonly history!: SheetHistoryEntry[];

  @ApiProperty({ type: [SheetReview] })
  readonly reviews!: SheetReview[];

  @ApiProperty({ type: [SheetComment] })
  readonly comments!: SheetComment[];

  @ApiProperty({ type: SheetApproval, nullable: true })
  readonly approval!: SheetApproval | null;

  @ApiProperty({ type: [CheckReportDto] })
  readonly checks!: CheckReportDto[];

  @ApiProperty({ type: String, nullable: true, description: 'Why it is not approved' })
  readonly standingNote!: string | null;

  @ApiProperty({ type: SheetUsage })
  readonly usage!: SheetUsage;

  @ApiProperty({
    type: [SheetEquation],
    description: 'Every property equation the sheet lists, and those they need',
  })
  readonly equations!: SheetEquation[];

  @ApiProperty({ type: SheetAbilities, description: 'What the caller may do with this revision now' })
  readonly abilities!: SheetAbilities;

  @ApiProperty({
    type: String,
    format: 'date-time',
    nullable: true,
    description: 'From when on its approval holds',
  })
  readonly effectiveFrom!: string | null;

  @ApiProperty({
    type: String,
    format: 'date-time',
    nullable: true,
    description: 'When it is to be looked at again',
  })
  readonly reviewDue!: string | null;

  @ApiProperty({
    type: Boolean,
    description: 'Approved, and neither before its effective date nor superseded',
  })
  readonly inForce!: boolean;

  @ApiProperty({ type: SheetSuccessor, nullable: true, description: 'What to turn to instead' })
  readonly successor!: SheetSuccessor | null;

  @ApiProperty({ type: SheetWithdrawal, nullable: true })
  readonly withdrawal!: SheetWithdrawal | null;

  @ApiProperty({ type: SheetSuspension, nullable: true })
  readonly suspension!: SheetSuspension | null;

  @ApiProperty({ type: Number, description: 'Problem reports on this revision that nobody answered yet' })
  readonly openReports!: number;

  @ApiProperty({ type: InspectionSummary, nullable: true, description: 'Of the last machine check' })
  readonly inspection!: InspectionSummary | null;

  @ApiProperty({ type: String })
  readonly caution!: string;
}
