import type { CorrelationDefinition } from '@merestone/engine';
import { ApiProperty } from '@nestjs/swagger';
import { IsString, Matches, MaxLength } from 'class-validator';
import { CORRELATION_DEFINITION } from '../../revisions/dto/definition-schema.js';
import { IsCorrelationDefinition } from '../../revisions/dto/is-definition.js';

/** A new or changed sheet. */
export class DefinitionBody {
  @ApiProperty(CORRELATION_DEFINITION)
  @IsCorrelationDefinition()
  readonly definition!: CorrelationDefinition;
}

export class NewCorrelationBody extends DefinitionBody {
  @ApiProperty({ type: String, pattern: '^[a-z0-9]+(-[a-z0-9]+)*$', maxLength: 80 })
  @IsString()
  @MaxLength(80)
  @Matches(/^[a-z0-9]+(-[a-z0-9]+)*$/, {
    message: 'must be small letters and digits, in words joined by single hyphens',
  })
  readonly slug!: string;
}
