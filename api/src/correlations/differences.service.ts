import { Injectable } from '@nestjs/common';
import { compareDefinitions } from '@merestone/engine';
import type { Actor } from '../common/actor.js';
import { DefinitionsService } from '../revisions/definitions.service.js';
import { RevisionsService } from '../revisions/revisions.service.js';
import type { DifferencesQuery, DifferencesResponse } from './dto/differences.dto.js';

@Injectable()
export class DifferencesService {
  constructor(
    private readonly revisions: RevisionsService,
    private readonly definitions: DefinitionsService,
  ) {}

  /** What changed between two revisions of a correlation, in either direction of time, as the caller may see them. */
  between(actor: Actor, slug: string, { from, to }: DifferencesQuery): DifferencesResponse {
    const left = this.revisions.one(actor, { kind: 'correlation', slug, number: from });
    const right = this.revisions.one(actor, { kind: 'correlation', slug, number: to });
    const before = this.definitions.correlation(left).definition;
    const after = this.definitions.correlation(right).definition;
    return {
      from: { revision: left.number, hash: left.hash },
      to: { revision: right.number, hash: right.hash },
      differences: compareDefinitions(before, after),
      before,
      after,
    };
  }
}
