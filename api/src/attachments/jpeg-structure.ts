import { DocumentFault } from './document-fault.js';

export function isJpeg(bytes: Buffer): boolean {
  return bytes.length > 3 && bytes[0] === 0xff && bytes[1] === 0xd8 && bytes[2] === 0xff;
}

const START_OF_SCAN = 0xda;
const END_OF_IMAGE = 0xd9;

/** Walks the marker segments (ISO/IEC 10918-1): a frame, scans, the end marker and nothing behind it. */
export function assertWholeJpeg(bytes: Buffer): void {
  let hasFrame = false;
  let hasScan = false;
  for (let at = 2; at + 1 < bytes.length;) {
    if (bytes[at] !== 0xff) break;
    const marker = bytes[at + 1] ?? 0;
    if (marker === 0xff) {
      at += 1;
    } else if (marker === END_OF_IMAGE) {
      if (!hasFrame || !hasScan) break;
      if (at + 2 !== bytes.length)
        throw new DocumentFault('There is something behind the end of the JPEG image.');
      return;
    } else if (standsAlone(marker)) {
      at += 2;
    } else {
      if (at + 4 > bytes.length) break;
      const length = bytes.readUInt16BE(at + 2);
      if (length < 2) break;
      hasFrame ||= isFrame(marker);
      at += 2 + length;
      if (marker !== START_OF_SCAN) continue;
      hasScan = true;
      at = endOfScan(bytes, at);
    }
  }
  throw new DocumentFault('The JPEG image is cut off or broken.');
}

function standsAlone(marker: number): boolean {
  return marker === 0x01 || (marker >= 0xd0 && marker <= 0xd7);
}

/** Start of frame: C0 to CF but for the tables of Huffman and arithmetic coding and the reserved one. */
function isFrame(marker: number): boolean {
  return marker >= 0xc0 && marker <= 0xcf && marker !== 0xc4 && marker !== 0xc8 && marker !== 0xcc;
}

/** Place of the first marker behind the coded data, where FF 00 is data and restart markers belong to it. */
function endOfScan(bytes: Buffer, from: number): number {
  let at = bytes.indexOf(0xff, from);
  while (at >= 0 && at + 1 < bytes.length) {
    const next = bytes[at + 1] ?? 0;
    if (next !== 0 && !standsAlone(next)) return at;
    at = bytes.indexOf(0xff, at + 2);
  }
  return bytes.length;
}
