import { Button } from 'antd';
import { useState } from 'react';
import type { Review } from '../../../shared/api/types';
import { useAct } from '../../../shared/hooks/use-act';
import { useKeptText } from '../../../shared/hooks/use-kept-text';
import { ErrorSummary } from '../../../shared/ui/error-summary';
import { Field, describedBy } from '../../../shared/ui/fields/field';
import { TextArea } from '../../../shared/ui/fields/text-area';
import { TextInput } from '../../../shared/ui/fields/text-input';
import { ProblemNotice } from '../../../shared/ui/problem-notice';
import { shortHash } from '../../../shared/ui/running-head';
import type { ApprovalBody } from '../api/review-calls';
import { APPROVAL_IDS, approvalBody, approvalFaults } from '../model/approval-draft';
import { isStale } from '../model/is-stale';
import { StaleNotice } from './stale-notice';

interface ApprovalFormProps {
  review: Review;
  onApprove: (body: ApprovalBody) => Promise<unknown>;
  onReload: () => void;
}

const MEANING = 'Approved by this office for design within the stated bounds.';

/** A technical authority's signature: what it means, from when, until when it is looked at again, and the password. */
export function ApprovalForm({ review, onApprove, onReload }: ApprovalFormProps) {
  const name = `${review.slug}/${review.revision}`;
  const meaning = useKeptText(`approval-meaning:${name}`);
  const note = useKeptText(`approval-note:${name}`);
  const [rest, setRest] = useState({ effectiveFrom: '', reviewDue: '', password: '' });
  const [meaningTouched, setMeaningTouched] = useState(false);
  const [pressed, setPressed] = useState(false);
  const { working, problem, run } = useAct();

  const meant = meaning.text === '' && !meaningTouched ? MEANING : meaning.text;
  const draft = { ...rest, meaning: meant, note: note.text };
  const faults = pressed ? approvalFaults(draft, today()) : [];
  const refused = problem?.fields.find(({ field }) => field === 'password')?.message;
  const errorOf = (id: string) => faults.find(({ fieldId }) => fieldId === id)?.message;
  const set = (field: keyof typeof rest) => (value: string) => setRest({ ...rest, [field]: value });

  const sign = async () => {
    setPressed(true);
    if (approvalFaults(draft, today()).length > 0) return;
    const done = await run(() => onApprove(approvalBody(draft, review.hash)));
    // A password is never kept, not even after a refusal.
    setRest((now) => ({ ...now, password: '' }));
    setPressed(false);
    if (!done) return;
    meaning.clear();
    note.clear();
  };
  return (
    <form
      className="approval-form"
      noValidate
      onSubmit={(event) => {
        event.preventDefault();
        void sign();
      }}
    >
      <h3>Approve revision {review.revision}</h3>
      <p>
        Your signature is kept with your name, the time, its meaning and the hash of the content,{' '}
        <span className="tabular">{shortHash(review.hash)}</span>. The content is frozen from then on:{' '}
        <strong>this cannot be undone</strong>, and a change is a new revision.
      </p>
      {problem && isStale(problem) ? <StaleNotice onReload={onReload} /> : null}
      {problem && !isStale(problem) ? <ProblemNotice problem={problem} /> : null}
      <ErrorSummary title="The approval is not signed yet" errors={faults} />
      <Field id={APPROVAL_IDS.meaning} label="What the signature means" error={errorOf(APPROVAL_IDS.meaning)}>
        <TextArea
          id={APPROVAL_IDS.meaning}
          rows={2}
          maxLength={300}
          value={meant}
          onChange={(text) => {
            setMeaningTouched(true);
            meaning.change(text);
          }}
          {...describedBy(APPROVAL_IDS.meaning, { error: errorOf(APPROVAL_IDS.meaning) })}
        />
      </Field>
      <div className="approval-dates">
        <DateField
          id={APPROVAL_IDS.effectiveFrom}
          label="It holds from"
          hint="Empty: from now on."
          value={rest.effectiveFrom}
          error={errorOf(APPROVAL_IDS.effectiveFrom)}
          onChange={set('effectiveFrom')}
        />
        <DateField
          id={APPROVAL_IDS.reviewDue}
          label="To be looked at again by"
          hint="Empty: after the office’s usual time."
          value={rest.reviewDue}
          error={errorOf(APPROVAL_IDS.reviewDue)}
          onChange={set('reviewDue')}
        />
      </div>
      <Field id={APPROVAL_IDS.note} label="Note, if there is something to say">
        <TextArea id={APPROVAL_IDS.note} rows={2} maxLength={4000} value={note.text} onChange={note.change} />
      </Field>
      <Field
        id={APPROVAL_IDS.password}
        label="Your password, once more"
        error={errorOf(APPROVAL_IDS.password) ?? refused}
      >
        <TextInput
          id={APPROVAL_IDS.password}
          type="password"
          autoComplete="current-password"
          value={rest.password}
          onChange={set('password')}
          {...describedBy(APPROVAL_IDS.password, { error: errorOf(APPROVAL_IDS.password) ?? refused })}
        />
      </Field>
      <p className="act-line">
        <Button type="primary" htmlType="submit" loading={working}>
          Sign and approve revision {review.revision}
        </Button>
      </p>
    </form>
  );
}

interface DateFieldProps {
  id: string;
  label: string;
  hint: string;
  value: string;
  error: string | undefined;
  onChange: (value: string) => void;
}

/** A day by the browser's own picker; its value is `2026-03-04` or empty. */
function DateField({ id, label, hint, value, error, onChange }: DateFieldProps) {
  return (
    <Field id={id} label={label} hint={hint} error={error}>
      <TextInput
        id={id}
        type="date"
        value={value}
        onChange={onChange}
        {...describedBy(id, { error, hint: true })}
      />
    </Field>
  );
}

/** This day where the office is, as a date field has it. */
function today(): string {
  const now = new Date();
  const two = (number: number) => String(number).padStart(2, '0');
  return `${now.getFullYear()}-${two(now.getMonth() + 1)}-${two(now.getDate())}`;
}
