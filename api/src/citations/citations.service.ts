import { findDuplicates } from '@merestone/engine';
import { Injectable, StreamableFile } from '@nestjs/common';
import type { Actor } from '../common/actor.js';
import { ApiProblem } from '../common/problem.js';
import { DefinitionsService } from '../revisions/definitions.service.js';
import { sightOf } from '../revisions/revision.policy.js';
import { RevisionsService } from '../revisions/revisions.service.js';
import { CitationFault } from './citation-fault.js';
import type { CitationFormat } from './citation-format.js';
import { CitationsReadModel } from './citations.read-model.js';
import { citedBy } from './cited-by.js';
import { readingResponse, type ReadingResponse } from './dto/reading.dto.js';
import { CITATION_FILES, exportCitations } from './export-citations.js';
import { readCitations, type CitationReading } from './read-citations.js';

@Injectable()
export class CitationsService {
  constructor(
    private readonly revisions: RevisionsService,
    private readonly definitions: DefinitionsService,
    private readonly register: CitationsReadModel,
  ) {}

  /** Reads pasted references and says which of them name one work, and which sheets cite them already. */
  read(actor: Actor, text: string, format?: CitationFormat): ReadingResponse {
    const reading = this.reading(text, format);
    const sheets = this.register
      .citing(sightOf(actor))
      .map(({ sources, ...sheet }) => ({ ...sheet, items: sources.map(({ csl }) => csl) }));
    return readingResponse(reading, findDuplicates(reading.items), citedBy(reading.items, sheets));
  }

  /** The sources of a revision that the caller sees, as a file. */
  file(actor: Actor, slug: string, number: number, format: CitationFormat = 'bibtex'): StreamableFile {
    const record = this.revisions.one(actor, { kind: 'correlation', slug, number });
    const { sources } = this.definitions.correlation(record).definition;
    const bytes = Buffer.from(
      exportCitations(
        sources.map(({ csl }) => csl),
        format,
      ),
    );
    const { mediaType, ending } = CITATION_FILES[format];
    return new StreamableFile(bytes, {
      type: mediaType,
      length: bytes.length,
      disposition: `attachment; filename="${record.slug}-rev-${record.number}.${ending}"`,
    });
  }

  private reading(text: string, format?: CitationFormat): CitationReading {
    try {
      return readCitations(text, format);
    } catch (error) {
      if (error instanceof CitationFault) throw ApiProblem.ofField('malformed', error.field, error.message);
      throw error;
    }
  }
}
