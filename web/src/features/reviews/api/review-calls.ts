import type { components } from '@merestone/api-client';
import { api, ask } from '../../../shared/api/client';

type Schemas = components['schemas'];

/** A revision by its sheet and number. */
export interface RevisionKey {
  slug: string;
  revision: number;
}

export type VerdictBody = Schemas['ReviewBody'];
export type ApprovalBody = Schemas['ApprovalBody'];
export type WithdrawalBody = Schemas['WithdrawalBody'];

const at = ({ slug, revision }: RevisionKey) => ({ path: { slug, number: revision } });

export function takeReview(key: RevisionKey) {
  return ask(api.POST('/api/correlations/{slug}/revisions/{number}/assignments', { params: at(key) }));
}

/** An empty field is the sheet as a whole. */
export function sendComment(key: RevisionKey, field: string, text: string) {
  return ask(
    api.POST('/api/correlations/{slug}/revisions/{number}/comments', {
      params: at(key),
      body: { field, text },
    }),
  );
}

export function sendAnswer(key: RevisionKey, id: number, text: string) {
  return ask(
    api.POST('/api/correlations/{slug}/revisions/{number}/comments/{id}/answers', {
      params: { path: { ...at(key).path, id } },
      body: { text },
    }),
  );
}

export function resolveComment(key: RevisionKey, id: number) {
  return ask(
    api.POST('/api/correlations/{slug}/revisions/{number}/comments/{id}/resolution', {
      params: { path: { ...at(key).path, id } },
    }),
  );
}

/** Counts only for the content with the given hash; other content is refused as stale. */
export function sendVerdict(key: RevisionKey, hash: string, body: VerdictBody) {
  return ask(
    api.POST('/api/correlations/{slug}/revisions/{number}/reviews', {
      params: { ...at(key), header: { 'If-Match': `"${hash}"` } },
      body,
    }),
  );
}

/** The originator says that the revision is ready for its reviewers again. */
export function putForward(key: RevisionKey, note: string) {
  return ask(
    api.POST('/api/correlations/{slug}/revisions/{number}/iterations', {
      params: at(key),
      body: note === '' ? {} : { note },
    }),
  );
}

export function approve(key: RevisionKey, body: ApprovalBody) {
  return ask(api.POST('/api/correlations/{slug}/revisions/{number}/approval', { params: at(key), body }));
}

export function decline(key: RevisionKey, reason: string) {
  return ask(
    api.POST('/api/correlations/{slug}/revisions/{number}/decline', { params: at(key), body: { reason } }),
  );
}

export function suspend(key: RevisionKey, reason: string) {
  return ask(
    api.POST('/api/correlations/{slug}/revisions/{number}/suspension', { params: at(key), body: { reason } }),
  );
}

export function reinstate(key: RevisionKey, reason: string) {
  return ask(
    api.POST('/api/correlations/{slug}/revisions/{number}/reinstatement', {
      params: at(key),
      body: { reason },
    }),
  );
}

export function withdraw(key: RevisionKey, body: WithdrawalBody) {
  return ask(api.POST('/api/correlations/{slug}/revisions/{number}/withdrawal', { params: at(key), body }));
}
