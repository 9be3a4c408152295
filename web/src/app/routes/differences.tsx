import { useCallback } from 'react';
import { Link, useParams, useSearchParams } from 'react-router-dom';
import { DifferencesView } from '../../features/differences/components/differences-view';
import { chosenRevisions, type ChosenRevisions } from '../../features/differences/model/chosen-revisions';
import { useSheet } from '../../features/sheet/api/use-sheet';
import { paths } from '../../shared/paths';
import { EmptyState } from '../../shared/ui/empty-state';
import { Loading } from '../../shared/ui/loading';
import { MarginNote } from '../../shared/ui/margin-note';
import { ProblemNotice } from '../../shared/ui/problem-notice';
import { SheetPage } from '../../shared/ui/sheet-page';

/** What two revisions of a correlation do not have in common. */
export function DifferencesRoute() {
  const { slug = '' } = useParams();
  const [search, setSearch] = useSearchParams();
  const { sheet, problem, refetch } = useSheet(slug, null);
  const choose = useCallback(
    ({ from, to }: ChosenRevisions) => setSearch({ from: String(from), to: String(to) }, { replace: true }),
    [setSearch],
  );
  const chosen = sheet
    ? chosenRevisions(
        search,
        sheet.revisions.map(({ number }) => number),
      )
    : null;
  return (
    <SheetPage
      title={sheet ? `Differences: ${sheet.title}` : 'Differences'}
      heading="Differences"
      subtitle={sheet ? <Link to={paths.sheet(slug)}>{sheet.title}</Link> : null}
      margin={
        <MarginNote title="How to read them">
          Words taken out are struck, words put in are underlined. In a strip the earlier range is an outline,
          its figures above; the later one is solid, its figures below.
        </MarginNote>
      }
    >
      {problem ? (
        <ProblemNotice problem={problem} {...(problem.status === 404 ? {} : { onRetry: refetch })} />
      ) : null}
      {!sheet && !problem ? <Loading what="the revisions" /> : null}
      {sheet && chosen ? (
        <DifferencesView slug={slug} revisions={sheet.revisions} chosen={chosen} onChoose={choose} />
      ) : null}
      {sheet && !chosen ? (
        <EmptyState title="There is one revision only">
          <p>Once a second one is drafted, what it changes is told here, field by field.</p>
        </EmptyState>
      ) : null}
    </SheetPage>
  );
}
