import { randomUUID } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import { ENGINE_VERSION, evaluate, type EvaluationRequest } from '@merestone/engine';
import type { Actor } from '../common/actor.js';
import { authorize, type Authorized } from '../common/authorized.js';
import { ApiProblem } from '../common/problem.js';
import type { Tx } from '../database/connection.js';
import type { Provenance } from '../database/schema/evaluation.js';
import { Writer } from '../database/write.js';
import {
  PropertyLibraryService,
  type ShelvedLibrary,
} from '../property-equations/property-library.service.js';
import { DefinitionsService } from '../revisions/definitions.service.js';
import { subjectOf, type RevisionRecord } from '../revisions/revision-record.js';
import { mayEvaluate } from '../revisions/revision.policy.js';
import { RevisionsService } from '../revisions/revisions.service.js';
import { AlternativesService } from './alternatives.service.js';
import type { EvaluationBody } from './dto/evaluation-body.dto.js';
import type { EvaluationResponse } from './dto/evaluation-response.dto.js';
import type { KeptEvaluation } from './dto/kept-evaluation.dto.js';
import { evaluationResponse, type NumberedOutcome } from './evaluation.mapper.js';
import { inputProblem, refusalProblem } from './evaluation-problem.js';
import { mayRead } from './evaluation.policy.js';
import { EvaluationsRepository } from './evaluations.repository.js';

@Injectable()
export class EvaluationsService {
  constructor(
    private readonly revisions: RevisionsService,
    private readonly definitions: DefinitionsService,
    private readonly libraries: PropertyLibraryService,
    private readonly alternatives: AlternativesService,
    private readonly evaluations: EvaluationsRepository,
    private readonly writer: Writer,
  ) {}

  /** Evaluates a sheet for a duty and keeps the number with all it rests on. A refusal is thrown and not kept. */
  evaluate(actor: Actor, slug: string, body: EvaluationBody): EvaluationResponse {
    const found = this.find(actor, slug, body.revision);
    const record = authorize(found, mayEvaluate(actor, found));
    const compiled = this.definitions.correlation(record);
    const shelf = this.libraries.forStanding(record.standing);
    const request = requestOf(body);
    const evaluation = evaluate(compiled, request, shelf.library);
    if (!evaluation.ok) throw inputProblem(evaluation.problems);
    const { outcome } = evaluation;
    if (outcome.outcome === 'refused') {
      const approved = this.libraries.approved().library;
      throw refusalProblem(outcome, this.alternatives.for(slug, compiled, request, approved));
    }
    return this.keep(actor, record, request, outcome, provenanceOf(record, outcome, shelf));
  }

  /** A kept evaluation, for whoever made it and for those who look into everything. */
  kept(actor: Actor, id: string): KeptEvaluation {
    const row = this.evaluations.find(id);
    if (row === undefined || !mayRead(actor, row)) {
      throw new ApiProblem('not-found', 'There is no such evaluation among those you may see.');
    }
    return {
      id: row.id,
      at: row.at,
      person: { id: row.personId, name: row.personName },
      request: row.request as KeptEvaluation['request'],
      evaluation: row.response as EvaluationResponse,
    };
  }

  /** A deviating number is journalled with its row; a plain one is kept in the usage table alone, by decision. */
  private keep(
    actor: Actor,
    record: Authorized<RevisionRecord>,
    request: EvaluationRequest,
    outcome: NumberedOutcome,
    provenance: Provenance,
  ): EvaluationResponse {
    const id = randomUUID();
    const insert = (tx: Tx, at: string): EvaluationResponse => {
      const response = evaluationResponse(outcome, { id, at, standing: record.standing, provenance });
      this.evaluations.insert(tx, {
        id,
        revisionId: record.id,
        standing: record.standing,
        personId: actor.id,
        personName: actor.name,
        at,
        outcome: outcome.outcome,
        request,
        response,
        provenance,
      });
      return response;
    };
    if (outcome.outcome !== 'deviating') return this.writer.writeUnjournalled('evaluation', insert);
    const detail = {
      evaluation: id,
      hash: record.hash,
      result: { ...outcome.result },
      deviations: outcome.deviations.map(({ symbol, reason }) => ({ symbol, reason })),
    };
    return this.writer.write(actor, 'evaluation.deviated', (tx, at) => ({
      subject: subjectOf(record),
      detail,
      result: insert(tx, at),
    }));
  }

  private find(actor: Actor, slug: string, number: number | undefined): RevisionRecord {
    if (number !== undefined) return this.revisions.one(actor, { kind: 'correlation', slug, number });
    const nothingSeen = this.revisions.visible(actor, 'correlation', slug).length === 0;
    if (nothingSeen && this.revisions.exists('correlation', slug)) {
      throw new ApiProblem('not-in-use', 'No revision of this correlation is in use.');
    }
    return this.revisions.shown(actor, 'correlation', slug);
  }
}

function requestOf({
  inputs,
  rows,
  equations,
  bases,
  deviations,
  drivingForce,
}: EvaluationBody): EvaluationRequest {
  return {
    inputs,
    ...(rows === undefined ? {} : { rows }),
    ...(equations === undefined ? {} : { equations }),
    ...(bases === undefined ? {} : { bases }),
    ...(deviations === undefined
      ? {}
      : { deviations: deviations.map(({ symbol, reason }) => ({ symbol, reason })) }),
    ...(drivingForce === undefined ? {} : { drivingForce }),
  };
}

function provenanceOf(
  record: RevisionRecord,
  outcome: NumberedOutcome,
  { revisionOf }: ShelvedLibrary,
): Provenance {
  const keys = [...new Set(outcome.equations.map(({ key }) => key))];
  return {
    slug: record.slug,
    revision: record.number,
    hash: record.hash,
    engine: ENGINE_VERSION,
    equations: keys.flatMap((key) => {
      const equation = revisionOf(key);
      return equation ? [{ key, revision: equation.number, hash: equation.hash }] : [];
    }),
    rows: outcome.rows,
  };
}
