import { Button } from 'antd';
import { useState } from 'react';
import { Link } from 'react-router-dom';
import { paths } from '../../../shared/paths';
import { useReviewers } from '../api/use-reviewers';
import type { Draft } from '../hooks/use-draft';
import { TickField } from './fields/tick-field';
import { SUBMIT_ID } from './save-bar';

interface SubmitSectionProps {
  draft: Draft;
  personId: string;
  onSubmit: (reviewers: string[]) => void;
}

/** Hands the revision to its reviewers. What the machine finds wrong stops it here. */
export function SubmitSection({ draft, personId, onSubmit }: SubmitSectionProps) {
  const { reviewers } = useReviewers(personId);
  const [asked, setAsked] = useState<string[]>([]);
  const { autosave, live, acting } = draft;
  const why = whyNot(draft);
  const warnings = live.verdict.report?.remarks.filter(({ verdict }) => verdict === 'warning').length ?? 0;
  return (
    <section aria-labelledby={`${SUBMIT_ID}-title`} className="draft-section">
      <h2 id={`${SUBMIT_ID}-title`}>
        <span id={SUBMIT_ID} tabIndex={-1}>
          Submit for review
        </span>
      </h2>
      <p className="draft-about">
        The machine checks the sheet first; errors stop it, warnings travel along to the reviewers. From then
        on every change of content voids the verdicts given before it.
      </p>
      {reviewers.length > 0 ? (
        <fieldset className="draft-ticks">
          <legend>Ask to review (optional; else whoever takes it from the desk)</legend>
          {reviewers.map(({ id, name }) => (
            <TickField
              key={id}
              path={`reviewers.${id}`}
              label={name}
              checked={asked.includes(id)}
              onChange={(ticked) => setAsked(ticked ? [...asked, id] : asked.filter((one) => one !== id))}
            />
          ))}
        </fieldset>
      ) : null}
      <div className="draft-row-acts">
        <Button
          type="primary"
          loading={acting}
          disabled={why !== null || autosave.saving}
          aria-describedby={`${SUBMIT_ID}-words`}
          onClick={() => onSubmit(asked)}
        >
          Submit for review
        </Button>
        <p className="draft-told" id={`${SUBMIT_ID}-words`}>
          {why ?? (warnings > 0 ? `${warnings} warnings will travel along.` : 'Nothing stands in its way.')}
          {autosave.base !== null && autosave.standing === 'in review' ? (
            <>
              {' '}
              <Link to={paths.review(draft.form.slug, autosave.base.revision)}>Its review</Link>
            </>
          ) : null}
        </p>
      </div>
    </section>
  );
}

function whyNot({ autosave, live, opening }: Draft): string | null {
  if (autosave.base === null)
    return opening.kind === 'new'
      ? 'Enter the sheet in the register as a draft first.'
      : `Open revision ${opening.nextRevision} as a draft first.`;
  if (autosave.theirs !== null) return 'Choose first which version counts.';
  if (autosave.standing === 'in review')
    return 'It is in review. Once it is changed as asked, say on its review page that it is ready again.';
  if (live.verdict.definition === null) return 'The sheet is not whole yet; the findings say what is open.';
  const errors = live.verdict.report?.remarks.filter(({ verdict }) => verdict === 'error').length ?? 0;
  return errors > 0
    ? `The machine finds ${errors === 1 ? 'an error' : `${errors} errors`}; see the findings.`
    : null;
}
