import { Module } from '@nestjs/common';
import { AppointmentsModule } from '../appointments/appointments.module.js';
import { CorrelationsModule } from '../correlations/correlations.module.js';
import { PeopleModule } from '../people/people.module.js';
import { PropertyEquationsModule } from '../property-equations/property-equations.module.js';
import { RevisionsModule } from '../revisions/revisions.module.js';
import { ApprovalService } from './approval.service.js';
import { MachineCheckService } from './machine-check.service.js';
import { ReviewingService } from './reviewing.service.js';
import { ReviewsController } from './reviews.controller.js';
import { ReviewsRepository } from './reviews.repository.js';
import { ReviewsService } from './reviews.service.js';
import { StandingService } from './standing.service.js';
import { SubmissionService } from './submission.service.js';

@Module({
  imports: [RevisionsModule, CorrelationsModule, PropertyEquationsModule, PeopleModule, AppointmentsModule],
  controllers: [ReviewsController],
  providers: [
    ApprovalService,
    MachineCheckService,
    ReviewingService,
    ReviewsRepository,
    ReviewsService,
    StandingService,
    SubmissionService,
  ],
  exports: [SubmissionService, ReviewingService, ApprovalService],
})
export class ReviewsModule {}
