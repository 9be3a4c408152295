import { Injectable } from '@nestjs/common';
import type { Actor } from '../common/actor.js';
import { STANDINGS } from '../common/standing.js';
import { GeometriesService } from '../geometries/geometries.service.js';
import { DefinitionsService } from '../revisions/definitions.service.js';
import { sightOf, type Sight } from '../revisions/revision.policy.js';
import { CorrelationListReadModel, type ListFilter } from './correlation-list.read-model.js';
import type { CorrelationPage } from './dto/correlation-page.dto.js';
import type { CorrelationQuery } from './dto/correlation-query.dto.js';
import { listedCorrelation } from './listed-correlation.mapper.js';
import { readCursor, writeCursor } from './page-cursor.js';
import { searchQuery } from './search-query.js';

const PAGE = 50;
const PHASE_LABELS: Readonly<Record<string, string>> = { gas: 'Gas', liquid: 'Liquid' };

@Injectable()
export class CorrelationListService {
  constructor(
    private readonly list: CorrelationListReadModel,
    private readonly definitions: DefinitionsService,
    private readonly geometries: GeometriesService,
  ) {}

  /** One page of the register as the caller sees it. */
  page(actor: Actor, query: CorrelationQuery): CorrelationPage {
    const sight = sightOf(actor);
    const after = query.cursor === undefined ? undefined : readCursor(query.cursor);
    const asked = query.q?.trim() ?? '';
    const match = asked === '' ? undefined : searchQuery(asked);
    if (match === null) return { items: [], nextCursor: null, total: 0, facets: noFacets() };
    const filter: ListFilter = {
      match,
      geometry: query.geometry,
      phase: query.phase,
      standing: query.standing,
    };
    const limit = query.limit ?? PAGE;
    const names = this.geometries.names();
    const rows = this.list.page(sight, filter, after, limit + 1);
    const shown = rows.slice(0, limit);
    const last = shown.at(-1);
    return {
      items: shown.map((row) => listedCorrelation(row, this.definitions.correlation(row).definition, names)),
      nextCursor: rows.length > limit && last !== undefined ? writeCursor(last) : null,
      total: this.list.total(sight, filter),
      facets: this.facets(sight, filter, names),
    };
  }

  private facets(
    sight: Sight,
    filter: ListFilter,
    names: ReadonlyMap<string, string>,
  ): CorrelationPage['facets'] {
    const geometry = this.list
      .geometries(sight, filter)
      .map(({ value, count }) => ({ value, label: names.get(value) ?? value, count }))
      .sort((a, b) => a.label.localeCompare(b.label, 'en'));
    const phase = this.list
      .phases(sight, filter)
      .filter(({ count }) => count > 0)
      .map(({ value, count }) => ({ value, label: PHASE_LABELS[value] ?? value, count }));
    const counts = new Map(this.list.standings(sight, filter).map(({ value, count }) => [value, count]));
    const standing = STANDINGS.flatMap((value) => {
      const count = counts.get(value);
      return count === undefined ? [] : [{ value, label: sentenceCase(value), count }];
    });
    return { geometry, phase, standing };
  }
}

function noFacets(): CorrelationPage['facets'] {
  return { geometry: [], phase: [], standing: [] };
}

function sentenceCase(text: string): string {
  return text.charAt(0).toUpperCase() + text.slice(1);
}
