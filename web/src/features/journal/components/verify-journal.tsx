import { Button } from 'antd';
import type { JournalVerification } from '../../../shared/api/types';
import { ProblemNotice } from '../../../shared/ui/problem-notice';
import { useVerification } from '../api/use-journal';
import './journal.css';

/** Has every hash recomputed, and says what came of it. */
export function VerifyJournal() {
  const { verification, problem, working, verify } = useVerification();
  return (
    <div className="journal-verify">
      <Button type="primary" loading={working} onClick={() => void verify()}>
        Verify the journal
      </Button>
      <p role="status" className={verification && !verification.ok ? 'journal-fault' : ''}>
        {verification && !working ? resultWords(verification) : ''}
      </p>
      {problem ? <ProblemNotice problem={problem} /> : null}
    </div>
  );
}

function resultWords({ ok, entries, firstFault }: JournalVerification): string {
  const count = `${entries} ${entries === 1 ? 'entry' : 'entries'}`;
  if (ok) return `All ${count} recomputed: nothing is altered, missing or out of order.`;
  if (!firstFault) return `${count} are right; what follows is not.`;
  return `Entry ${firstFault.index} is not right (${firstFault.kind}): ${firstFault.message}`;
}
