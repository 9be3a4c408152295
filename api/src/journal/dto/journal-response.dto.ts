import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import { ACTS, type Act } from '../acts.js';
import type { JournalEntry, JsonObject } from '../entry.js';
import type { CheckpointRow, JournalRow, KeyRow } from '../journal.repository.js';
import { leafHash } from '../merkle-tree.js';
import type { FaultKind, Verification } from '../verify-journal.js';

export class JournalActor {
  @ApiProperty({ type: String })
  readonly id!: string;

  @ApiProperty({ type: String })
  readonly name!: string;
}

export class JournalItem {
  @ApiProperty({ type: Number })
  readonly index!: number;

  @ApiProperty({ type: String, format: 'date-time' })
  readonly at!: string;

  @ApiProperty({ type: JournalActor })
  readonly actor!: JournalActor;

  @ApiProperty({ enum: Object.keys(ACTS) })
  readonly act!: Act | '';

  @ApiProperty({ type: String, description: 'Path of what was acted on' })
  readonly subject!: string;

  @ApiProperty({ type: 'object', additionalProperties: true })
  readonly detail!: JsonObject;

  @ApiProperty({ type: String, description: 'RFC 9162 leaf hash of the entry as it is stored, hex' })
  readonly leaf!: string;
}

export class JournalResponse {
  @ApiProperty({ type: [JournalItem], description: 'The latest first' })
  readonly items!: JournalItem[];

  @ApiProperty({ type: String, nullable: true })
  readonly nextCursor!: string | null;

  @ApiProperty({ type: Number, description: 'Number of entries' })
  readonly size!: number;

  @ApiProperty({
    type: String,
    nullable: true,
    description: 'Root hash of the tree over all of them, hex; null when stored hashes are gone',
  })
  readonly root!: string | null;
}

export class FaultResponse {
  @ApiProperty({ type: Number })
  readonly index!: number;

  @ApiProperty({ enum: ['altered', 'missing', 'inserted', 'tree', 'checkpoint'] })
  readonly kind!: FaultKind;

  @ApiProperty({ type: String })
  readonly message!: string;
}

export class VerificationResponse {
  @ApiProperty({ type: Boolean })
  readonly ok!: boolean;

  @ApiProperty({ type: Number, description: 'Entries found right, up to the first fault' })
  readonly entries!: number;

  @ApiPropertyOptional({ type: FaultResponse })
  readonly firstFault?: FaultResponse;
}

export class CheckpointItem {
  @ApiProperty({ type: Number })
  readonly size!: number;

  @ApiProperty({ type: String })
  readonly root!: string;

  @ApiProperty({ type: String, format: 'date-time' })
  readonly at!: string;

  @ApiProperty({ type: String })
  readonly keyId!: string;

  @ApiProperty({ type: String, description: 'Ed25519 over the text, base64' })
  readonly signature!: string;

  @ApiProperty({ type: String, description: 'What was signed' })
  readonly text!: string;
}

export class PublicKeyItem {
  @ApiProperty({ type: String })
  readonly keyId!: string;

  @ApiProperty({ type: String })
  readonly pem!: string;
}

export class CheckpointsResponse {
  @ApiProperty({ type: [CheckpointItem], description: 'The latest first' })
  readonly items!: CheckpointItem[];

  @ApiProperty({ type: [PublicKeyItem] })
  readonly publicKeys!: PublicKeyItem[];
}

export function journalItem(row: JournalRow): JournalItem {
  // Of an entry that somebody put in by hand whatever is there is shown.
  const entry = JSON.parse(row.entry) as Partial<JournalEntry>;
  return {
    index: row.index,
    at: entry.at ?? '',
    actor: { id: entry.actor?.id ?? '', name: entry.actor?.name ?? '' },
    act: entry.act ?? '',
    subject: entry.subject ?? '',
    detail: entry.detail ?? {},
    leaf: leafHash(row.entry).toString('hex'),
  };
}

export function verificationResponse({ ok, entries, firstFault }: Verification): VerificationResponse {
  if (firstFault === undefined) return { ok, entries };
  const { index, kind, message } = firstFault;
  return { ok, entries, firstFault: { index, kind, message } };
}

export function checkpointsResponse(
  rows: readonly CheckpointRow[],
  keys: readonly KeyRow[],
): CheckpointsResponse {
  return {
    items: rows
      .map(({ size, root, at, keyId, signature, text }) => ({ size, root, at, keyId, signature, text }))
      .reverse(),
    publicKeys: keys.map(({ keyId, pem }) => ({ keyId, pem })),
  };
}
