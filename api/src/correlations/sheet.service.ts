import { Injectable } from '@nestjs/common';
import { runChecks, type CompiledCorrelation, type Quantity } from '@merestone/engine';
import { AppointmentsService } from '../appointments/appointments.service.js';
import type { Actor } from '../common/actor.js';
import { Clock } from '../common/clock.js';
import { GeometriesService } from '../geometries/geometries.service.js';
import {
  PropertyLibraryService,
  type ShelvedLibrary,
} from '../property-equations/property-library.service.js';
import { DefinitionsService } from '../revisions/definitions.service.js';
import type { RevisionRecord } from '../revisions/revision-record.js';
import { RevisionsService } from '../revisions/revisions.service.js';
import type { Sheet } from './dto/sheet.dto.js';
import { sheet } from './sheet.mapper.js';
import { SheetReadModel } from './sheet.read-model.js';

/** Puts a revision together with all that is on record about it. */
@Injectable()
export class SheetService {
  constructor(
    private readonly revisions: RevisionsService,
    private readonly definitions: DefinitionsService,
    private readonly libraries: PropertyLibraryService,
    private readonly files: SheetReadModel,
    private readonly geometries: GeometriesService,
    private readonly appointments: AppointmentsService,
    private readonly clock: Clock,
  ) {}

  /** The approved revision, else the latest that the caller may see. */
  shown(actor: Actor, slug: string): Sheet {
    return this.of(actor, this.revisions.shown(actor, 'correlation', slug));
  }

  revision(actor: Actor, slug: string, number: number): Sheet {
    return this.of(actor, this.revisions.one(actor, { kind: 'correlation', slug, number }));
  }

  private of(actor: Actor, record: RevisionRecord): Sheet {
    const compiled = this.definitions.correlation(record);
    const shelf = this.libraries.forStanding(record.standing);
    const { geometry } = compiled.definition;
    const at = this.clock.now().toISOString();
    const revisions = this.revisions.visible(actor, 'correlation', record.slug);
    const file = this.files.file(record.id);
    return sheet({
      actor,
      ground: this.appointments.approvalGround(actor.id, record.geometry, at),
      record,
      compiled,
      revisions,
      file,
      successor: this.successor(actor, record, revisions, file.history.at(-1)?.successor ?? null),
      checks: runChecks(compiled, this.libraries.approvedOrLatest().library),
      equations: equationsOf(compiled, shelf),
      originatorName: this.revisions.nameOf(record.originatorId),
      geometryName: this.geometries.find(geometry)?.name ?? geometry,
    });
  }

  /** The correlation named at the withdrawal, or else the later revision in force. */
  private successor(
    actor: Actor,
    { standing, number }: RevisionRecord,
    revisions: readonly RevisionRecord[],
    named: string | null,
  ): Sheet['successor'] {
    if (standing !== 'superseded' && standing !== 'withdrawn') return null;
    const candidates = named === null ? revisions : this.revisions.visible(actor, 'correlation', named);
    const found = candidates.find((one) => one.inForce && (named !== null || one.number > number));
    return found === undefined ? null : { slug: found.slug, revision: found.number, title: found.title };
  }
}

/** Every property equation that the sheet lists, and those that these list in turn. */
function equationsOf(
  compiled: CompiledCorrelation,
  { library, revisionOf }: ShelvedLibrary,
): Sheet['equations'] {
  const found = new Map<string, Sheet['equations'][number]>();
  const collect = (quantities: readonly Quantity[]): void => {
    for (const slug of quantities.flatMap(({ equations = [] }) => equations)) {
      const equation = library(slug);
      const record = revisionOf(slug);
      if (found.has(slug) || equation === undefined || record === undefined) continue;
      const { definition } = equation;
      found.set(slug, { slug, revision: record.number, hash: record.hash, definition });
      collect(definition.quantities);
    }
  };
  collect(compiled.definition.quantities);
  return [...found.values()];
}
