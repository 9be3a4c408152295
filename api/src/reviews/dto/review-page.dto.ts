import type { CorrelationDefinition } from '@merestone/engine';
import { ApiProperty } from '@nestjs/swagger';
import { STANDINGS, type Standing } from '../../common/standing.js';
import { VERDICTS, type Verdict } from '../../common/verdict.js';
import { CORRELATION_DEFINITION } from '../../revisions/dto/definition-schema.js';
import { DifferenceDto } from '../../revisions/dto/difference.dto.js';
import { InspectionReportDto } from '../../revisions/dto/inspection.dto.js';
import { NamedPerson } from '../../revisions/dto/named-person.dto.js';
import { ChecklistDto } from './review-bodies.dto.js';

export class ReviewAssignmentItem {
  @ApiProperty({ type: NamedPerson })
  readonly reviewer!: NamedPerson;

  @ApiProperty({ enum: ['named', 'taken'], description: 'Asked on submission, or came by themselves' })
  readonly how!: 'named' | 'taken';

  @ApiProperty({ type: String, format: 'date-time' })
  readonly at!: string;
}

export class ReviewVerdict {
  @ApiProperty({ type: NamedPerson })
  readonly reviewer!: NamedPerson;

  @ApiProperty({ enum: VERDICTS })
  readonly verdict!: Verdict;

  @ApiProperty({ type: ChecklistDto })
  readonly checklist!: ChecklistDto;

  @ApiProperty({ type: String, nullable: true })
  readonly note!: string | null;

  @ApiProperty({ type: String, format: 'date-time' })
  readonly at!: string;

  @ApiProperty({ type: Number })
  readonly iteration!: number;

  @ApiProperty({ type: String })
  readonly hash!: string;

  @ApiProperty({ type: Boolean, description: 'Whether it speaks of the present iteration; else it is void' })
  readonly current!: boolean;
}

export class CommentAnswer {
  @ApiProperty({ type: Number })
  readonly id!: number;

  @ApiProperty({ type: String })
  readonly text!: string;

  @ApiProperty({ type: NamedPerson })
  readonly by!: NamedPerson;

  @ApiProperty({ type: String, format: 'date-time' })
  readonly at!: string;
}

export class CommentResolution {
  @ApiProperty({ type: NamedPerson })
  readonly by!: NamedPerson;

  @ApiProperty({ type: String, format: 'date-time' })
  readonly at!: string;
}

export class CommentAbilities {
  @ApiProperty({ type: Boolean })
  readonly answer!: boolean;

  @ApiProperty({ type: Boolean })
  readonly resolve!: boolean;
}

export class ReviewComment {
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

  @ApiProperty({ type: Number, description: 'The iteration it was made on' })
  readonly iteration!: number;

  @ApiProperty({ type: CommentResolution, nullable: true })
  readonly resolved!: CommentResolution | null;

  @ApiProperty({ type: [CommentAnswer] })
  readonly answers!: CommentAnswer[];

  @ApiProperty({ type: CommentAbilities })
  readonly abilities!: CommentAbilities;
}

export class ReviewRound {
  @ApiProperty({ type: Number })
  readonly round!: number;

  @ApiProperty({ type: Number })
  readonly iteration!: number;

  @ApiProperty({ type: String, format: 'date-time' })
  readonly at!: string;

  @ApiProperty({ type: String, nullable: true })
  readonly note!: string | null;

  @ApiProperty({ type: NamedPerson })
  readonly by!: NamedPerson;
}

export class ReviewIteration {
  @ApiProperty({ type: Number })
  readonly number!: number;

  @ApiProperty({ type: String, format: 'date-time' })
  readonly at!: string;

  @ApiProperty({ type: String })
  readonly hash!: string;

  @ApiProperty({ type: [DifferenceDto], description: 'To the one before in this list' })
  readonly differences!: DifferenceDto[];
}

export class ReviewAbilities {
  @ApiProperty({ type: Boolean })
  readonly take!: boolean;

  @ApiProperty({ type: Boolean })
  readonly comment!: boolean;

  @ApiProperty({ type: Boolean, description: 'At least one of the comments' })
  readonly resolve!: boolean;

  @ApiProperty({ type: Boolean })
  readonly verdict!: boolean;

  @ApiProperty({ type: Boolean, description: 'Say that it is ready again' })
  readonly putForward!: boolean;

  @ApiProperty({ type: Boolean })
  readonly approve!: boolean;

  @ApiProperty({ type: Boolean })
  readonly decline!: boolean;

  @ApiProperty({ type: Boolean })
  readonly edit!: boolean;

  @ApiProperty({ type: Boolean })
  readonly suspend!: boolean;

  @ApiProperty({ type: Boolean })
  readonly reinstate!: boolean;

  @ApiProperty({ type: Boolean })
  readonly withdraw!: boolean;
}

export class ReviewCount {
  @ApiProperty({ type: Number, description: 'Favourable reviews of the present iteration' })
  readonly favourable!: number;

  @ApiProperty({ type: Number })
  readonly needed!: number;
}

/** Everything that belongs to the review of one revision. */
export class ReviewPage {
  @ApiProperty({ type: String })
  readonly slug!: string;

  @ApiProperty({ type: String })
  readonly title!: string;

  @ApiProperty({ type: Number })
  readonly revision!: number;

  @ApiProperty({ type: Number })
  readonly iteration!: number;

  @ApiProperty({ type: String })
  readonly hash!: string;

  @ApiProperty({ enum: STANDINGS })
  readonly standing!: Standing;

  @ApiProperty({ type: NamedPerson })
  readonly originator!: NamedPerson;

  @ApiProperty({ enum: ['originator', 'reviewers'], description: 'Whose turn it is' })
  readonly hands!: 'originator' | 'reviewers';

  @ApiProperty(CORRELATION_DEFINITION)
  readonly definition!: CorrelationDefinition;

  @ApiProperty({
    type: InspectionReportDto,
    nullable: true,
    description: 'What the machine found when it was last put forward',
  })
  readonly inspection!: InspectionReportDto | null;

  @ApiProperty({
    type: Number,
    description: "Favourable reviews that an approval rests on, by the office's settings",
  })
  readonly reviewersNeeded!: number;

  @ApiProperty({ type: [ReviewAssignmentItem] })
  readonly assignments!: ReviewAssignmentItem[];

  @ApiProperty({ type: [ReviewVerdict], description: 'Current and void ones, in the order given' })
  readonly verdicts!: ReviewVerdict[];

  @ApiProperty({ type: [ReviewComment] })
  readonly comments!: ReviewComment[];

  @ApiProperty({ type: [ReviewRound], description: 'Each time it was put forward' })
  readonly rounds!: ReviewRound[];

  @ApiProperty({
    type: [ReviewIteration],
    description: 'What reviewers had before them, and the present content',
  })
  readonly iterations!: ReviewIteration[];

  @ApiProperty({ type: ReviewAbilities })
  readonly abilities!: ReviewAbilities;

  @ApiProperty({ type: ReviewCount })
  readonly approvals!: ReviewCount;
}
