import { Button } from 'antd';
import { useState } from 'react';
import { useRefreshRevision } from '../../../shared/hooks/use-refresh-revision';
import { fileReport } from '../api/report-calls';
import { SEVERITIES } from '../model/report-words';
import { ReportDialog } from './report-dialog';

/** Lets anybody who reads the sheet say that something is wrong with it. */
export function ReportProblem({ slug, revision }: { slug: string; revision: number }) {
  const [state, setState] = useState<'closed' | 'open' | 'filed'>('closed');
  const refresh = useRefreshRevision(slug);
  return (
    <>
      <Button type="link" size="small" onClick={() => setState('open')}>
        Report a problem with this sheet
      </Button>
      <span role="status" className="report-filed">
        {state === 'filed' ? 'Your report is filed; the technical authorities see it on their desks.' : ''}
      </span>
      {state === 'open' ? (
        <ReportDialog
          name={`${slug}/${revision}`}
          title="Report a problem with this sheet"
          act="File the report"
          words={`The report stands on record with your name, about revision ${revision}. A technical authority answers it, and may suspend the sheet while it is looked into.`}
          legend="How bad is it?"
          choices={SEVERITIES}
          textLabel="What is wrong, and how do you know?"
          onAct={async (severity, text) => {
            await fileReport(slug, { revision, severity, text });
            setState('filed');
            await refresh();
          }}
          onClose={() => setState((now) => (now === 'filed' ? now : 'closed'))}
        />
      ) : null}
    </>
  );
}
