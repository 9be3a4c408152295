import { Button } from 'antd';
import { useState } from 'react';
import type { Review, Verdict } from '../../../shared/api/types';
import { useAct } from '../../../shared/hooks/use-act';
import { useKeptText } from '../../../shared/hooks/use-kept-text';
import { ActDialog } from '../../../shared/ui/act-dialog';
import { ErrorSummary } from '../../../shared/ui/error-summary';
import { Field, describedBy } from '../../../shared/ui/fields/field';
import { TextArea } from '../../../shared/ui/fields/text-area';
import { ProblemNotice } from '../../../shared/ui/problem-notice';
import type { VerdictBody } from '../api/review-calls';
import { useChecklist } from '../hooks/use-checklist';
import { isStale } from '../model/is-stale';
import { CHECKLIST } from '../model/review-words';
import { NOTE_ID, verdictFaults } from '../model/verdict-faults';
import { Checkpoints } from './checkpoints';
import { StaleNotice } from './stale-notice';

interface VerdictFormProps {
  review: Review;
  onVerdict: (body: VerdictBody) => Promise<unknown>;
  onReload: () => void;
}

const ASKED: Readonly<Record<Exclude<Verdict['verdict'], 'recommend'>, { act: string; words: string }>> = {
  'ask-for-changes': {
    act: 'Ask for changes',
    words:
      'The revision goes back to its originator with your note. Every edit opens the next iteration, and verdicts given before it no longer count.',
  },
  decline: {
    act: 'Decline',
    words:
      'The revision is declined and its review ends here. This cannot be undone; a later try is a new revision.',
  },
};

/** The checklist, a note and the three verdicts; a favourable one needs the whole list. */
export function VerdictForm({ review, onVerdict, onReload }: VerdictFormProps) {
  const name = `${review.slug}/${review.revision}`;
  const note = useKeptText(`verdict:${name}`);
  const { checklist, tick, clear } = useChecklist(name, review.hash);
  const [pressed, setPressed] = useState<Verdict['verdict'] | null>(null);
  const [asking, setAsking] = useState<Exclude<Verdict['verdict'], 'recommend'> | null>(null);
  const { working, problem, run } = useAct();
  const faults = pressed ? verdictFaults(pressed, checklist, note.text) : [];
  const noteError = faults.find(({ fieldId }) => fieldId === NOTE_ID)?.message;

  const send = async (verdict: Verdict['verdict']) => {
    const text = note.text.trim();
    const body = { verdict, checklist, ...(text === '' ? {} : { note: text }) };
    setAsking(null);
    if (!(await run(() => onVerdict(body)))) return;
    note.clear();
    clear();
    setPressed(null);
  };
  const press = (verdict: Verdict['verdict']) => {
    setPressed(verdict);
    if (verdictFaults(verdict, checklist, note.text).length > 0) return;
    if (verdict === 'recommend') void send(verdict);
    else setAsking(verdict);
  };
  return (
    <section className="verdict-form" aria-labelledby="your-verdict">
      <h2 id="your-verdict" tabIndex={-1}>
        Your verdict
      </h2>
      {problem && isStale(problem) ? <StaleNotice onReload={onReload} /> : null}
      {problem && !isStale(problem) ? <ProblemNotice problem={problem} /> : null}
      <ErrorSummary title="The verdict is not given yet" errors={faults} />
      <Checkpoints
        points={CHECKLIST}
        checklist={checklist}
        missing={faults.map(({ fieldId }) => fieldId)}
        onTick={tick}
      />
      <Field
        id={NOTE_ID}
        label="Note to the originator and the technical authority"
        hint="Needed where you do not recommend it."
        error={noteError}
      >
        <TextArea
          id={NOTE_ID}
          value={note.text}
          maxLength={4000}
          onChange={note.change}
          {...describedBy(NOTE_ID, { error: noteError, hint: true })}
        />
      </Field>
      <p className="act-line">
        <Button type="primary" loading={working} onClick={() => press('recommend')}>
          Recommend revision {review.revision}
        </Button>
        <Button disabled={working} onClick={() => press('ask-for-changes')}>
          Ask for changes
        </Button>
        <Button disabled={working} onClick={() => press('decline')}>
          Decline revision {review.revision}
        </Button>
      </p>
      {asking ? (
        <ActDialog
          title={`${ASKED[asking].act}: revision ${review.revision}`}
          act={`${ASKED[asking].act}${asking === 'decline' ? ` revision ${review.revision}` : ''}`}
          working={working}
          onAct={() => void send(asking)}
          onLeave={() => setAsking(null)}
        >
          <p>{ASKED[asking].words}</p>
          <blockquote className="quoted-note">{note.text.trim()}</blockquote>
        </ActDialog>
      ) : null}
    </section>
  );
}
