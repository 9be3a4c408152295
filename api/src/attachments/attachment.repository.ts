import type { CslItem } from '@merestone/engine';
import { Injectable } from '@nestjs/common';
import { and, asc, eq } from 'drizzle-orm';
import type { ActiveContent, Licence, MediaType, OwnerKind } from '../common/attachment.js';
import type { Authorized } from '../common/authorized.js';
import { Connection, type Reader, type Tx } from '../database/connection.js';
import { attachment } from '../database/schema/attachments.js';

export interface AttachmentOwner {
  readonly kind: OwnerKind;
  readonly id: string;
}

export interface AttachmentRecord {
  readonly id: string;
  readonly ownerKind: OwnerKind;
  readonly ownerId: string;
  readonly source: CslItem | null;
  readonly name: string;
  readonly mediaType: MediaType;
  readonly size: number;
  readonly sha256: string;
  readonly licence: Licence;
  readonly activeContent: ActiveContent[];
  readonly at: string;
  readonly byId: string;
  readonly byName: string;
}

@Injectable()
export class AttachmentRepository {
  constructor(private readonly connection: Connection) {}

  /** The oldest first. */
  of(owner: AttachmentOwner, reader: Reader = this.connection.reader): AttachmentRecord[] {
    return reader
      .select()
      .from(attachment)
      .where(and(eq(attachment.ownerKind, owner.kind), eq(attachment.ownerId, owner.id)))
      .orderBy(asc(attachment.at), asc(attachment.id))
      .all();
  }

  insert(tx: Tx, record: AttachmentRecord): void {
    tx.insert(attachment).values(record).run();
  }

  setLicence(tx: Tx, record: Authorized<AttachmentRecord>, licence: Licence): void {
    tx.update(attachment).set({ licence }).where(eq(attachment.id, record.id)).run();
  }
}
