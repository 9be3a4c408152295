import type { Source } from '@merestone/engine';
import { Button } from 'antd';
import { useState } from 'react';
import type { Attachment } from '../../../shared/api/types';
import { DoneNote } from '../../../shared/ui/done-note';
import { Loading } from '../../../shared/ui/loading';
import { Citation } from '../../../shared/ui/on-sheet/citation';
import { ProblemNotice } from '../../../shared/ui/problem-notice';
import { useAttachments } from '../api/use-attachments';
import { AttachDialog } from './attach-dialog';
import { DocumentLine } from './document-line';
import './attachments.css';

interface AttachmentsSectionProps {
  slug: string;
  revision: number;
  sources: readonly Source[];
}

/** The documents behind a sheet, each under the source it is of. */
export function AttachmentsSection({ slug, revision, sources }: AttachmentsSectionProps) {
  const { attachments, problem, retry, add, setLicence } = useAttachments(slug, revision);
  const [attaching, setAttaching] = useState(false);
  const [done, setDone] = useState('');
  const mayAdd = attachments?.abilities.add ?? false;
  const line = (document: Attachment) => (
    <DocumentLine
      key={document.id}
      slug={slug}
      revision={revision}
      document={document}
      onLicence={mayAdd ? (licence) => setLicence(document.id, licence) : null}
    />
  );
  return (
    <section aria-labelledby="source-documents">
      <h2 id="source-documents">Source documents</h2>
      {problem ? <ProblemNotice problem={problem} onRetry={retry} /> : null}
      {!attachments && !problem ? <Loading what="the documents" /> : null}
      {attachments?.items.length === 0 ? (
        <p className="documents-none">
          None is attached to this revision. A copy of the source would stand here, as a PDF or an image, for
          whoever checks the sheet.
        </p>
      ) : null}
      {attachments && attachments.items.length > 0 ? (
        <ul className="documents-by-source">
          {sources.map((source, i) => {
            const listed = attachments.items.filter((document) => document.source === i);
            return listed.length === 0 ? null : (
              <li key={`${i}${source.place}`}>
                <p className="documents-source">
                  <Citation source={source} />
                </p>
                <ul className="documents">{listed.map(line)}</ul>
              </li>
            );
          })}
          {attachments.items
            .filter(({ source }) => source === null)
            .map((document) => (
              <li key={document.id}>
                <p className="documents-source">Cited no more: {document.citation}</p>
                <ul className="documents">{line(document)}</ul>
              </li>
            ))}
        </ul>
      ) : null}
      {mayAdd ? (
        <p className="documents-add">
          <Button
            onClick={() => {
              setDone('');
              setAttaching(true);
            }}
          >
            Attach a document
          </Button>
        </p>
      ) : null}
      <DoneNote words={done} />
      {attaching ? (
        <AttachDialog
          sources={sources}
          onAttach={async (document) => {
            await add(document);
            setAttaching(false);
            setDone(`"${document.file.name}" is attached.`);
          }}
          onLeave={() => setAttaching(false)}
        />
      ) : null}
    </section>
  );
}
