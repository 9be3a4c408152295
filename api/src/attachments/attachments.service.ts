import { randomUUID } from 'node:crypto';
import { Injectable, StreamableFile } from '@nestjs/common';
import { formatCitation, type CslItem } from '@merestone/engine';
import type { Actor } from '../common/actor.js';
import type { Licence } from '../common/attachment.js';
import { authorize, type Authorized } from '../common/authorized.js';
import { ApiProblem } from '../common/problem.js';
import type { Tx } from '../database/connection.js';
import { Writer } from '../database/write.js';
import { DefinitionsService } from '../revisions/definitions.service.js';
import { subjectOf, type RevisionKey, type RevisionRecord } from '../revisions/revision-record.js';
import { RevisionsService } from '../revisions/revisions.service.js';
import { attachmentItem, attachmentsResponse } from './attachment.mapper.js';
import { mayAttach } from './attachment.policy.js';
import {
  AttachmentRepository,
  type AttachmentOwner,
  type AttachmentRecord,
} from './attachment.repository.js';
import { DocumentFault } from './document-fault.js';
import { contentDisposition, documentName } from './document-name.js';
import { DocumentStoreService } from './document-store.service.js';
import type { AttachmentForm } from './dto/attachment-bodies.dto.js';
import type { AttachmentItem, AttachmentsResponse } from './dto/attachments-response.dto.js';
import { inspectDocument } from './inspect-document.js';
import type { UploadedDocument } from './uploaded-document.js';

/** More than anybody needs for the sources of one sheet. */
const MOST_DOCUMENTS = 40;

type Document = Pick<AttachmentRecord, 'name' | 'mediaType' | 'size' | 'activeContent'>;

/** Documents attached to the sources of a revision. */
@Injectable()
export class AttachmentsService {
  constructor(
    private readonly revisions: RevisionsService,
    private readonly definitions: DefinitionsService,
    private readonly attachments: AttachmentRepository,
    private readonly store: DocumentStoreService,
    private readonly writer: Writer,
  ) {}

  list(actor: Actor, key: RevisionKey): AttachmentsResponse {
    const revision = this.revisions.one(actor, key);
    const { allowed } = mayAttach(actor, revision);
    return attachmentsResponse(this.attachments.of(ownerOf(revision)), this.sourcesOf(revision), allowed);
  }

  /** Bytes first, the row and its journal entry after: what is on record is there. */
  async add(
    actor: Actor,
    key: RevisionKey,
    form: AttachmentForm,
    file: UploadedDocument | undefined,
  ): Promise<AttachmentItem> {
    const seen = this.attachable(actor, key);
    if (file === undefined) throw ApiProblem.ofField('missing', 'file', 'A file is needed.');
    const source = this.sourcesOf(seen)[Number(form.source)];
    if (source === undefined)
      throw ApiProblem.ofField('malformed', 'source', 'The sheet has no such source.');
    const document = inspected(file);
    const sha256 = await this.store.put(file.buffer);
    return this.writer.write(actor, 'attachment.added', (tx, at) => {
      const revision = this.attachable(actor, key, tx);
      this.assertRoomFor(sha256, revision, tx);
      const record: AttachmentRecord = {
        id: randomUUID(),
        ownerKind: 'revision',
        ownerId: ownerOf(revision).id,
        source,
        ...document,
        sha256,
        licence: form.licence,
        at,
        byId: actor.id,
        byName: actor.name,
      };
      this.attachments.insert(tx, record);
      return {
        subject: `${subjectOf(revision)}/attachments/${record.id}`,
        detail: { ...document, sha256, licence: form.licence, source: formatCitation(source).text },
        result: attachmentItem(record, this.sourcesOf(revision)),
      };
    });
  }

  setLicence(actor: Actor, key: RevisionKey, id: string, licence: Licence): AttachmentItem {
    return this.writer.write(actor, 'attachment.relicensed', (tx) => {
      const revision = this.attachable(actor, key, tx);
      const record = authorize(this.one(revision, id, tx), mayAttach(actor, revision));
      this.attachments.setLicence(tx, record, licence);
      return {
        subject: `${subjectOf(revision)}/attachments/${id}`,
        detail: { from: record.licence, to: licence },
        result: attachmentItem({ ...record, licence }, this.sourcesOf(revision)),
      };
    });
  }

  /** The document as a file to save: no browser is asked to show it. */
  async file(actor: Actor, key: RevisionKey, id: string): Promise<StreamableFile> {
    const { name, mediaType, sha256 } = this.one(this.revisions.one(actor, key), id);
    const bytes = await this.store.get(sha256);
    return new StreamableFile(bytes, {
      type: mediaType,
      length: bytes.length,
      disposition: contentDisposition(name),
    });
  }

  private attachable(actor: Actor, key: RevisionKey, tx?: Tx): Authorized<RevisionRecord> {
    const revision = this.revisions.one(actor, key, tx);
    return authorize(revision, mayAttach(actor, revision));
  }

  private one(revision: RevisionRecord, id: string, tx?: Tx): AttachmentRecord {
    const found = this.attachments.of(ownerOf(revision), tx).find((record) => record.id === id);
    if (found === undefined) throw new ApiProblem('not-found', 'There is no such document at this revision.');
    return found;
  }

  private assertRoomFor(sha256: string, revision: RevisionRecord, tx: Tx): void {
    const kept = this.attachments.of(ownerOf(revision), tx);
    const same = kept.find((record) => record.sha256 === sha256);
    if (same !== undefined) {
      throw ApiProblem.ofField('duplicate', 'file', `This document is attached already, as "${same.name}".`);
    }
    if (kept.length >= MOST_DOCUMENTS) {
      throw new ApiProblem('conflict', `A revision takes ${MOST_DOCUMENTS} documents at most.`);
    }
  }

  private sourcesOf(revision: RevisionRecord): CslItem[] {
    return this.definitions.correlation(revision).definition.sources.map(({ csl }) => csl);
  }
}

function ownerOf(revision: RevisionRecord): AttachmentOwner {
  return { kind: 'revision', id: String(revision.id) };
}

/** What is kept about a file, told from its bytes; its name and stated type must not say otherwise. */
function inspected({ buffer, originalname, mimetype }: UploadedDocument): Document {
  try {
    const { mediaType, activeContent } = inspectDocument(buffer);
    const stated = mimetype.toLowerCase().replace('image/jpg', 'image/jpeg');
    if (stated !== mediaType && stated !== 'application/octet-stream') {
      throw new DocumentFault(`The file was sent as ${stated.slice(0, 80)}, but it is ${mediaType}.`);
    }
    return {
      name: documentName(originalname, mediaType),
      mediaType,
      size: buffer.length,
      activeContent: [...activeContent],
    };
  } catch (error) {
    if (error instanceof DocumentFault) throw ApiProblem.ofField('file-type', 'file', error.message);
    throw error;
  }
}
