import { Link } from 'react-router-dom';
import { DraftLinks } from '../../features/draft/components/draft-links';
import { ReportProblem } from '../../features/problem-reports/components/report-problem';
import { StandingActs } from '../../features/reviews/components/standing-acts';
import { ExportLinks } from '../../features/sheet/components/export-links';
import type { Sheet } from '../../shared/api/types';
import { paths } from '../../shared/paths';
import { useSession } from '../../shared/session/use-session';

/** What can be done with a sheet from its page: where to go on from it, and the acts the viewer may do. */
export function SheetActs({ sheet }: { sheet: Sheet }) {
  const { may } = useSession();
  const { slug, revision, revisions, standing, abilities, geometry } = sheet;
  const before = revisions.map(({ number }) => number).filter((number) => number < revision);
  const reviewed = standing !== 'draft';
  return (
    <nav className="sheet-acts" aria-label="This sheet">
      {reviewed ? (
        <Link to={paths.review(slug, revision)}>{standing === 'in review' ? 'Review' : 'Its review'}</Link>
      ) : null}
      {before.length > 0 ? (
        <Link to={paths.differences(slug, Math.max(...before), revision)}>
          Differences from rev {Math.max(...before)}
        </Link>
      ) : null}
      <DraftLinks slug={slug} />
      <ExportLinks sheet={sheet} />
      {may('problem-report.file') ? <ReportProblem slug={slug} revision={revision} /> : null}
      <StandingActs revisionKey={{ slug, revision }} geometry={geometry} abilities={abilities} />
    </nav>
  );
}
