import { mkdirSync } from 'node:fs';
import { join } from 'node:path';
import { Logger, type FactoryProvider } from '@nestjs/common';
import { Config } from '../config/config.js';
import { Connection } from './connection.js';
import { migrateDatabase } from './migrate.js';

export const DATABASE_FILE = 'merestone.sqlite';

/** The main connection on an up-to-date database: opened, migrated and guarded before anybody gets it. */
export const databaseProvider: FactoryProvider<Connection> = {
  provide: Connection,
  inject: [Config],
  useFactory: ({ dataFolder }: Config) => {
    mkdirSync(dataFolder, { recursive: true, mode: 0o700 });
    const connection = Connection.open(join(dataFolder, DATABASE_FILE));
    try {
      const { wasNew, guardsSet } = migrateDatabase(connection);
      if (!wasNew && guardsSet.length > 0) {
        new Logger('Database').warn(
          `These guards were not in place and were set again: ${guardsSet.join(', ')}`,
        );
      }
      return connection;
    } catch (error) {
      connection.close();
      throw error;
    }
  },
};
