import type { Remark } from '@merestone/engine';
import { MarginNote } from '../../../shared/ui/margin-note';
import type { LiveDraft } from '../hooks/use-draft-verdict';
import type { DraftForm } from '../model/draft-form';
import type { FormProblem } from '../model/form-reading';
import { placeWords } from '../model/place-words';
import { SECTIONS, sectionId, sectionOf } from '../model/sections';
import { FieldLink } from './field-link';

export const FINDINGS_ID = 'draft-findings';

/** What the machine finds, each line leading to its field: what is open, what is wrong, and the report of the check. */
export function FindingsNote({ live }: { live: LiveDraft }) {
  const { verdict, form } = live;
  return (
    <div id={FINDINGS_ID} tabIndex={-1} className="draft-findings">
      <MarginNote title="Machine’s findings">
        {verdict.wrong.length > 0 ? (
          <ul>
            {verdict.wrong.map((problem) => (
              <Wrong key={problem.field + problem.message} problem={problem} form={form} />
            ))}
          </ul>
        ) : null}
        {verdict.empty.length > 0 ? <StillOpen empty={verdict.empty} form={form} /> : null}
        {verdict.report ? <Report remarks={verdict.report.remarks} form={form} /> : null}
      </MarginNote>
    </div>
  );
}

function Wrong({ problem: { field, message }, form }: { problem: FormProblem; form: DraftForm }) {
  return (
    <li className="draft-error">
      <FieldLink path={field}>{placeWords(field, form)}</FieldLink>: {message}
    </li>
  );
}

/** What is still to be filled in, by section, so that a new sheet does not begin with a list of reproaches. */
function StillOpen({ empty, form }: { empty: readonly FormProblem[]; form: DraftForm }) {
  const sections = SECTIONS.map(({ key, title }) => ({
    key,
    title,
    fields: empty.filter(({ field }) => sectionOf(field) === key),
  })).filter(({ fields }) => fields.length > 0);
  return (
    <details className="draft-open-list">
      <summary>
        Still to be filled in: {empty.length} {empty.length === 1 ? 'place' : 'places'}
      </summary>
      <ul>
        {sections.map(({ key, title, fields }) => (
          <li key={key}>
            <FieldLink id={sectionId(key)}>{title}</FieldLink>:{' '}
            {fields.map(({ field }, i) => (
              <span key={field}>
                {i > 0 ? '; ' : ''}
                <FieldLink path={field}>{lower(placeWords(field, form))}</FieldLink>
              </span>
            ))}
          </li>
        ))}
      </ul>
    </details>
  );
}

const ORDER = ['error', 'warning', 'passed'] as const;
const WORDS: Readonly<Record<Remark['verdict'], string>> = {
  error: 'Stops a submission',
  warning: 'Travels along to the reviewers',
  passed: 'Passed',
};

function Report({ remarks, form }: { remarks: readonly Remark[]; form: DraftForm }) {
  return ORDER.map((verdict) => {
    const lines = remarks.filter((remark) => remark.verdict === verdict);
    if (lines.length === 0) return null;
    return (
      <details key={verdict} open={verdict !== 'passed'} className={`draft-remarks draft-remarks-${verdict}`}>
        <summary>
          {WORDS[verdict]} ({lines.length})
        </summary>
        <ul>
          {lines.map(({ field, message }) => (
            <li key={field + message}>
              {field === '' ? null : (
                <>
                  <FieldLink path={field}>{placeWords(field, form)}</FieldLink>:{' '}
                </>
              )}
              {message}
            </li>
          ))}
        </ul>
      </details>
    );
  });
}

function lower(words: string): string {
  return words.charAt(0).toLowerCase() + words.slice(1);
}
