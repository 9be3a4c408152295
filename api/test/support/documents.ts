import { deflateSync } from 'node:zlib';

/** A PNG image of one pixel. Checksums are zero: nothing here looks at them. */
export function pngFile({ width = 1, height = 1, behind = '' } = {}): Buffer {
  const size = Buffer.alloc(13);
  size.writeUInt32BE(width, 0);
  size.writeUInt32BE(height, 4);
  size[8] = 8;
  return Buffer.concat([
    Buffer.from([0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a]),
    pngChunk('IHDR', size),
    pngChunk('IDAT', deflateSync(Buffer.from([0, 0]))),
    pngChunk('IEND', Buffer.alloc(0)),
    Buffer.from(behind, 'latin1'),
  ]);
}

export function pngChunk(type: string, data: Buffer): Buffer {
  const head = Buffer.alloc(8);
  head.writeUInt32BE(data.length, 0);
  head.write(type, 4, 'latin1');
  return Buffer.concat([head, data, Buffer.alloc(4)]);
}

/** A JPEG file by its markers: a comment, a frame, a scan with stuffed and restart bytes, the end. */
export function jpegFile({ comment = 'made for tests', behind = '' } = {}): Buffer {
  return Buffer.concat([
    Buffer.from([0xff, 0xd8]),
    jpegSegment(0xfe, Buffer.from(comment, 'latin1')),
    jpegSegment(0xc0, Buffer.from([8, 0, 1, 0, 1, 1, 1, 0x11, 0])),
    jpegSegment(0xda, Buffer.from([1, 1, 0, 0, 0x3f, 0])),
    Buffer.from([0x12, 0xff, 0x00, 0x34, 0xff, 0xd0, 0x56]),
    Buffer.from([0xff, 0xd9]),
    Buffer.from(behind, 'latin1'),
  ]);
}

function jpegSegment(marker: number, data: Buffer): Buffer {
  const head = Buffer.from([0xff, marker, 0, 0]);
  head.writeUInt16BE(data.length + 2, 2);
  return Buffer.concat([head, data]);
}

export interface PdfParts {
  /** Entries of the catalogue. */
  readonly catalogue?: string;
  /** Objects packed into an object stream. */
  readonly packed?: string;
  /** Dictionary entries of that stream in place of its own. */
  readonly filter?: string;
  readonly behind?: string;
  /** Filled up to about this many bytes. */
  readonly size?: number;
}

/** A PDF of the right outline: header, catalogue, an object stream, trailer, end. */
export function pdfFile({ catalogue = '', packed, filter, behind = '', size = 0 }: PdfParts = {}): Buffer {
  const data = packed === undefined ? Buffer.alloc(0) : deflateSync(Buffer.from(packed, 'latin1'));
  const before = Buffer.from(
    [
      '%PDF-1.7',
      `1 0 obj << /Type /Catalog ${catalogue} >> endobj`,
      `2 0 obj << /Type /ObjStm ${filter ?? '/Filter /FlateDecode'} /Length ${data.length} >> stream\n`,
    ]
      .slice(0, packed === undefined ? 2 : 3)
      .join('\n'),
    'latin1',
  );
  const middle = packed === undefined ? '\n' : '\nendstream endobj\n';
  const filling = size === 0 ? '' : `%${'x'.repeat(Math.max(0, size - before.length - data.length))}\n`;
  const after = `${middle}${filling}trailer << /Root 1 0 R >>\nstartxref\n0\n%%EOF\n${behind}`;
  return Buffer.concat([before, data, Buffer.from(after, 'latin1')]);
}

/** The record that ends a ZIP archive, which takes this many bytes that follow for its comment. */
export function archiveEnd(following = 0): string {
  const record = Buffer.alloc(22);
  record.write('PK\x05\x06', 0, 'latin1');
  record.writeUInt16LE(following, 20);
  return record.toString('latin1');
}
