import type { ReviewComment } from '../../../shared/api/types';

/** What may be said about a revision, and the acts that say it. Each rejects with what it was refused with. */
export interface Talk {
  /** Names the revision, for texts that are kept until they are sent. */
  name: string;
  mayComment: boolean;
  comment: (field: string, text: string) => Promise<unknown>;
  answer: (comment: ReviewComment, text: string) => Promise<unknown>;
  resolve: (comment: ReviewComment) => Promise<unknown>;
}
