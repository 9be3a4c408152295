import { Injectable } from '@nestjs/common';
import { evaluate } from '@merestone/engine';
import type { Actor } from '../common/actor.js';
import { ApiProblem } from '../common/problem.js';
import { requestFor, type Duty } from '../evaluations/duty.js';
import { GeometriesService } from '../geometries/geometries.service.js';
import { PropertyLibraryService } from '../property-equations/property-library.service.js';
import { CAUTION } from '../revisions/caution.js';
import { DefinitionsService } from '../revisions/definitions.service.js';
import type { RevisionRecord } from '../revisions/revision-record.js';
import { maySee } from '../revisions/revision.policy.js';
import { RevisionsService } from '../revisions/revisions.service.js';
import { candidate, ranked } from './candidate.mapper.js';
import type { CandidatesBody } from './dto/candidates-body.dto.js';
import type { Candidate, CandidatesResponse } from './dto/candidates-response.dto.js';
import { readDutyInputs } from './duty-inputs.js';

@Injectable()
export class CandidatesService {
  constructor(
    private readonly revisions: RevisionsService,
    private readonly definitions: DefinitionsService,
    private readonly libraries: PropertyLibraryService,
    private readonly geometries: GeometriesService,
  ) {}

  /** Every sheet of the geometry that the caller may see, held against one duty. For comparison: nothing is kept. */
  find(actor: Actor, { geometry, phase, inputs }: CandidatesBody): CandidatesResponse {
    if (this.geometries.find(geometry) === undefined) {
      throw ApiProblem.ofField(
        'malformed',
        'geometry',
        `There is no geometry "${geometry}" in the register.`,
      );
    }
    const { values, problems } = readDutyInputs(inputs);
    const [first] = problems.toSorted((a, b) => Number(a.code === 'domain') - Number(b.code === 'domain'));
    if (first !== undefined) throw dutyProblem(first, problems);
    const duty: Duty = { values, groups: [], equations: new Map(), rows: {} };
    const items = this.shown(actor, geometry)
      .filter((record) => phase === undefined || serves(record.phase, phase))
      .map((record) => this.candidate(record, duty));
    return { items: ranked(items), caution: CAUTION };
  }

  private candidate(record: RevisionRecord, duty: Duty): Candidate {
    const compiled = this.definitions.correlation(record);
    const { library } = this.libraries.forStanding(record.standing);
    const request = requestFor(compiled, duty);
    return candidate(
      record,
      compiled,
      evaluate(compiled, request, library),
      request.equations ?? {},
      library,
    );
  }

  /** Of each correlation the approved revision, else the latest that the caller may see. */
  private shown(actor: Actor, geometry: string): RevisionRecord[] {
    const shown = new Map<string, RevisionRecord>();
    for (const record of this.revisions.ofGeometry(geometry)) {
      if (!maySee(actor, record)) continue;
      if (shown.get(record.slug)?.inForce !== true) shown.set(record.slug, record);
    }
    return [...shown.values()];
  }
}

function dutyProblem(
  first: { code: string; message: string },
  fields: ApiProblem['extras']['fields'],
): ApiProblem {
  const code = first.code === 'unit' || first.code === 'domain' ? first.code : 'unknown-symbol';
  return new ApiProblem(code, first.message, { fields });
}

function serves(offered: string | null, wanted: 'gas' | 'liquid'): boolean {
  return offered !== (wanted === 'gas' ? 'liquid' : 'gas');
}
