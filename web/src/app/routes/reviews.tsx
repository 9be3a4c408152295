import { useDesk } from '../../features/desk/api/use-desk';
import { RowBound } from '../../features/register/components/register-row';
import '../../features/register/components/register.css';
import { useInReview } from '../../features/reviews/api/use-in-review';
import { ReviewsView } from '../../features/reviews/components/reviews-view';
import { Loading } from '../../shared/ui/loading';
import { MarginNote } from '../../shared/ui/margin-note';
import { ProblemNotice } from '../../shared/ui/problem-notice';
import { SheetPage } from '../../shared/ui/sheet-page';

/** What of the desk is about reviews, in the order of a reviewer's day. */
const ABOUT_REVIEWS = ['to-review', 'to-take', 'open-comments', 'to-approve'];

export function ReviewsRoute() {
  const { sections, problem, retry } = useDesk();
  const inReview = useInReview();
  const shown = ABOUT_REVIEWS.flatMap((key) => sections?.filter((section) => section.key === key) ?? []);
  return (
    <SheetPage
      title="Reviews"
      subtitle="Revisions on their way into use, and what each one waits for."
      margin={
        <MarginNote title="How a revision gets into use">
          The machine checks it, peers hold it against its source, and a technical authority who is neither
          its originator nor one of its reviewers decides.
        </MarginNote>
      }
    >
      {problem ? <ProblemNotice problem={problem} onRetry={retry} /> : null}
      {!sections && !problem ? <Loading what="the reviews" /> : null}
      {sections ? (
        <ReviewsView sections={shown} inReview={inReview} strip={(item) => <RowBound item={item} />} />
      ) : null}
    </SheetPage>
  );
}
