import { Module, type DynamicModule } from '@nestjs/common';
import { APP_GUARD } from '@nestjs/core';
import { AccessGuard } from './common/access/access.guard.js';
import type { Config } from './config/config.js';
import { ConfigModule } from './config/config.module.js';
import { DatabaseModule } from './database/database.module.js';
import { HealthModule } from './health/health.module.js';
import { JournalModule } from './journal/journal.module.js';
import { MailModule } from './mail/mail.module.js';
import { PeopleModule } from './people/people.module.js';
import { SessionModule } from './session/session.module.js';

/** The whole server. Each feature is a module of its own. */
@Module({
  imports: [DatabaseModule, HealthModule, JournalModule, MailModule, PeopleModule, SessionModule],
  providers: [{ provide: APP_GUARD, useClass: AccessGuard }],
})
export class AppModule {
  static with(config: Config): DynamicModule {
    return { module: AppModule, imports: [ConfigModule.with(config)] };
  }
}
