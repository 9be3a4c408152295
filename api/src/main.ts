import { join } from 'node:path';
import { Logger } from '@nestjs/common';
import { NestFactory } from '@nestjs/core';
import type { NestExpressApplication } from '@nestjs/platform-express';
import { AppModule } from './app.module.js';
import { ConfigError, readConfig } from './config/read-config.js';
import type { Config } from './config/config.js';
import { configureApp } from './configure-app.js';
import { DATABASE_FILE } from './database/database.provider.js';
import { FixtureFiles } from './database/seed/fixture-files.js';
import { SeedService } from './database/seed/seed.service.js';
import { setAsideUnfinished } from './database/set-aside-unfinished.js';
import { greeting } from './greeting.js';
import { CheckpointService } from './journal/checkpoint.service.js';

// Whatever is written is for the server's own account: the database, its keys and its backups.
process.umask(0o077);

try {
  await start(readConfig(process.env));
} catch (error) {
  const text = error instanceof ConfigError ? error.message : `Merestone cannot start.\n${describe(error)}`;
  process.stderr.write(`${text}\n`);
  process.exitCode = 1;
}

/** Opens or makes the database, fills a new one, and only then lets anybody in. */
async function start(config: Config): Promise<void> {
  const aside = setAsideUnfinished(join(config.dataFolder, DATABASE_FILE), new Date());
  if (aside !== undefined) new Logger('Start').warn(`An unfinished set-up was moved to ${aside}`);
  const app = await NestFactory.create<NestExpressApplication>(AppModule.with(config), {
    bodyParser: false,
    abortOnError: false,
    logger: ['fatal', 'error', 'warn'],
  });
  configureApp(app);
  await app.init();
  await app.get(SeedService).fill(config.demo, config.demo || config.library ? new FixtureFiles() : null);
  app.get(CheckpointService).trySigningHead();
  await app.listen(config.port);
  process.stdout.write(greeting(app));
}

function describe(error: unknown): string {
  return error instanceof Error ? (error.stack ?? error.message) : String(error);
}
