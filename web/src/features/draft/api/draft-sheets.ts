import type { CorrelationDefinition } from '@merestone/engine';
import { api, ask } from '../../../shared/api/client';
import type { Sheet } from '../../../shared/api/types';

export function fetchSheet(slug: string): Promise<Sheet> {
  return ask(api.GET('/api/correlations/{slug}', { params: { path: { slug } } }));
}

export function fetchRevision(slug: string, number: number): Promise<Sheet> {
  const path = { slug, number };
  return ask(api.GET('/api/correlations/{slug}/revisions/{number}', { params: { path } }));
}

/** Enters a new sheet in the register, as the draft of its first revision. */
export function enterSheet(slug: string, definition: CorrelationDefinition): Promise<Sheet> {
  return ask(api.POST('/api/correlations', { body: { slug, definition } }));
}

/** Opens a draft of a sheet's next revision. */
export function openRevision(slug: string, definition: CorrelationDefinition): Promise<Sheet> {
  return ask(
    api.POST('/api/correlations/{slug}/revisions', { params: { path: { slug } }, body: { definition } }),
  );
}

/** Puts other content into a draft, provided that it still has the content with the given hash. */
export function putContent(
  slug: string,
  number: number,
  hash: string,
  definition: CorrelationDefinition,
): Promise<Sheet> {
  return ask(
    api.PUT('/api/correlations/{slug}/revisions/{number}', {
      params: { path: { slug, number }, header: { 'If-Match': `"${hash}"` } },
      body: { definition },
    }),
  );
}

/** Hands a draft to its reviewers, once the machine check has passed. */
export function submitRevision(slug: string, number: number, reviewers: string[]): Promise<Sheet> {
  return ask(
    api.POST('/api/correlations/{slug}/revisions/{number}/submission', {
      params: { path: { slug, number } },
      body: reviewers.length > 0 ? { reviewers } : {},
    }),
  );
}
