/** A document to upload in a browser. */
interface SampleDocument {
  name: string;
  mimeType: string;
  buffer: Buffer;
}

/** The outline of a PDF that would run a script when it is opened. */
export const scriptedPdf: SampleDocument = {
  name: 'page 516.pdf',
  mimeType: 'application/pdf',
  buffer: Buffer.from(
    [
      '%PDF-1.7',
      '1 0 obj << /Type /Catalog /OpenAction << /S /JavaScript /JS (1) >> >> endobj',
      'trailer << /Root 1 0 R >>',
      'startxref',
      '9',
      '%%EOF',
      '',
    ].join('\n'),
    'latin1',
  ),
};

/** What calls itself an image and is a page that runs in a browser. */
export const pageCalledImage: SampleDocument = {
  name: 'scan.png',
  mimeType: 'image/png',
  buffer: Buffer.from('<!doctype html><script>document.title = "run"</script>'),
};
