import { Module, type DynamicModule } from '@nestjs/common';
import { APP_GUARD } from '@nestjs/core';
import { AttachmentsModule } from './attachments/attachments.module.js';
import { AppointmentsModule } from './appointments/appointments.module.js';
import { CandidatesModule } from './candidates/candidates.module.js';
import { CitationsModule } from './citations/citations.module.js';
import { CorrelationsModule } from './correlations/correlations.module.js';
import { SeedModule } from './database/seed/seed.module.js';
import { DeskModule } from './desk/desk.module.js';
import { EvaluationsModule } from './evaluations/evaluations.module.js';
import { ExchangeModule } from './exchange/exchange.module.js';
import { GeometriesModule } from './geometries/geometries.module.js';
import { PropertyEquationsModule } from './property-equations/property-equations.module.js';
import { ReviewsModule } from './reviews/reviews.module.js';
import { AccessGuard } from './common/access/access.guard.js';
import type { Config } from './config/config.js';
import { ConfigModule } from './config/config.module.js';
import { DatabaseModule } from './database/database.module.js';
import { HealthModule } from './health/health.module.js';
import { InvitationsModule } from './invitations/invitations.module.js';
import { JournalModule } from './journal/journal.module.js';
import { MailModule } from './mail/mail.module.js';
import { NoticesModule } from './notices/notices.module.js';
import { PasswordResetsModule } from './password-resets/password-resets.module.js';
import { PeopleModule } from './people/people.module.js';
import { ScheduleModule } from './schedule/schedule.module.js';
import { SessionModule } from './session/session.module.js';
import { SettingsModule } from './settings/settings.module.js';

/** The whole server. Each feature is a module of its own. */
@Module({
  imports: [
    DatabaseModule,
    HealthModule,
    JournalModule,
    MailModule,
    PeopleModule,
    SessionModule,
    ScheduleModule,
    SettingsModule,
    InvitationsModule,
    PasswordResetsModule,
    NoticesModule,
    AppointmentsModule,
    SeedModule,
    AttachmentsModule,
    CandidatesModule,
    CitationsModule,
    CorrelationsModule,
    DeskModule,
    EvaluationsModule,
    ExchangeModule,
    GeometriesModule,
    PropertyEquationsModule,
    ReviewsModule,
  ],
  providers: [{ provide: APP_GUARD, useClass: AccessGuard }],
})
export class AppModule {
  static with(config: Config): DynamicModule {
    return { module: AppModule, imports: [ConfigModule.with(config)] };
  }
}
