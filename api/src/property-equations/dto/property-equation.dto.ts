import type { PropertyEquationDefinition } from '@merestone/engine';
import { ApiProperty } from '@nestjs/swagger';
import { STANDINGS, type Standing } from '../../common/standing.js';
import { CheckReportDto } from '../../revisions/dto/check-report.dto.js';
import { PROPERTY_EQUATION_DEFINITION } from '../../revisions/dto/definition-schema.js';

export class ListedPropertyEquation {
  @ApiProperty({ type: String })
  readonly slug!: string;

  @ApiProperty({ type: String })
  readonly title!: string;

  @ApiProperty({ type: String })
  readonly fluid!: string;

  @ApiProperty({ type: String, description: 'Dictionary name of what it gives' })
  readonly gives!: string;

  @ApiProperty({ type: String })
  readonly unit!: string;

  @ApiProperty({ type: Number })
  readonly revision!: number;

  @ApiProperty({ type: String })
  readonly hash!: string;

  @ApiProperty({ enum: STANDINGS })
  readonly standing!: Standing;
}

export class PropertyEquationsResponse {
  @ApiProperty({ type: [ListedPropertyEquation] })
  readonly items!: ListedPropertyEquation[];
}

export class PropertyEquationSheet extends ListedPropertyEquation {
  @ApiProperty(PROPERTY_EQUATION_DEFINITION)
  readonly definition!: PropertyEquationDefinition;

  @ApiProperty({ type: [CheckReportDto] })
  readonly checks!: CheckReportDto[];

  @ApiProperty({ type: String, nullable: true, description: 'Why it is not approved' })
  readonly standingNote!: string | null;

  @ApiProperty({ type: String })
  readonly caution!: string;
}
