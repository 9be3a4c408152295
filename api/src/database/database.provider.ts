import { mkdirSync } from 'node:fs';
import { join } from 'node:path';
import type { FactoryProvider } from '@nestjs/common';
import { Config } from '../config/config.js';
import { Connection } from './connection.js';
import { migrateDatabase } from './migrate.js';

/** The main connection on an up-to-date database: opened, migrated and guarded before anybody gets it. */
export const databaseProvider: FactoryProvider<Connection> = {
  provide: Connection,
  inject: [Config],
  useFactory: (config: Config) => {
    mkdirSync(config.dataFolder, { recursive: true, mode: 0o700 });
    const connection = Connection.open(join(config.dataFolder, 'merestone.sqlite'));
    migrateDatabase(connection);
    return connection;
  },
};
