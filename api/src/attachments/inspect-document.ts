import type { ActiveContent, MediaType } from '../common/attachment.js';
import { DocumentFault } from './document-fault.js';
import { assertWholeJpeg, isJpeg } from './jpeg-structure.js';
import { pdfActiveContent } from './pdf-active-content.js';
import { assertWholePng, isPng } from './png-structure.js';

export const LARGEST_DOCUMENT_BYTES = 15 * 1024 * 1024;

export interface InspectedDocument {
  readonly mediaType: MediaType;
  readonly activeContent: readonly ActiveContent[];
}

/** Where programs look for the mark of a format that may begin late. */
const HEAD = 1024;
const END_OF_ARCHIVE = Buffer.from('PK\x05\x06', 'latin1');

/**
 * Tells what a document is from its bytes alone. Throws a fault for what is none of the kinds kept, is cut off, or is
 * something else at the same time.
 */
export function inspectDocument(bytes: Buffer): InspectedDocument {
  if (bytes.length === 0) throw new DocumentFault('The file is empty.');
  if (bytes.length > LARGEST_DOCUMENT_BYTES) throw new DocumentFault('The file is larger than 15 MB.');
  const found = kindOf(bytes);
  refuseSecondNature(bytes, found.mediaType);
  return found;
}

function kindOf(bytes: Buffer): InspectedDocument {
  if (isPng(bytes)) {
    assertWholePng(bytes);
    return { mediaType: 'image/png', activeContent: [] };
  }
  if (isJpeg(bytes)) {
    assertWholeJpeg(bytes);
    return { mediaType: 'image/jpeg', activeContent: [] };
  }
  if (/^%PDF-[12]\.\d/.test(bytes.toString('latin1', 0, 8))) {
    assertWholePdf(bytes);
    return { mediaType: 'application/pdf', activeContent: pdfActiveContent(bytes) };
  }
  throw new DocumentFault('The file is neither a PDF nor a PNG or JPEG image.');
}

function assertWholePdf(bytes: Buffer): void {
  const end = bytes.lastIndexOf('%%EOF');
  if (end < 0 || !bytes.includes('startxref'))
    throw new DocumentFault('The PDF has no end; it may be cut off.');
  if (/[^\s\0]/.test(bytes.toString('latin1', end + 5))) {
    throw new DocumentFault('There is something behind the end of the PDF.');
  }
}

/** A file that another program would take for a page, a PDF or an archive is kept by nobody's good will. */
function refuseSecondNature(bytes: Buffer, mediaType: MediaType): void {
  const head = bytes.toString('latin1', 0, HEAD);
  if (/<(?:!doctype\s|html|head|body|script|iframe|svg|\?php)/i.test(head)) {
    throw new DocumentFault('The file is a page of the web at the same time.');
  }
  if (mediaType !== 'application/pdf' && head.includes('%PDF-')) {
    throw new DocumentFault('The image is a PDF at the same time.');
  }
  if (endsAsArchive(bytes)) throw new DocumentFault('The file is an archive at the same time.');
}

/** Whether an end-of-archive record reaches, with its comment, exactly to the end of the file. */
function endsAsArchive(bytes: Buffer): boolean {
  const earliest = Math.max(0, bytes.length - 22 - 0xffff);
  for (
    let at = bytes.lastIndexOf(END_OF_ARCHIVE);
    at >= earliest;
    at = bytes.lastIndexOf(END_OF_ARCHIVE, at - 1)
  ) {
    if (at + 22 <= bytes.length && at + 22 + bytes.readUInt16LE(at + 20) === bytes.length) return true;
    if (at === 0) return false;
  }
  return false;
}
