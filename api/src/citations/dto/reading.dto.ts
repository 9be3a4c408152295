import type { CslItem, DuplicatePair, Likeness } from '@merestone/engine';
import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import { IsIn, IsOptional, IsString, MaxLength } from 'class-validator';
import type { CitationProblem } from '../citation-fault.js';
import { CITATION_FORMATS, type CitationFormat } from '../citation-format.js';
import type { CitedBy } from '../cited-by.js';
import type { CitationReading } from '../read-citations.js';
import { READING_LIMITS } from '../reading-limits.js';

export class ReadingBody {
  @ApiProperty({
    type: String,
    maxLength: READING_LIMITS.bytes,
    description: `References as pasted: ${READING_LIMITS.bytes / 1000} kB and ${READING_LIMITS.entries} references at most`,
  })
  @IsString()
  @MaxLength(READING_LIMITS.bytes)
  readonly text!: string;

  @ApiPropertyOptional({ enum: CITATION_FORMATS, description: 'Told from the text when left out' })
  @IsOptional()
  @IsIn(CITATION_FORMATS, { message: `format must be one of ${CITATION_FORMATS.join(', ')}` })
  readonly format?: CitationFormat;
}

export class ReadingProblem {
  @ApiProperty({ type: String, description: '`items.2.DOI` for what was read; `text` for what was not' })
  readonly field!: string;

  @ApiProperty({ type: String })
  readonly message!: string;
}

const LIKENESS: readonly Likeness[] = ['doi', 'place'];

export class ReadingDuplicate {
  @ApiProperty({ type: Number, description: 'Index of the earlier item' })
  readonly first!: number;

  @ApiProperty({ type: Number, description: 'Index of the later item' })
  readonly second!: number;

  @ApiProperty({
    enum: LIKENESS,
    description: 'By the DOI, or by first author, year, container and first page',
  })
  readonly by!: Likeness;
}

export class ReadingCitedBy {
  @ApiProperty({ type: Number, description: 'Index of the item' })
  readonly item!: number;

  @ApiProperty({ enum: ['correlation', 'property-equation'] })
  readonly kind!: CitedBy['kind'];

  @ApiProperty({ type: String })
  readonly slug!: string;

  @ApiProperty({ type: String })
  readonly title!: string;

  @ApiProperty({ enum: LIKENESS })
  readonly by!: Likeness;
}

export class ReadingResponse {
  @ApiProperty({ enum: CITATION_FORMATS })
  readonly format!: CitationFormat;

  @ApiProperty({
    type: 'array',
    items: { type: 'object', additionalProperties: true },
    description: 'CSL-JSON items with the fields that a sheet keeps',
  })
  readonly items!: CslItem[];

  @ApiProperty({ type: [ReadingProblem], description: 'What was changed or left out, to be looked at' })
  readonly problems!: ReadingProblem[];

  @ApiProperty({ type: [ReadingDuplicate], description: 'Items that name one work' })
  readonly duplicates!: ReadingDuplicate[];

  @ApiProperty({ type: [ReadingCitedBy], description: 'Sheets that cite an item already' })
  readonly alreadyCitedBy!: ReadingCitedBy[];
}

export function readingResponse(
  { format, items, problems }: CitationReading,
  duplicates: readonly DuplicatePair[],
  alreadyCitedBy: readonly CitedBy[],
): ReadingResponse {
  return {
    format,
    items: [...items],
    problems: problems.map(({ field, message }: CitationProblem) => ({ field, message })),
    duplicates: duplicates.map(({ first, second, by }) => ({ first, second, by })),
    alreadyCitedBy: alreadyCitedBy.map(({ item, kind, slug, title, by }) => ({
      item,
      kind,
      slug,
      title,
      by,
    })),
  };
}
