import { deflateSync } from 'node:zlib';
import { describe, expect, it } from 'vitest';
import { archiveEnd, jpegFile, pdfFile, pngChunk, pngFile } from '../../test/support/documents.js';
import { DocumentFault } from './document-fault.js';
import { inspectDocument, LARGEST_DOCUMENT_BYTES } from './inspect-document.js';

const latin1 = (text: string) => Buffer.from(text, 'latin1');
const PNG = pngFile();
/** With a text behind the header, which ends at byte 33. */
const pngWithText = (text: string) =>
  Buffer.concat([PNG.subarray(0, 33), pngChunk('tEXt', latin1(text)), PNG.subarray(33)]);

const plainPdf = pdfFile();
/** Everything behind the catalogue's entries is the archive's comment. */
const PDF_IN_ARCHIVE = pdfFile({
  catalogue: archiveEnd(plainPdf.length - plainPdf.indexOf('/Catalog ') - '/Catalog '.length),
});

describe('inspectDocument', () => {
  it('tells the kinds by their bytes', () => {
    expect(inspectDocument(PNG)).toEqual({ mediaType: 'image/png', activeContent: [] });
    expect(inspectDocument(jpegFile())).toEqual({ mediaType: 'image/jpeg', activeContent: [] });
    expect(inspectDocument(pdfFile())).toEqual({ mediaType: 'application/pdf', activeContent: [] });
  });

  it.each<[string, Buffer, RegExp]>([
    ['nothing', Buffer.alloc(0), /empty/],
    ['text', latin1('hello'), /neither a PDF nor/],
    ['a program', latin1('\x7fELF'), /neither a PDF nor/],
    ['SVG', latin1('<svg xmlns="http://www.w3.org/2000/svg"/>'), /neither a PDF nor/],
    ['GIF', latin1('GIF89a'), /neither a PDF nor/],
    ['a PDF that begins late', Buffer.concat([latin1('\n'), pdfFile()]), /neither a PDF nor/],
    ['a PDF of no version', latin1('%PDF-x.y'), /neither a PDF nor/],
    ['a PDF cut off', pdfFile().subarray(0, -8), /no end/],
    ['a PDF of a header alone', latin1('%PDF-1.4\n%%EOF'), /no end/],
    ['a PDF with something behind', pdfFile({ behind: 'more' }), /behind the end of the PDF/],
    ['a PDF that ends as an archive', pdfFile({ behind: archiveEnd() }), /behind the end of the PDF/],
    ['a PDF within an archive', PDF_IN_ARCHIVE, /archive at the same time/],
    ['a PDF that is a page', pdfFile({ catalogue: '<script>alert(1)</script>' }), /page of the web/],
    ['a PNG cut off', PNG.subarray(0, -1), /cut off or broken/],
    ['a PNG of its mark alone', PNG.subarray(0, 8), /cut off or broken/],
    ['a PNG without a header', Buffer.concat([PNG.subarray(0, 8), PNG.subarray(33)]), /cut off or broken/],
    [
      'a PNG without data',
      Buffer.concat([PNG.subarray(0, 33), pngChunk('IEND', Buffer.alloc(0))]),
      /cut off or broken/,
    ],
    ['a PNG with something behind', pngFile({ behind: '<?php' }), /behind the end of the PNG/],
    ['a PNG of no size', pngFile({ width: 0 }), /no size/],
    ['a PNG of 4 294 967 295 squared', pngFile({ width: 0xffffffff, height: 0xffffffff }), /no size/],
    ['a PNG that is a page', pngWithText('a\0<html>'), /page of the web/],
    ['a PNG that is a PDF', pngWithText('a\0%PDF-1.4'), /PDF at the same time/],
    ['a PNG within an archive', pngWithText(archiveEnd(4 + PNG.length - 33)), /archive at the same time/],
    ['a JPEG cut off', jpegFile().subarray(0, -1), /cut off or broken/],
    ['a JPEG of its mark alone', Buffer.from([0xff, 0xd8, 0xff, 0xff]), /cut off or broken/],
    ['a JPEG without a picture', Buffer.from([0xff, 0xd8, 0xff, 0xd9]), /cut off or broken/],
    ['a JPEG with something behind', jpegFile({ behind: archiveEnd() }), /behind the end of the JPEG/],
    ['a JPEG that is a page', jpegFile({ comment: '<!DOCTYPE html>' }), /page of the web/],
    ['a JPEG with a segment of no length', Buffer.from([0xff, 0xd8, 0xff, 0xe0, 0, 0]), /cut off or broken/],
    ['more than 15 MB', Buffer.alloc(LARGEST_DOCUMENT_BYTES + 1), /larger than 15 MB/],
  ])('refuses %s', (_, bytes, message) => {
    expect(() => inspectDocument(bytes)).toThrow(DocumentFault);
    expect(() => inspectDocument(bytes)).toThrow(message);
  });

  it.each<[string, Buffer, string[]]>([
    ['a script', pdfFile({ catalogue: '/Names << /JavaScript 3 0 R >>' }), ['script']],
    ['a script in short', pdfFile({ catalogue: '/A << /S /URI /JS (app.alert(1)) >>' }), ['script']],
    ['a script with its name written in digits', pdfFile({ catalogue: '/J#61va#53cript 3 0 R' }), ['script']],
    ['a program to start', pdfFile({ catalogue: '/A << /S /Launch /F (cmd.exe) >>' }), ['launch']],
    ['a file inside', pdfFile({ catalogue: '/Names << /EmbeddedFiles 3 0 R >>' }), ['embedded-file']],
    ['an act on opening', pdfFile({ catalogue: '/OpenAction [3 0 R /Fit]' }), ['open-action']],
    ['acts on events', pdfFile({ catalogue: '/AA << /O 3 0 R >>' }), ['event-action']],
    ['a film', pdfFile({ catalogue: '/RichMedia 3 0 R' }), ['rich-media']],
    ['a form with a program', pdfFile({ catalogue: '/XFA 3 0 R' }), ['form']],
    [
      'what is packed',
      pdfFile({ packed: '<< /OpenAction << /S /JavaScript /JS (x) >> >>' }),
      ['script', 'open-action'],
    ],
    [
      'what is packed by a name in digits',
      pdfFile({ packed: '<< /L#61unch >>', filter: '/Fil#74er /Fl#61teDecode' }),
      ['launch'],
    ],
    ['what cannot be unpacked', pdfFile({ packed: 'x', filter: '/Filter /LZWDecode' }), ['not-inspected']],
    [
      'a packing in a packing',
      pdfFile({ packed: 'x', filter: '/Filter [/FlateDecode /FlateDecode]' }),
      ['not-inspected'],
    ],
    ['a bomb', pdfFile({ packed: ' '.repeat(20_000_000) }), ['not-inspected']],
    [
      'words that are no names',
      pdfFile({ catalogue: '/Title (JavaScript and Launch) /JSX 1 /AAB 2 /Launcher 3' }),
      [],
    ],
  ])('marks a PDF with %s', (_, bytes, expected) => {
    expect(inspectDocument(bytes).activeContent).toEqual(expected);
  });

  it('takes compressed data for what it is, where short names turn up by chance', () => {
    const noise = `2 0 obj << /Length 9 >> stream\n..../JS /AA ....\nendstream endobj`;
    const bytes = pdfFile({ catalogue: `>> endobj ${noise} 4 0 obj <<` });
    expect(inspectDocument(bytes).activeContent).toEqual([]);
    const named = pdfFile({ catalogue: `>> endobj ${noise.replace('/JS', '/JavaScript')} 4 0 obj <<` });
    expect(inspectDocument(named).activeContent).toEqual(['script']);
  });

  it('stays quick on files made to be slow', () => {
    const bomb = deflateSync(Buffer.alloc(7_000_000)).toString('latin1');
    const fillings = [
      'stream\n',
      'obj',
      '/',
      '#41',
      '/ObjStm stream\n',
      '/ObjStm stream\nx endstream ',
      'PK\x05\x06',
      '%%EOF',
    ];
    const files = fillings.map((filling) => filling.repeat(10_000_000 / filling.length));
    files.push(
      `obj << /Type /ObjStm /Filter /FlateDecode >> stream\n${bomb}\nendstream endobj\n`.repeat(500),
    );
    for (const file of files) {
      const bytes = pdfFile({ catalogue: file });
      const started = performance.now();
      inspectDocument(bytes);
      expect(performance.now() - started, file.slice(0, 30)).toBeLessThan(5000);
    }
  });
});
