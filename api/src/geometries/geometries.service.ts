import { Injectable } from '@nestjs/common';
import type { Actor } from '../common/actor.js';
import type { Reader } from '../database/connection.js';
import { Writer } from '../database/write.js';
import { sightOf } from '../revisions/revision.policy.js';
import type { GeometriesResponse } from './dto/geometries-response.dto.js';
import { GeometriesReadModel, type Geometry } from './geometries.read-model.js';
import { GeometriesRepository } from './geometries.repository.js';

@Injectable()
export class GeometriesService {
  constructor(
    private readonly geometries: GeometriesReadModel,
    private readonly repository: GeometriesRepository,
    private readonly writer: Writer,
  ) {}

  /** Every geometry of the office, with how many correlations the caller finds there. */
  list(actor: Actor): GeometriesResponse {
    return {
      items: this.geometries.counted(sightOf(actor)).map((row) => ({
        slug: row.slug,
        name: row.name,
        summary: row.summary,
        characteristicLength: row.characteristicLength,
        velocity: row.velocity,
        cautions: row.cautions,
        total: row.total,
        approved: row.approved,
      })),
    };
  }

  find(slug: string, reader?: Reader): Geometry | undefined {
    return this.geometries.find(slug, reader);
  }

  /** Names by slug. */
  names(): ReadonlyMap<string, string> {
    return new Map(this.geometries.all().map(({ slug, name }) => [slug, name]));
  }

  /** Adds the geometries that a library brings. */
  add(actor: Actor, geometries: readonly Geometry[]): void {
    this.writer.write(actor, 'geometries.added', (tx) => {
      this.repository.insert(tx, geometries);
      return {
        subject: 'geometries',
        detail: { slugs: geometries.map(({ slug }) => slug) },
        result: undefined,
      };
    });
  }
}
