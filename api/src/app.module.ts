import { Module, type DynamicModule } from '@nestjs/common';
import type { Config } from './config/config.js';
import { ConfigModule } from './config/config.module.js';
import { DatabaseModule } from './database/database.module.js';
import { PeopleModule } from './people/people.module.js';

/** The whole server. Each feature is a module of its own. */
@Module({
  imports: [DatabaseModule, PeopleModule],
})
export class AppModule {
  static with(config: Config): DynamicModule {
    return { module: AppModule, imports: [ConfigModule.with(config)] };
  }
}
