import { Button } from 'antd';
import type { Attachment, Licence } from '../../../shared/api/types';
import { formatDay } from '../../../shared/format/format-date';
import { useAct } from '../../../shared/hooks/use-act';
import { ProblemNotice } from '../../../shared/ui/problem-notice';
import { fileAddress } from '../api/use-attachments';
import { activeContentWords, documentWords, LICENCE_ACTS, LICENCE_WORDS } from '../model/document-words';

interface DocumentLineProps {
  slug: string;
  revision: number;
  document: Attachment;
  /** Null for who may not change it. */
  onLicence: ((licence: Licence) => Promise<void>) | null;
}

/** One document: what it is, who attached it, whether it may leave the office, and whether it would act by itself. */
export function DocumentLine({ slug, revision, document, onLicence }: DocumentLineProps) {
  const { id, name, licence, by, at, sha256, activeContent } = document;
  const { working, problem, run } = useAct();
  const active = activeContentWords(activeContent);
  const other: Licence = licence === 'may-leave' ? 'office-only' : 'may-leave';
  return (
    <li>
      <a href={fileAddress(slug, revision, id)} download={name}>
        {name}
      </a>{' '}
      ({documentWords(document)})
      <span className="document-note">
        attached by {by.name} on {formatDay(at)}; {LICENCE_WORDS[licence]};{' '}
        <span title={`SHA-256 of the file: ${sha256}`}>hash {sha256.slice(0, 8)}</span>
      </span>
      {active ? <strong className="document-active">{active}</strong> : null}
      {onLicence ? (
        <Button
          type="link"
          size="small"
          className="document-licence"
          loading={working}
          aria-label={`${LICENCE_ACTS[other]}: ${name}`}
          onClick={() => void run(() => onLicence(other))}
        >
          {LICENCE_ACTS[other]}
        </Button>
      ) : null}
      {problem ? <ProblemNotice problem={problem} /> : null}
    </li>
  );
}
