import { Injectable } from '@nestjs/common';
import {
  evaluate,
  type CompiledCorrelation,
  type EvaluationRequest,
  type PropertyLibrary,
} from '@merestone/engine';
import type { Alternative } from '../common/problem.js';
import { DefinitionsService } from '../revisions/definitions.service.js';
import { RevisionsService } from '../revisions/revisions.service.js';
import { dutyOf, requestFor } from './duty.js';

const MOST = 10;

/** Where to turn when a sheet refuses. */
@Injectable()
export class AlternativesService {
  constructor(
    private readonly revisions: RevisionsService,
    private readonly definitions: DefinitionsService,
  ) {}

  /** Approved sheets of the same geometry whose bounds all hold for the same duty. */
  for(
    slug: string,
    refused: CompiledCorrelation,
    request: EvaluationRequest,
    library: PropertyLibrary,
  ): Alternative[] {
    const duty = dutyOf(refused, request);
    return this.revisions
      .ofGeometry(refused.definition.geometry)
      .filter((record) => record.inForce && record.slug !== slug)
      .flatMap((record) => {
        const compiled = this.definitions.correlation(record);
        const evaluation = evaluate(compiled, requestFor(compiled, duty), library);
        const holds = evaluation.ok && evaluation.outcome.outcome === 'within';
        const { title, geometry } = compiled.definition;
        return holds ? [{ slug: record.slug, title, geometry }] : [];
      })
      .slice(0, MOST);
  }
}
