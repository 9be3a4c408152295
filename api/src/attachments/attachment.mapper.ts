import { citationKey, formatCitation, sameWork, type CslItem } from '@merestone/engine';
import type { AttachmentRecord } from './attachment.repository.js';
import type { AttachmentItem, AttachmentsResponse } from './dto/attachments-response.dto.js';

export function attachmentsResponse(
  records: readonly AttachmentRecord[],
  sources: readonly CslItem[],
  mayAdd: boolean,
): AttachmentsResponse {
  return { items: records.map((record) => attachmentItem(record, sources)), abilities: { add: mayAdd } };
}

/** `sources` are those of the owner as they stand now. */
export function attachmentItem(record: AttachmentRecord, sources: readonly CslItem[]): AttachmentItem {
  const { id, source, name, mediaType, size, sha256, licence, activeContent, at, byId, byName } = record;
  return {
    id,
    source: source === null ? null : placeOf(source, sources),
    citation: source === null ? null : formatCitation(source).text,
    name,
    mediaType,
    size,
    sha256,
    licence,
    activeContent: [...activeContent],
    at,
    by: { id: byId, name: byName },
  };
}

/** Where the source stands now: the same text, or else the same work; null when it is cited no more. */
function placeOf(source: CslItem, sources: readonly CslItem[]): number | null {
  const text = formatCitation(source).text;
  const same = sources.findIndex((other) => formatCitation(other).text === text);
  if (same >= 0) return same;
  const key = citationKey(source);
  const likely = sources.findIndex((other) => sameWork(key, citationKey(other)) !== undefined);
  return likely < 0 ? null : likely;
}
