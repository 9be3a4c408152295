import { formatMinute } from '../../../shared/format/format-date';
import type { Shown } from '../model/shown-outcome';

/** Whether the number is on record: the server's, with its id and time, or only this browser's preview. */
export function RecordLine({ shown }: { shown: Extract<Shown, { kind: 'preview' | 'kept' }> }) {
  if (shown.kind === 'preview')
    return (
      <p className="record-line">
        <span className="record-word">Preview</span> computed in this browser; nothing is on record until it
        is kept.
      </p>
    );
  const { id, at, standing, revision } = shown.outcome;
  return (
    <p className="record-line">
      <span className="record-word">Kept</span> computed by the server and kept on {formatMinute(at)} as{' '}
      <span className="record-id">{id}</span>, with revision {revision} ({standing}).
    </p>
  );
}
