import { Module, type DynamicModule } from '@nestjs/common';
import { Config } from './config.js';

/** Hands the parsed settings to everybody. */
@Module({})
export class ConfigModule {
  static with(config: Config): DynamicModule {
    return {
      module: ConfigModule,
      global: true,
      providers: [{ provide: Config, useValue: config }],
      exports: [Config],
    };
  }
}
