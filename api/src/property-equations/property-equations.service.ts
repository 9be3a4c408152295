import { Injectable } from '@nestjs/common';
import { runPropertyChecks, type PropertyEquationDefinition } from '@merestone/engine';
import type { Actor } from '../common/actor.js';
import { Writer } from '../database/write.js';
import { CAUTION } from '../revisions/caution.js';
import { contentOf } from '../revisions/content.js';
import { readPropertyEquation } from '../revisions/definition-check.js';
import { DefinitionsService } from '../revisions/definitions.service.js';
import { subjectOf, type RevisionRecord } from '../revisions/revision-record.js';
import { maySee } from '../revisions/revision.policy.js';
import { RevisionsService } from '../revisions/revisions.service.js';
import type {
  ListedPropertyEquation,
  PropertyEquationSheet,
  PropertyEquationsResponse,
} from './dto/property-equation.dto.js';

@Injectable()
export class PropertyEquationsService {
  constructor(
    private readonly revisions: RevisionsService,
    private readonly definitions: DefinitionsService,
    private readonly writer: Writer,
  ) {}

  /** Each property equation the caller may see, in its approved revision or else the latest. */
  list(actor: Actor): PropertyEquationsResponse {
    const shown = new Map<string, RevisionRecord>();
    for (const record of this.revisions.ofPropertyEquations()) {
      if (!maySee(actor, record)) continue;
      if (shown.get(record.slug)?.inForce !== true) shown.set(record.slug, record);
    }
    return { items: [...shown.values()].map((record) => this.entry(record)) };
  }

  sheet(actor: Actor, slug: string): PropertyEquationSheet {
    const record = this.revisions.shown(actor, 'property-equation', slug);
    const compiled = this.definitions.equation(record);
    return {
      ...this.entry(record),
      definition: compiled.definition,
      checks: runPropertyChecks(compiled),
      standingNote: record.standing === 'approved' ? null : record.standingNote,
      caution: CAUTION,
    };
  }

  /** A new property equation as a draft. */
  draft(actor: Actor, slug: string, definition: PropertyEquationDefinition, note?: string): RevisionRecord {
    readPropertyEquation(slug, definition);
    const content = contentOf(definition);
    return this.writer.write(actor, 'property-equation.drafted', (tx, at) => {
      const record = this.revisions.draftPropertyEquation(tx, actor, at, slug, content, note);
      const detail = { iteration: record.iteration, hash: record.hash };
      return { subject: subjectOf(record), detail, result: record };
    });
  }

  private entry(record: RevisionRecord): ListedPropertyEquation {
    const { definition } = this.definitions.equation(record);
    return {
      slug: record.slug,
      title: definition.title,
      fluid: definition.fluid,
      gives: definition.gives,
      unit: definition.unit,
      revision: record.number,
      hash: record.hash,
      standing: record.standing,
    };
  }
}
