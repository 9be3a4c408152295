import { Module } from '@nestjs/common';
import { AppointmentsModule } from '../appointments/appointments.module.js';
import { CorrelationsModule } from '../correlations/correlations.module.js';
import { NoticesModule } from '../notices/notices.module.js';
import { PeopleModule } from '../people/people.module.js';
import { ProblemReportsModule } from '../problem-reports/problem-reports.module.js';
import { PropertyEquationsModule } from '../property-equations/property-equations.module.js';
import { RevisionsModule } from '../revisions/revisions.module.js';
import { ScheduleModule } from '../schedule/schedule.module.js';
import { SettingsModule } from '../settings/settings.module.js';
import { ApprovalService } from './approval.service.js';
import { CommentsController } from './comments.controller.js';
import { CommentsRepository } from './comments.repository.js';
import { CommentsService } from './comments.service.js';
import { LifeNoticesService } from './life-notices.service.js';
import { MachineCheckService } from './machine-check.service.js';
import { ReviewPageController } from './review-page.controller.js';
import { ReviewPageReadModel } from './review-page.read-model.js';
import { ReviewPageService } from './review-page.service.js';
import { RemindersReadModel } from './reminders.read-model.js';
import { ReviewRemindersService } from './review-reminders.service.js';
import { ReviewingService } from './reviewing.service.js';
import { ReviewsController } from './reviews.controller.js';
import { ReviewsRepository } from './reviews.repository.js';
import { ReviewsService } from './reviews.service.js';
import { StandingService } from './standing.service.js';
import { SubmissionService } from './submission.service.js';
import { SupersessionService } from './supersession.service.js';

@Module({
  imports: [
    RevisionsModule,
    CorrelationsModule,
    PropertyEquationsModule,
    ProblemReportsModule,
    PeopleModule,
    AppointmentsModule,
    NoticesModule,
    ScheduleModule,
    SettingsModule,
  ],
  controllers: [ReviewsController, CommentsController, ReviewPageController],
  providers: [
    ApprovalService,
    CommentsRepository,
    CommentsService,
    LifeNoticesService,
    MachineCheckService,
    ReviewPageReadModel,
    RemindersReadModel,
    ReviewPageService,
    ReviewRemindersService,
    ReviewingService,
    ReviewsRepository,
    ReviewsService,
    StandingService,
    SubmissionService,
    SupersessionService,
  ],
  exports: [
    SubmissionService,
    ReviewingService,
    CommentsService,
    ApprovalService,
    StandingService,
    LifeNoticesService,
    SupersessionService,
  ],
})
export class ReviewsModule {}
