import { useMemo } from 'react';
import type { Review } from '../../../shared/api/types';
import { useRefreshRevision } from '../../../shared/hooks/use-refresh-revision';
import {
  approve,
  putForward,
  resolveComment,
  sendAnswer,
  sendComment,
  sendVerdict,
  takeReview,
  type ApprovalBody,
  type VerdictBody,
} from '../api/review-calls';
import type { Talk } from '../model/talk';

export interface ReviewActs {
  talk: Talk;
  take: () => Promise<unknown>;
  verdict: (body: VerdictBody) => Promise<unknown>;
  putForward: (note: string) => Promise<unknown>;
  approve: (body: ApprovalBody) => Promise<unknown>;
  /** Fetches the present content. */
  reload: () => void;
}

/** What can be done on the page of a review; after each act everything it may have changed is fetched anew. */
export function useReviewActs(review: Review): ReviewActs {
  const { slug, revision, hash, abilities } = review;
  const refresh = useRefreshRevision(slug);
  return useMemo(() => {
    const key = { slug, revision };
    const then = async (act: Promise<unknown>) => {
      await act;
      await refresh();
    };
    return {
      talk: {
        name: `${slug}/${revision}`,
        mayComment: abilities.comment,
        comment: (field, text) => then(sendComment(key, field, text)),
        answer: ({ id }, text) => then(sendAnswer(key, id, text)),
        resolve: ({ id }) => then(resolveComment(key, id)),
      },
      take: () => then(takeReview(key)),
      verdict: (body) => then(sendVerdict(key, hash, body)),
      putForward: (note) => then(putForward(key, note)),
      approve: (body) => then(approve(key, body)),
      reload: () => void refresh(),
    };
  }, [slug, revision, hash, abilities.comment, refresh]);
}
