import { Injectable } from '@nestjs/common';
import type { Actor } from '../common/actor.js';
import { ApiProblem } from '../common/problem.js';
import type { Sheet } from '../correlations/dto/sheet.dto.js';
import { DraftingService } from '../correlations/drafting.service.js';
import { SheetService } from '../correlations/sheet.service.js';
import { CAUTION } from '../revisions/caution.js';
import { contentOf } from '../revisions/content.js';
import { readCorrelation } from '../revisions/definition-check.js';
import type { RevisionPath } from '../revisions/revision-record.js';
import { RevisionsService } from '../revisions/revisions.service.js';
import { readForm } from './read-form.js';
import { EXCHANGE_FORMAT, ExchangedSheet } from './sheet-format.js';

/** Single sheets as files, out and in. */
@Injectable()
export class SheetExchangeService {
  constructor(
    private readonly sheets: SheetService,
    private readonly revisions: RevisionsService,
    private readonly drafting: DraftingService,
  ) {}

  file(actor: Actor, { slug, number }: RevisionPath): ExchangedSheet {
    const sheet = this.sheets.revision(actor, slug, number);
    const { approval } = sheet;
    return {
      format: EXCHANGE_FORMAT,
      slug: sheet.slug,
      revision: sheet.revision,
      iteration: sheet.iteration,
      hash: sheet.hash,
      definition: sheet.definition,
      standing: sheet.standing,
      originator: sheet.originator.name,
      standings: sheet.history.map(({ standing, at, by, note, class: withdrawalClass }) => ({
        standing,
        at,
        by: by.name,
        note,
        class: withdrawalClass,
      })),
      reviews: sheet.reviews.map(({ reviewer, verdict, hash, at, note }) => ({
        reviewer: reviewer.name,
        verdict,
        hash,
        at,
        note,
      })),
      signatures:
        approval === null
          ? []
          : [{ by: approval.by.name, at: approval.at, meaning: approval.meaning, hash: approval.hash }],
      caution: CAUTION,
    };
  }

  /**
   * A file as a draft: of a new correlation, or of the next revision of one that is here. Where it stood elsewhere
   * counts for nothing here. Throws at the field for a form, a definition or a hash that does not hold.
   */
  bring(actor: Actor, value: unknown): Sheet {
    this.assertDefinition(value);
    const { slug, definition, hash } = readForm(ExchangedSheet, value);
    if (hash !== undefined && hash !== contentOf(definition).hash) {
      throw ApiProblem.ofField('malformed', 'hash', 'The definition is not the one that this hash is of.');
    }
    const here = this.revisions.visible(actor, 'correlation', slug).length > 0;
    const record = here
      ? this.drafting.next(actor, slug, definition)
      : this.drafting.create(actor, slug, definition, 'Brought in as a file.');
    return this.sheets.revision(actor, slug, record.number);
  }

  /** First by the engine's own check, which names what is wrong in a definition better than its schema does. */
  private assertDefinition(value: unknown): void {
    if (typeof value === 'object' && value !== null && 'definition' in value)
      readCorrelation(value.definition);
  }
}
