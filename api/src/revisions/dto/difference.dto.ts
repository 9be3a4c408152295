import type { Difference } from '@merestone/engine';
import { ApiProperty, type ApiPropertyOptions } from '@nestjs/swagger';

const ANY_VALUE: ApiPropertyOptions = {
  nullable: true,
  anyOf: [
    { type: 'object', additionalProperties: true },
    { type: 'array', items: {} },
    { type: 'string' },
    { type: 'number' },
    { type: 'boolean' },
  ],
};

/** One field in which two contents differ. */
export class DifferenceDto implements Difference {
  @ApiProperty({
    type: String,
    description: 'Path with names for places: `bounds[Re].stretches[0].hi.value`',
  })
  readonly path!: string;

  @ApiProperty({ type: String, description: 'Top-level field that it belongs to' })
  readonly section!: Difference['section'];

  @ApiProperty({ enum: ['added', 'removed', 'changed'] })
  readonly change!: Difference['change'];

  @ApiProperty({ ...ANY_VALUE, description: 'Null where there was nothing' })
  readonly before!: unknown;

  @ApiProperty({ ...ANY_VALUE, description: 'Null where there is nothing any more' })
  readonly after!: unknown;
}
