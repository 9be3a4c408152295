import { rmSync } from 'node:fs';
import type { Server } from 'node:http';
import { join } from 'node:path';
import { Module, type Type } from '@nestjs/common';
import type { NestExpressApplication } from '@nestjs/platform-express';
import { Test } from '@nestjs/testing';
import { AppModule } from '../../src/app.module.js';
import { Clock } from '../../src/common/clock.js';
import type { Config, Settings } from '../../src/config/config.js';
import { configureApp } from '../../src/configure-app.js';
import { Connection } from '../../src/database/connection.js';
import { DATABASE_FILE } from '../../src/database/database.provider.js';
import { TestClock } from './test-clock.js';
import { testConfig } from './test-config.js';

/** The whole server on a new SQLite file brought up by the real migrations, listening on a port of its own. */
export interface TestApp {
  readonly app: NestExpressApplication;
  readonly server: Server;
  readonly config: Config;
  readonly clock: TestClock;
  readonly connection: Connection;
  /** For a second connection of the test's own. */
  readonly databaseFile: string;
  /** Ends the server; the data stays. */
  stop(): Promise<void>;
  /** Ends the server and removes its data. */
  close(): Promise<void>;
}

export interface TestAppOptions {
  readonly settings?: Partial<Settings>;
  /** Routes that only the test knows. */
  readonly controllers?: readonly Type[];
}

export async function createTestApp({ settings, controllers = [] }: TestAppOptions = {}): Promise<TestApp> {
  const config = testConfig(settings);
  const clock = new TestClock();
  const module = await Test.createTestingModule({
    imports: [AppModule.with(config), extraModule(controllers)],
  })
    .overrideProvider(Clock)
    .useValue(clock)
    .compile();
  const app = module.createNestApplication<NestExpressApplication>({ bodyParser: false, logger: false });
  configureApp(app);
  await app.listen(0, '127.0.0.1');
  const stop = async (): Promise<void> => app.close();
  return {
    app,
    server: app.getHttpServer(),
    config,
    clock,
    connection: app.get(Connection),
    databaseFile: join(config.dataFolder, DATABASE_FILE),
    stop,
    close: async () => {
      await stop();
      rmSync(config.dataFolder, { recursive: true, force: true });
    },
  };
}

function extraModule(controllers: readonly Type[]): Type {
  @Module({ controllers: [...controllers] })
  class TestRoutesModule {}
  return TestRoutesModule;
}
