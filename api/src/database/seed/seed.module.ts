import { Module } from '@nestjs/common';
import { AppointmentsModule } from '../../appointments/appointments.module.js';
import { CorrelationsModule } from '../../correlations/correlations.module.js';
import { GeometriesModule } from '../../geometries/geometries.module.js';
import { PeopleModule } from '../../people/people.module.js';
import { ProblemReportsModule } from '../../problem-reports/problem-reports.module.js';
import { PropertyEquationsModule } from '../../property-equations/property-equations.module.js';
import { ReviewsModule } from '../../reviews/reviews.module.js';
import { RevisionsModule } from '../../revisions/revisions.module.js';
import { SettingsModule } from '../../settings/settings.module.js';
import { DemoLifeService } from './demo-life.service.js';
import { DemoStaffService } from './demo-staff.service.js';
import { SeedService } from './seed.service.js';

@Module({
  imports: [
    AppointmentsModule,
    PeopleModule,
    SettingsModule,
    GeometriesModule,
    PropertyEquationsModule,
    CorrelationsModule,
    ReviewsModule,
    RevisionsModule,
    ProblemReportsModule,
  ],
  providers: [DemoLifeService, DemoStaffService, SeedService],
})
export class SeedModule {}
