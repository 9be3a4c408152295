import { Injectable } from '@nestjs/common';
import { AppointmentsService } from '../appointments/appointments.service.js';
import type { Actor } from '../common/actor.js';
import { Clock } from '../common/clock.js';
import { DefinitionsService } from '../revisions/definitions.service.js';
import type { RevisionPath } from '../revisions/revision-record.js';
import { RevisionsService } from '../revisions/revisions.service.js';
import type { ReviewPage } from './dto/review-page.dto.js';
import { reviewPage } from './review-page.mapper.js';
import { ReviewPageReadModel } from './review-page.read-model.js';

/** The review of one revision, as the caller may see it. */
@Injectable()
export class ReviewPageService {
  constructor(
    private readonly revisions: RevisionsService,
    private readonly definitions: DefinitionsService,
    private readonly files: ReviewPageReadModel,
    private readonly appointments: AppointmentsService,
    private readonly clock: Clock,
  ) {}

  page(actor: Actor, { slug, number }: RevisionPath): ReviewPage {
    const record = this.revisions.one(actor, { kind: 'correlation', slug, number });
    return reviewPage({
      actor,
      ground: this.appointments.approvalGround(actor.id, record.geometry, this.clock.now().toISOString()),
      record,
      definition: this.definitions.correlation(record).definition,
      file: this.files.file(record.id),
      nameOf: (personId) => this.revisions.nameOf(personId),
    });
  }
}
