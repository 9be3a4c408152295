import { citationKey, formatCitation, sameWork, type CslItem } from '@merestone/engine';
import { Button } from 'antd';
import { useState } from 'react';
import { Link } from 'react-router-dom';
import { asApiProblem, type ApiProblem } from '../../../shared/api/api-problem';
import { paths } from '../../../shared/paths';
import { readCitations, type CitationReading } from '../api/read-citations';
import { citationFields, citationOf } from '../model/csl-form';
import type { SourceRow } from '../model/draft-form';
import { emptySource } from '../model/empty-rows';
import { draftFieldId } from '../model/field-id';
import { useDraftTools } from './draft-context';
import { focusSoon } from './row-list';

/** References pasted as BibTeX or RIS, read by the server, and taken over one by one. */
export function PasteReferences({ rows }: { rows: readonly SourceRow[] }) {
  const { change } = useDraftTools();
  const [text, setText] = useState('');
  const [reading, setReading] = useState<CitationReading | null>(null);
  const [problem, setProblem] = useState<ApiProblem | null>(null);
  const [busy, setBusy] = useState(false);

  const read = async () => {
    setBusy(true);
    setProblem(null);
    try {
      setReading(await readCitations(text));
    } catch (thrown) {
      setReading(null);
      setProblem(asApiProblem(thrown));
    } finally {
      setBusy(false);
    }
  };
  const add = (csl: CslItem) => {
    const row = { ...emptySource(), ...citationFields(csl) };
    // The first row is there before anything was written in it; a reference takes its place.
    const blank = rows.findIndex((one) => one.title === '' && one.authors === '' && one.place === '');
    if (blank >= 0) change({ do: 'edit-row', list: 'sources', at: blank, patch: citationFields(csl) });
    else change({ do: 'add-row', list: 'sources', row });
    focusSoon(draftFieldId(`sources[${blank >= 0 ? blank : rows.length}].place`));
  };

  return (
    <details className="draft-more">
      <summary>Paste references as BibTeX or RIS</summary>
      <label className="field-label" htmlFor="draft-references">
        References
      </label>
      <textarea
        id="draft-references"
        className="draft-input draft-input-long draft-input-code"
        rows={4}
        value={text}
        spellCheck={false}
        aria-invalid={problem !== null}
        aria-describedby={problem ? 'draft-references-error' : 'draft-references-hint'}
        onChange={(event) => setText(event.target.value)}
      />
      {problem ? (
        <p className="field-error" id="draft-references-error" role="alert">
          {problem.detail || problem.title}
        </p>
      ) : (
        <p className="field-hint" id="draft-references-hint">
          As a journal’s page or a reference manager hands them out; several at once are fine.
        </p>
      )}
      <Button loading={busy} disabled={text.trim() === ''} onClick={() => void read()}>
        Read references
      </Button>
      {reading ? (
        <ol className="draft-references" aria-label="References read">
          {reading.items.map((csl, i) => (
            <li key={`${csl.title ?? ''}${i}`}>
              {formatCitation(csl).text}{' '}
              <Button size="small" onClick={() => add(csl)}>
                Take over
              </Button>
              <ReferenceNotes reading={reading} at={i} already={alreadyHere(csl, rows)} />
            </li>
          ))}
          {reading.problems
            .filter(({ field }) => !field.startsWith('items.'))
            .map(({ message }) => (
              <li key={message} className="field-error">
                {message}
              </li>
            ))}
        </ol>
      ) : null}
    </details>
  );
}

interface ReferenceNotesProps {
  reading: CitationReading;
  at: number;
  already: number | null;
}

/** What was changed in reading, and who cites the work already. */
function ReferenceNotes({ reading, at, already }: ReferenceNotesProps) {
  const problems = reading.problems.filter(
    ({ field }) => field === `items.${at}` || field.startsWith(`items.${at}.`),
  );
  const cited = reading.alreadyCitedBy.filter(({ item }) => item === at);
  return (
    <>
      {already === null ? null : (
        <p className="draft-twin">Source {already + 1} of this draft is the same work.</p>
      )}
      {problems.map(({ message }) => (
        <p key={message} className="draft-twin">
          {message}
        </p>
      ))}
      {cited.length > 0 ? (
        <p className="field-hint">
          Cited already by{' '}
          {cited.map(({ slug, title, kind }, i) => (
            <span key={slug}>
              {i > 0 ? '; ' : ''}
              <Link to={kind === 'correlation' ? paths.sheet(slug) : paths.propertyEquation(slug)}>
                {title}
              </Link>
            </span>
          ))}
          .
        </p>
      ) : null}
    </>
  );
}

function alreadyHere(csl: CslItem, rows: readonly SourceRow[]): number | null {
  const key = citationKey(csl);
  const at = rows.findIndex((row) => sameWork(key, citationKey(citationOf(row))) !== undefined);
  return at < 0 ? null : at;
}
