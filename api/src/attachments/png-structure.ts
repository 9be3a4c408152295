import { DocumentFault } from './document-fault.js';

const SIGNATURE = Buffer.from([0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a]);
/** More pixels than any scan of a page has; an image that claims more is made to fill memory. */
export const MOST_PIXELS = 200_000_000;

export function isPng(bytes: Buffer): boolean {
  return bytes.subarray(0, SIGNATURE.length).equals(SIGNATURE);
}

/** Walks the chunks (ISO/IEC 15948): header first, image data, end chunk last and nothing behind it. */
export function assertWholePng(bytes: Buffer): void {
  let hasData = false;
  for (let at = SIGNATURE.length; at + 12 <= bytes.length;) {
    const length = bytes.readUInt32BE(at);
    const type = bytes.toString('latin1', at + 4, at + 8);
    const next = at + 12 + length;
    if (at === SIGNATURE.length) assertHeader(bytes, type, length, at + 8);
    if (next > bytes.length) break;
    if (type === 'IDAT') hasData = true;
    if (type === 'IEND') {
      if (next !== bytes.length)
        throw new DocumentFault('There is something behind the end of the PNG image.');
      if (!hasData) break;
      return;
    }
    at = next;
  }
  throw new DocumentFault('The PNG image is cut off or broken.');
}

function assertHeader(bytes: Buffer, type: string, length: number, at: number): void {
  if (type !== 'IHDR' || length !== 13 || at + 8 > bytes.length) {
    throw new DocumentFault('The PNG image is cut off or broken.');
  }
  const pixels = bytes.readUInt32BE(at) * bytes.readUInt32BE(at + 4);
  if (pixels === 0 || pixels > MOST_PIXELS)
    throw new DocumentFault('The PNG image has no size that can be shown.');
}
