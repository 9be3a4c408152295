import { Button } from 'antd';
import type { Draft } from '../hooks/use-draft';
import { idsFor } from '../model/field-id';
import { saveWords } from '../model/save-words';
import { sectionId, type SectionKey } from '../model/sections';
import { FieldLink, goToFirst } from './field-link';
import { FINDINGS_ID } from './findings-note';
import { RowAct } from './row-list';

interface SaveBarProps {
  draft: Draft;
  onEnter: () => void;
}

/** Where the draft is kept, in words, and the act that comes next; it stays in sight. */
export function SaveBar({ draft, onEnter }: SaveBarProps) {
  const { autosave, saveState, live, opening, form, acting } = draft;
  const { verdict } = live;
  const errors = verdict.report?.remarks.filter((remark) => remark.verdict === 'error').length ?? 0;
  const counts = [
    count(verdict.wrong.length + errors, 'error'),
    count(verdict.empty.length, 'open place'),
  ].filter(Boolean);
  return (
    <div className="draft-bar">
      <p className="draft-bar-words">
        <span role="status">{saveWords(saveState)}.</span>{' '}
        {counts.length > 0 ? <FieldLink id={FINDINGS_ID}>{counts.join(', ')}</FieldLink> : null}
        {draft.removed ? (
          <>
            {' '}
            Row removed.{' '}
            <RowAct what="Put the removed row back" onClick={() => draft.change({ do: 'put-back' })}>
              Put it back
            </RowAct>
          </>
        ) : null}
      </p>
      {autosave.base === null ? (
        <Button type="primary" loading={acting} onClick={onEnter}>
          {opening.kind === 'new' ? 'Enter as a draft' : `Open revision ${opening.nextRevision} as a draft`}
        </Button>
      ) : autosave.held && form !== opening.form ? (
        <Button onClick={autosave.release}>Change it; verdicts so far no longer count</Button>
      ) : (
        <Button onClick={() => goToFirst([SUBMIT_ID])}>Submit for review …</Button>
      )}
    </div>
  );
}

export const SUBMIT_ID = 'draft-submit';

/** Leads to the first thing that keeps an act from going through. */
export function goToProblem(field: string, section: SectionKey): void {
  goToFirst([...idsFor(field), sectionId(section)]);
}

function count(number: number, noun: string): string {
  return number === 0 ? '' : `${number} ${noun}${number === 1 ? '' : 's'}`;
}
