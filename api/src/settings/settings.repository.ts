import { Injectable } from '@nestjs/common';
import { Connection, type Reader, type Tx } from '../database/connection.js';
import { settings } from '../database/schema/settings.js';
import { DEFAULT_SETTINGS, type OfficeSettings } from './office-settings.js';

@Injectable()
export class SettingsRepository {
  constructor(private readonly connection: Connection) {}

  read(reader: Reader = this.connection.reader): OfficeSettings {
    const row = reader.select().from(settings).get();
    if (row === undefined) return DEFAULT_SETTINGS;
    const { officeName, reviewsNeeded, principalId, reviewDueMonths } = row;
    return { officeName, reviewsNeeded, principalId, reviewDueMonths };
  }

  write(tx: Tx, values: OfficeSettings): void {
    tx.insert(settings)
      .values({ id: 1, ...values })
      .onConflictDoUpdate({ target: settings.id, set: values })
      .run();
  }
}
