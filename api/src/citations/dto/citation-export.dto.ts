import { ApiPropertyOptional } from '@nestjs/swagger';
import { IsIn, IsOptional } from 'class-validator';
import { CITATION_FORMATS, type CitationFormat } from '../citation-format.js';

export class CitationExportQuery {
  @ApiPropertyOptional({ enum: CITATION_FORMATS, default: 'bibtex' })
  @IsOptional()
  @IsIn(CITATION_FORMATS, { message: `format must be one of ${CITATION_FORMATS.join(', ')}` })
  readonly format?: CitationFormat;
}
