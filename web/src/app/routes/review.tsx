import { useMemo } from 'react';
import { Link, useParams } from 'react-router-dom';
import { DifferenceList } from '../../features/differences/components/difference-list';
import { iterationContents } from '../../features/differences/model/iteration-contents';
import { useReview } from '../../features/reviews/api/use-review';
import { ReviewArticle } from '../../features/reviews/components/review-article';
import { useReviewActs } from '../../features/reviews/hooks/use-review-acts';
import { CheckTable } from '../../features/sheet/components/checks-section';
import type { ApiProblem } from '../../shared/api/api-problem';
import type { Review } from '../../shared/api/types';
import { paths } from '../../shared/paths';
import { Loading } from '../../shared/ui/loading';
import { ProblemNotice } from '../../shared/ui/problem-notice';
import { SheetPage } from '../../shared/ui/sheet-page';
import { NotFound } from './not-found';

/** The review of one revision. */
export function ReviewRoute() {
  const { slug = '', n } = useParams();
  const revision = Number(n);
  if (!(Number.isInteger(revision) && revision > 0)) return <NotFound />;
  return <LoadedReview key={`${slug}/${revision}`} slug={slug} revision={revision} />;
}

function LoadedReview({ slug, revision }: { slug: string; revision: number }) {
  const { review, problem, refetch } = useReview(slug, revision);
  if (review) return <ShownReview review={review} />;
  if (problem) return <ReviewProblem problem={problem} onRetry={refetch} />;
  return (
    <SheetPage title="Review">
      <Loading what="the review" />
    </SheetPage>
  );
}

function ReviewProblem({ problem, onRetry }: { problem: ApiProblem; onRetry: () => void }) {
  const final = problem.status === 404 || problem.status === 403;
  return (
    <SheetPage title={problem.status === 404 ? 'No such review' : 'The review cannot be shown'}>
      <ProblemNotice problem={problem} {...(final ? {} : { onRetry })} />
      <p>
        <Link to={paths.reviews}>See all reviews</Link>
      </p>
    </SheetPage>
  );
}

function ShownReview({ review }: { review: Review }) {
  const acts = useReviewActs(review);
  const contents = useMemo(() => iterationContents(review.definition, review.iterations), [review]);
  return (
    <ReviewArticle
      review={review}
      acts={acts}
      check={(place) => {
        const report = review.inspection?.checks[place];
        return report ? (
          <CheckTable label={report.title} checks={[report]} />
        ) : (
          <p className="field-note">Not recomputed by the machine yet.</p>
        );
      }}
      differences={({ number, differences }) => (
        <DifferenceList
          level={3}
          differences={differences}
          before={contents.get(number)?.before ?? null}
          after={contents.get(number)?.after ?? review.definition}
        />
      )}
    />
  );
}
