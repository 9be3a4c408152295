import { useMemo } from 'react';
import { Link, useParams } from 'react-router-dom';
import { AttachmentsSection } from '../../features/attachments/components/attachments-section';
import { DutyPanel } from '../../features/evaluation/components/duty-panel';
import { OutcomePanel } from '../../features/evaluation/components/outcome-panel';
import { useEvaluation } from '../../features/evaluation/hooks/use-evaluation';
import { ReportList } from '../../features/problem-reports/components/report-list';
import { useSheet } from '../../features/sheet/api/use-sheet';
import { SheetArticle } from '../../features/sheet/components/sheet-article';
import type { ApiProblem } from '../../shared/api/api-problem';
import type { Sheet } from '../../shared/api/types';
import { paths } from '../../shared/paths';
import { useSession } from '../../shared/session/use-session';
import { Loading } from '../../shared/ui/loading';
import { ProblemNotice } from '../../shared/ui/problem-notice';
import { SheetPage } from '../../shared/ui/sheet-page';
import { NotFound } from './not-found';
import { SheetActs } from './sheet-acts';

/** The sheet of a correlation, in use or as a given revision, with the evaluation of a duty beside it. */
export function SheetRoute() {
  const { slug = '', n } = useParams();
  const revision = n === undefined ? null : Number(n);
  if (revision !== null && !(Number.isInteger(revision) && revision > 0)) return <NotFound />;
  return <LoadedSheet key={`${slug}/${n ?? ''}`} slug={slug} revision={revision} />;
}

function LoadedSheet({ slug, revision }: { slug: string; revision: number | null }) {
  const { sheet, problem, refetch } = useSheet(slug, revision);
  const { session } = useSession();
  if (sheet && session) return <EvaluatedSheet sheet={sheet} personId={session.person.id} />;
  if (problem) return <SheetProblem problem={problem} onRetry={refetch} />;
  return (
    <SheetPage title="Sheet">
      <Loading what="the sheet" />
    </SheetPage>
  );
}

function SheetProblem({ problem, onRetry }: { problem: ApiProblem; onRetry: () => void }) {
  const final = problem.status === 404 || problem.status === 403;
  return (
    <SheetPage title={problem.status === 404 ? 'No such sheet' : 'The sheet cannot be shown'}>
      <ProblemNotice problem={problem} {...(final ? {} : { onRetry })} />
      <p>
        <Link to={paths.register}>Search the register</Link>
      </p>
    </SheetPage>
  );
}

function EvaluatedSheet({ sheet, personId }: { sheet: Sheet; personId: string }) {
  const evaluated = useMemo(
    () => ({
      slug: sheet.slug,
      title: sheet.title,
      revision: sheet.revision,
      standing: sheet.standing,
      hash: sheet.hash,
      definition: sheet.definition,
      equations: sheet.equations,
      caution: sheet.caution,
    }),
    [sheet],
  );
  const evaluation = useEvaluation(evaluated, personId);
  const notInUse = sheet.abilities.evaluate ? null : whyNot(sheet);
  return (
    <SheetArticle
      sheet={sheet}
      live={evaluation.readings}
      links={<SheetActs sheet={sheet} />}
      duty={<DutyPanel evaluation={evaluation} notInUse={notInUse} />}
      outcome={(firstNumber) => (
        <OutcomePanel evaluation={evaluation} firstNumber={firstNumber} notInUse={notInUse} />
      )}
      reports={<ReportList slug={sheet.slug} />}
      documents={
        <AttachmentsSection slug={sheet.slug} revision={sheet.revision} sources={sheet.definition.sources} />
      }
    />
  );
}

function whyNot({ standing }: Sheet): string {
  return standing === 'approved'
    ? 'Your role reads sheets and keeps no evaluations. The preview works all the same.'
    : `This revision is ${standing}: an evaluation with it is not kept for you. The preview serves comparison only.`;
}
