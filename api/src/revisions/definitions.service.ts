import { Injectable } from '@nestjs/common';
import type {
  CompiledCorrelation,
  CompiledEquation,
  CorrelationDefinition,
  PropertyEquationDefinition,
} from '@merestone/engine';
import { readCorrelation, readPropertyEquation } from './definition-check.js';
import { RevisionRepository } from './revision.repository.js';
import type { RevisionRecord } from './revision-record.js';

/** More than any office has in use at once; beyond it the one unused for longest goes. */
const KEPT = 2000;

/** Definitions of kept revisions, parsed and compiled once for each content: the hash is the key. */
@Injectable()
export class DefinitionsService {
  private readonly correlations = new Map<string, CompiledCorrelation>();
  private readonly equations = new Map<string, CompiledEquation>();

  constructor(private readonly revisions: RevisionRepository) {}

  correlation(record: RevisionRecord): CompiledCorrelation {
    return recall(this.correlations, record.hash, () => readCorrelation(this.stored(record)));
  }

  equation(record: RevisionRecord): CompiledEquation {
    // Two equations may have the same content, but each goes by its own slug.
    return recall(this.equations, `${record.slug} ${record.hash}`, () =>
      readPropertyEquation(record.slug, this.stored(record)),
    );
  }

  /** The definition alone, of whichever kind. */
  definition(record: RevisionRecord): CorrelationDefinition | PropertyEquationDefinition {
    return record.kind === 'correlation'
      ? this.correlation(record).definition
      : this.equation(record).definition;
  }

  private stored(record: RevisionRecord): unknown {
    return JSON.parse(this.revisions.text(record));
  }
}

function recall<T>(cache: Map<string, T>, key: string, make: () => T): T {
  const value = cache.get(key) ?? make();
  cache.delete(key);
  cache.set(key, value);
  const [oldest] = cache.keys();
  if (cache.size > KEPT && oldest !== undefined) cache.delete(oldest);
  return value;
}
