import { Button } from 'antd';
import { useState } from 'react';
import { Link } from 'react-router-dom';
import type { ProblemReport } from '../../../shared/api/types';
import { formatDay } from '../../../shared/format/format-date';
import { useRefreshRevision } from '../../../shared/hooks/use-refresh-revision';
import { paths } from '../../../shared/paths';
import { answerReport } from '../api/report-calls';
import { useProblemReports } from '../api/use-problem-reports';
import { OUTCOMES, OUTCOME_WORDS, SEVERITY_WORDS } from '../model/report-words';
import { ReportDialog } from './report-dialog';
import './problem-reports.css';

/** Problems reported with a correlation, open ones first; nothing at all where there are none. */
export function ReportList({ slug }: { slug: string }) {
  const { reports = [] } = useProblemReports(slug);
  if (reports.length === 0) return null;
  const open = reports.filter(({ answer }) => answer === null);
  const closed = reports.filter(({ answer }) => answer !== null);
  return (
    <section aria-labelledby="problem-reports">
      <h2 id="problem-reports">Problems reported</h2>
      <ul className="reports">
        {open.map((report) => (
          <ReportLine key={report.id} report={report} slug={slug} />
        ))}
      </ul>
      {closed.length > 0 ? (
        <details className="reports-closed">
          <summary>
            {closed.length === 1 ? 'One answered report' : `${closed.length} answered reports`}
          </summary>
          <ul className="reports">
            {closed.map((report) => (
              <ReportLine key={report.id} report={report} slug={slug} />
            ))}
          </ul>
        </details>
      ) : null}
    </section>
  );
}

function ReportLine({ report, slug }: { report: ProblemReport; slug: string }) {
  const { by, at, revision, severity, text, answer, abilities } = report;
  return (
    <li>
      <p className="report-who">
        <strong>{by.name}</strong> {SEVERITY_WORDS[severity]}, {formatDay(at)}, on{' '}
        <Link to={paths.revision(slug, revision)}>rev {revision}</Link>
      </p>
      <p className="report-text">{text}</p>
      {answer ? (
        <>
          <p className="report-who">
            <strong>{answer.by.name}</strong> {OUTCOME_WORDS[answer.outcome]}, {formatDay(answer.at)}
          </p>
          <p className="report-text">{answer.text}</p>
        </>
      ) : null}
      {abilities.answer ? <AnswerReport report={report} slug={slug} /> : null}
    </li>
  );
}

function AnswerReport({ report, slug }: { report: ProblemReport; slug: string }) {
  const [open, setOpen] = useState(false);
  const refresh = useRefreshRevision(slug);
  return (
    <>
      <Button size="small" onClick={() => setOpen(true)}>
        Answer the report
        <span className="heard-only"> of {report.by.name}</span>
      </Button>
      {open ? (
        <ReportDialog
          name={`answer/${report.id}`}
          title={`Answer the report of ${report.by.name}`}
          act="Send the answer"
          words="The answer closes the report and goes to whoever filed it."
          legend="What came of it"
          choices={OUTCOMES}
          textLabel="Your answer"
          onAct={async (outcome, text) => {
            await answerReport(report.id, { outcome, text });
            await refresh();
          }}
          onClose={() => setOpen(false)}
        />
      ) : null}
    </>
  );
}
