import { Global, Module, type OnApplicationShutdown } from '@nestjs/common';
import { Clock } from '../common/clock.js';
import { Connection } from './connection.js';
import { databaseProvider } from './database.provider.js';
import { Writer } from './write.js';

/** Connection, Writer and Clock for everybody. */
@Global()
@Module({
  providers: [databaseProvider, Writer, Clock],
  exports: [Connection, Writer, Clock],
})
export class DatabaseModule implements OnApplicationShutdown {
  constructor(private readonly connection: Connection) {}

  /** After every other module: Nest ends modules from the outermost to the innermost, and this one uses none. */
  onApplicationShutdown(): void {
    this.connection.close();
  }
}
