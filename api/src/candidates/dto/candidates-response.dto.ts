import { ApiProperty } from '@nestjs/swagger';
import { STANDINGS, type Standing } from '../../common/standing.js';
import { CoefficientValueDto, ResultValueDto } from '../../evaluations/dto/evaluation-response.dto.js';
import { FindingDto } from '../../revisions/dto/finding.dto.js';

export const CANDIDATE_OUTCOMES = ['within', 'unchecked', 'refused', 'incomplete'] as const;
export type CandidateOutcome = (typeof CANDIDATE_OUTCOMES)[number];

export class Candidate {
  @ApiProperty({ type: String })
  readonly slug!: string;

  @ApiProperty({ type: String })
  readonly title!: string;

  @ApiProperty({ type: Number })
  readonly revision!: number;

  @ApiProperty({ enum: STANDINGS })
  readonly standing!: Standing;

  @ApiProperty({ type: Boolean, description: 'False: for comparison only, the revision is not in use' })
  readonly inUse!: boolean;

  @ApiProperty({ enum: CANDIDATE_OUTCOMES })
  readonly outcome!: CandidateOutcome;

  @ApiProperty({ type: ResultValueDto, nullable: true })
  readonly result!: ResultValueDto | null;

  @ApiProperty({ type: CoefficientValueDto, nullable: true })
  readonly coefficient!: CoefficientValueDto | null;

  @ApiProperty({ type: [FindingDto] })
  readonly findings!: FindingDto[];

  @ApiProperty({
    type: Number,
    nullable: true,
    description: 'Of a refusal: how many times past the worst bound',
  })
  readonly farthest!: number | null;

  @ApiProperty({ type: [String], description: 'Dictionary names of what it still needs' })
  readonly missing!: string[];

  @ApiProperty({ type: [String], description: 'Why the values given cannot be used, in sentences' })
  readonly problems!: string[];
}

export class CandidatesResponse {
  @ApiProperty({
    type: [Candidate],
    description: 'Ranked: within, near a bound, unchecked, refused, incomplete',
  })
  readonly items!: Candidate[];

  @ApiProperty({ type: String })
  readonly caution!: string;
}
