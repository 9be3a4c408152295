import { describe, expect, it } from 'vitest';
import { DocumentFault } from './document-fault.js';
import { contentDisposition, documentName } from './document-name.js';

describe('documentName', () => {
  it.each([
    ['paper.pdf', 'paper.pdf'],
    ['Paper No. 12.PDF', 'Paper No. 12.pdf'],
    ['../../../etc/passwd.pdf', 'passwd.pdf'],
    ['..\\..\\windows\\system32\\paper.pdf', 'paper.pdf'],
    ['C:\\scans\\paper.pdf', 'paper.pdf'],
    ['..', 'document.pdf'],
    ['', 'document.pdf'],
    ['.pdf', 'pdf.pdf'],
    ['...hidden.pdf', 'hidden.pdf'],
    ['Wärmeübergang 物.pdf', 'Wärmeübergang 物.pdf'],
    ['a\u202Efdp.exe.pdf', 'afdp.exe.pdf'],
    ['a\u0000b\r\nc.pdf', 'abc.pdf'],
    ['a"; filename="b<c>|*?.pdf', 'a-; filename=-b-c----.pdf'],
    ['no ending', 'no ending.pdf'],
    ['Vol. 26', 'Vol. 26.pdf'],
    [`${'x'.repeat(500)}.pdf`, `${'x'.repeat(120)}.pdf`],
  ])('keeps %j as %s', (given, kept) => {
    expect(documentName(given, 'application/pdf')).toBe(kept);
  });

  it('takes both endings of a JPEG and no other', () => {
    expect(documentName('a.jpeg', 'image/jpeg')).toBe('a.jpeg');
    expect(documentName('a.JPG', 'image/jpeg')).toBe('a.jpg');
    expect(() => documentName('a.png', 'image/jpeg')).toThrow(DocumentFault);
    expect(() => documentName('a.pdf.exe', 'application/pdf')).toThrow('ends with .exe, but the file is PDF');
  });
});

describe('contentDisposition', () => {
  it.each([
    ['paper.pdf', `attachment; filename="paper.pdf"; filename*=UTF-8''paper.pdf`],
    ['Wärme 物.pdf', `attachment; filename="Warme _.pdf"; filename*=UTF-8''W%C3%A4rme%20%E7%89%A9.pdf`],
    [`a"b'c(1).pdf`, `attachment; filename="a_b'c(1).pdf"; filename*=UTF-8''a%22b%27c%281%29.pdf`],
    ['50%.pdf', `attachment; filename="50_.pdf"; filename*=UTF-8''50%25.pdf`],
  ])('has %s saved', (name, header) => {
    expect(contentDisposition(name)).toBe(header);
  });
});
