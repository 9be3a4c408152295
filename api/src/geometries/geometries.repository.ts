import { Injectable } from '@nestjs/common';
import type { Tx } from '../database/connection.js';
import { geometry } from '../database/schema/geometry.js';
import type { Geometry } from './geometries.read-model.js';

@Injectable()
export class GeometriesRepository {
  insert(tx: Tx, geometries: readonly Geometry[]): void {
    tx.insert(geometry)
      .values(geometries.map((one) => ({ ...one })))
      .run();
  }
}
