import {
  COEFFICIENT_BASES,
  PROVISIONAL,
  type CoefficientValue,
  type Conversion,
  type Flux,
  type Numbers,
  type PartOutcome,
  type ResultValue,
  type Step,
  type UsedEquation,
} from '@merestone/engine';
import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import { STANDINGS, type Standing } from '../../common/standing.js';
import { FindingDto } from '../../revisions/dto/finding.dto.js';
import { DeviationDto } from './evaluation-body.dto.js';

const DRIVING = ['concentration', 'partial-pressure', 'mole-fraction'] as const;
const STEP_KINDS = [
  'quantity',
  'property',
  'group',
  'intermediate',
  'result',
  'coefficient',
  'conversion',
  'flux',
] as const;

export class ResultValueDto implements ResultValue {
  @ApiProperty({ type: String })
  readonly symbol!: string;

  @ApiProperty({ type: Number })
  readonly value!: number;

  @ApiProperty({ type: String })
  readonly unit!: string;
}

export class CoefficientValueDto extends ResultValueDto implements CoefficientValue {
  @ApiProperty({ enum: DRIVING })
  readonly basis!: CoefficientValue['basis'];

  @ApiProperty({ enum: ['area', 'volume'] })
  readonly per!: CoefficientValue['per'];

  @ApiProperty({ enum: ['dilute-or-equimolar', 'stagnant-inert', 'drift-free'] })
  readonly rateForm!: CoefficientValue['rateForm'];
}

class ConversionDto implements Conversion {
  @ApiProperty({ enum: COEFFICIENT_BASES })
  readonly basis!: Conversion['basis'];

  @ApiProperty({ type: String })
  readonly symbol!: string;

  @ApiProperty({ type: Number, nullable: true })
  readonly value!: number | null;

  @ApiProperty({ type: String })
  readonly unit!: string;

  @ApiProperty({ type: [String], description: 'What must be known first; empty when there is a value' })
  readonly missing!: string[];

  @ApiPropertyOptional({ type: String })
  readonly assumes?: string;
}

class PartOutcomeDto implements PartOutcome {
  @ApiProperty({ type: String })
  readonly key!: string;

  @ApiProperty({ type: String })
  readonly title!: string;

  @ApiProperty({ type: ResultValueDto })
  readonly result!: ResultValueDto;

  @ApiProperty({ type: CoefficientValueDto, nullable: true })
  readonly coefficient!: CoefficientValueDto | null;

  @ApiProperty({ type: [ConversionDto] })
  readonly conversions!: ConversionDto[];
}

class FluxDto implements Flux {
  @ApiProperty({ type: Number })
  readonly value!: number;

  @ApiProperty({ type: String })
  readonly unit!: string;

  @ApiProperty({ enum: DRIVING })
  readonly basis!: Flux['basis'];

  @ApiProperty({ type: [String] })
  readonly warnings!: string[];
}

class StepDto implements Step {
  @ApiProperty({ enum: STEP_KINDS })
  readonly kind!: Step['kind'];

  @ApiProperty({ type: String })
  readonly symbol!: string;

  @ApiProperty({ type: String })
  readonly symbolTex!: string;

  @ApiProperty({ type: String })
  readonly tex!: string;

  @ApiProperty({ type: String })
  readonly texWithNumbers!: string;

  @ApiProperty({ type: Number })
  readonly value!: number;

  @ApiProperty({ type: String })
  readonly unit!: string;

  @ApiPropertyOptional({ type: String })
  readonly note?: string;
}

class UsedEquationDto implements UsedEquation {
  @ApiProperty({ type: String, description: 'The symbol that was filled' })
  readonly symbol!: string;

  @ApiProperty({ type: String })
  readonly key!: string;

  @ApiProperty({ type: Number })
  readonly value!: number;

  @ApiProperty({ type: String })
  readonly unit!: string;

  @ApiProperty({ type: String })
  readonly title!: string;

  @ApiPropertyOptional({ type: String })
  readonly assumes?: string;
}

class EquationProvenance {
  @ApiProperty({ type: String })
  readonly key!: string;

  @ApiProperty({ type: Number })
  readonly revision!: number;

  @ApiProperty({ type: String })
  readonly hash!: string;
}

/** Everything a kept number rests on. */
export class ProvenanceDto {
  @ApiProperty({ type: String })
  readonly slug!: string;

  @ApiProperty({ type: Number })
  readonly revision!: number;

  @ApiProperty({ type: String })
  readonly hash!: string;

  @ApiProperty({ type: String, description: 'Version of the calculation' })
  readonly engine!: string;

  @ApiProperty({ type: [EquationProvenance] })
  readonly equations!: EquationProvenance[];

  @ApiProperty({ type: 'object', additionalProperties: { type: 'string' } })
  readonly rows!: Record<string, string>;
}

/** A number with all that belongs to it. */
export class EvaluationNumbers implements Numbers {
  @ApiProperty({ type: String, format: 'uuid' })
  readonly id!: string;

  @ApiProperty({ type: String, format: 'date-time' })
  readonly at!: string;

  @ApiProperty({ type: String })
  readonly slug!: string;

  @ApiProperty({ type: Number })
  readonly revision!: number;

  @ApiProperty({ enum: STANDINGS, description: 'Standing of the revision at the time' })
  readonly standing!: Standing;

  @ApiProperty({ type: 'object', additionalProperties: { type: 'number' } })
  readonly groups!: Record<string, number>;

  @ApiProperty({
    type: 'object',
    additionalProperties: {
      type: 'object',
      properties: { value: { type: 'number' }, unit: { type: 'string' } },
      required: ['value', 'unit'],
    },
  })
  readonly intermediates!: Record<string, { value: number; unit: string }>;

  @ApiProperty({ type: ResultValueDto })
  readonly result!: ResultValueDto;

  @ApiProperty({ type: CoefficientValueDto, nullable: true })
  readonly coefficient!: CoefficientValueDto | null;

  @ApiProperty({ type: [ConversionDto] })
  readonly conversions!: ConversionDto[];

  @ApiProperty({ type: [PartOutcomeDto] })
  readonly parts!: PartOutcomeDto[];

  @ApiProperty({ type: FluxDto, nullable: true })
  readonly flux!: FluxDto | null;

  @ApiProperty({ type: [FindingDto] })
  readonly findings!: FindingDto[];

  @ApiProperty({ type: [StepDto] })
  readonly steps!: StepDto[];

  @ApiProperty({ type: [UsedEquationDto] })
  readonly equations!: UsedEquationDto[];

  @ApiProperty({ type: 'object', additionalProperties: { type: 'string' } })
  readonly rows!: Record<string, string>;

  @ApiProperty({ type: [String] })
  readonly remarks!: string[];

  @ApiProperty({ type: ProvenanceDto })
  readonly provenance!: ProvenanceDto;

  @ApiProperty({ type: String })
  readonly caution!: string;
}

export class WithinEvaluation extends EvaluationNumbers {
  @ApiProperty({ enum: ['within'] })
  readonly outcome!: 'within';
}

/** At least one bound could not be checked: none is on record, or its symbol had no value. */
export class UncheckedEvaluation extends EvaluationNumbers {
  @ApiProperty({ enum: ['unchecked'] })
  readonly outcome!: 'unchecked';
}

/** Outside a bound, with a reason. The mark travels with the number. */
export class DeviatingEvaluation extends EvaluationNumbers {
  @ApiProperty({ enum: ['deviating'] })
  readonly outcome!: 'deviating';

  @ApiProperty({ enum: [PROVISIONAL] })
  readonly mark!: typeof PROVISIONAL;

  @ApiProperty({ type: [DeviationDto] })
  readonly deviations!: DeviationDto[];
}

export type EvaluationResponse = WithinEvaluation | UncheckedEvaluation | DeviatingEvaluation;
