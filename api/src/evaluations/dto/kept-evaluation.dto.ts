import type { EvaluationRequest } from '@merestone/engine';
import { ApiExtraModels, ApiProperty, getSchemaPath } from '@nestjs/swagger';
import { NamedPerson } from '../../revisions/dto/named-person.dto.js';
import { EvaluationBody } from './evaluation-body.dto.js';
import {
  DeviatingEvaluation,
  UncheckedEvaluation,
  WithinEvaluation,
  type EvaluationResponse,
} from './evaluation-response.dto.js';

/** The outcome tells which one it is. */
export const EVALUATION_SCHEMA = {
  oneOf: [
    { $ref: getSchemaPath(WithinEvaluation) },
    { $ref: getSchemaPath(UncheckedEvaluation) },
    { $ref: getSchemaPath(DeviatingEvaluation) },
  ],
  discriminator: {
    propertyName: 'outcome',
    mapping: {
      within: getSchemaPath(WithinEvaluation),
      unchecked: getSchemaPath(UncheckedEvaluation),
      deviating: getSchemaPath(DeviatingEvaluation),
    },
  },
};

@ApiExtraModels(WithinEvaluation, UncheckedEvaluation, DeviatingEvaluation)
export class KeptEvaluation {
  @ApiProperty({ type: String, format: 'uuid' })
  readonly id!: string;

  @ApiProperty({ type: String, format: 'date-time' })
  readonly at!: string;

  @ApiProperty({ type: NamedPerson })
  readonly person!: NamedPerson;

  @ApiProperty({ type: EvaluationBody, description: 'What was asked' })
  readonly request!: EvaluationRequest;

  @ApiProperty(EVALUATION_SCHEMA)
  readonly evaluation!: EvaluationResponse;
}
