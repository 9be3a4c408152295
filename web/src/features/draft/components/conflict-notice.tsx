import { Button } from 'antd';
import { formatMinute } from '../../../shared/format/format-date';
import type { Draft } from '../hooks/use-draft';

/** Two versions of one draft: which is which, and both ways on. Nothing of either is lost. */
export function ConflictNotice({ draft }: { draft: Draft }) {
  const { theirs } = draft.autosave;
  if (!theirs) return null;
  return (
    <div className="notice notice-problem" role="alert">
      <p className="notice-title">Somebody has changed this draft while you were working on it.</p>
      <p>
        The register has iteration {theirs.iteration} of revision {theirs.revision}, titled “{theirs.title}”.
        What you typed is still here and has not been saved over it.
      </p>
      <div className="draft-row-acts">
        <Button onClick={() => draft.takeTheirs(theirs)}>Take theirs, set mine aside</Button>
        <Button onClick={() => draft.keepMine(theirs)}>Keep mine as the next save</Button>
      </div>
      <p className="draft-about">
        Taking theirs keeps yours in this browser, to be brought back. Keeping yours leaves theirs in the
        register as an earlier iteration.
      </p>
    </div>
  );
}

/** The version that gave way, offered until it is brought back or dropped. */
export function SetAsideNotice({ draft }: { draft: Draft }) {
  const { version, drop } = draft.aside;
  if (!version) return null;
  return (
    <div className="notice notice-empty">
      <p>Your own version of {formatMinute(version.at)} is set aside in this browser.</p>
      <div className="draft-row-acts">
        <Button
          onClick={() => {
            draft.change({ do: 'replace', form: version.form });
            drop();
          }}
        >
          Bring mine back into the form
        </Button>
        <Button onClick={drop}>Drop it</Button>
      </div>
    </div>
  );
}
