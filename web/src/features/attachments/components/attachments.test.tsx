import { cleanup, fireEvent, render, screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { SWRConfig } from 'swr';
import { afterEach, expect, test, vi } from 'vitest';
import type { Attachment } from '../../../shared/api/types';
import { gillilandSherwood } from '../../../shared/samples/gilliland-sherwood';
import { activeContentWords, documentWords } from '../model/document-words';
import { fileError } from '../model/file-error';
import { AttachmentsSection } from './attachments-section';

afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
});

const attached = (part: Partial<Attachment>): Attachment => ({
  id: 'd-1',
  source: 0,
  citation: null,
  name: 'gilliland-1934.pdf',
  mediaType: 'application/pdf',
  size: 1_240_000,
  sha256: 'abcdef0123456789',
  licence: 'office-only',
  activeContent: [],
  at: '2026-12-01T08:00:00Z',
  by: { id: 'p-1', name: 'Ada Quillfeather' },
  ...part,
});

interface Sent {
  path: string;
  body: FormData | string;
}

function serve(items: Attachment[], add: boolean) {
  const sent: Sent[] = [];
  vi.stubGlobal('fetch', async (request: Request) => {
    const path = new URL(request.url).pathname;
    if (request.method === 'GET') return new Response(JSON.stringify({ items, abilities: { add } }));
    const form = request.headers.get('content-type')?.startsWith('multipart/');
    sent.push({ path, body: form ? await request.formData() : await request.text() });
    return new Response(JSON.stringify(attached({})), { status: form ? 201 : 200 });
  });
  return sent;
}

function renderSection() {
  render(
    <SWRConfig value={{ provider: () => new Map() }}>
      <AttachmentsSection slug="onda" revision={2} sources={gillilandSherwood.sources} />
    </SWRConfig>,
  );
  return userEvent.setup();
}

test('a document stands under its source, is saved as a file, and says what it would do by itself', async () => {
  serve(
    [
      attached({ activeContent: ['script', 'form'] }),
      attached({ id: 'd-2', source: null, citation: 'An old book.' }),
    ],
    false,
  );
  renderSection();
  const [link] = await screen.findAllByRole('link', { name: 'gilliland-1934.pdf' });
  expect(link?.getAttribute('href')).toBe('/api/correlations/onda/revisions/2/attachments/d-1/file');
  expect(link?.hasAttribute('download')).toBe(true);
  expect(screen.getByText(/^Contains active content: a script and a form\./)).toBeTruthy();
  expect(screen.getByText('Cited no more: An old book.')).toBeTruthy();
  expect(screen.queryByRole('button')).toBeNull();
});

test('a file without its licence, of another kind or too large, is not sent', async () => {
  const sent = serve([], true);
  const user = renderSection();
  await user.click(await screen.findByRole('button', { name: 'Attach a document' }));
  await user.click(screen.getByRole('button', { name: 'Attach it' }));
  expect(screen.getByRole('alert').textContent).toContain('Choose a file.');
  expect(screen.getByRole('alert').textContent).toContain('Say whether it may leave the office.');
  fireEvent.change(screen.getByLabelText('File'), {
    target: { files: [new File(['x'], 'book.exe')] },
  });
  await user.click(screen.getByRole('button', { name: 'Attach it' }));
  expect(screen.getByRole('alert').textContent).toContain('A document is a PDF, a PNG or a JPEG.');
  expect(sent).toEqual([]);
});

test('file, source and licence are sent together', async () => {
  const sent = serve([], true);
  const user = renderSection();
  await user.click(await screen.findByRole('button', { name: 'Attach a document' }));
  await user.upload(
    screen.getByLabelText('File'),
    new File(['%PDF-1.7'], 'page 516.pdf', { type: 'application/pdf' }),
  );
  await user.click(screen.getByLabelText(/^It stays in the office/));
  await user.click(screen.getByRole('button', { name: 'Attach it' }));
  await waitFor(() => expect(sent).toHaveLength(1));
  const form = sent[0]?.body as FormData;
  expect(sent[0]?.path).toBe('/api/correlations/onda/revisions/2/attachments');
  expect([form.get('source'), form.get('licence')]).toEqual(['0', 'office-only']);
  expect((form.get('file') as File).name).toBe('page 516.pdf');
  expect(await screen.findByText('"page 516.pdf" is attached.')).toBeTruthy();
});

test('where a document may go is changed by who may attach', async () => {
  const sent = serve([attached({})], true);
  const user = renderSection();
  await user.click(
    await screen.findByRole('button', { name: 'Let it leave the office: gilliland-1934.pdf' }),
  );
  await waitFor(() =>
    expect(sent).toEqual([
      {
        path: '/api/correlations/onda/revisions/2/attachments/d-1/licence',
        body: JSON.stringify({ licence: 'may-leave' }),
      },
    ]),
  );
});

test.each([
  [{ mediaType: 'application/pdf', size: 1_240_000 }, 'PDF, 1.2 MB'],
  [{ mediaType: 'image/png', size: 120 }, 'PNG image, 1 kB'],
  [{ mediaType: 'image/jpeg', size: 830_400 }, 'JPEG image, 830 kB'],
] as const)('%j is told as %s', (file, words) => {
  expect(documentWords(file)).toBe(words);
});

test('a document that only shows is not warned of', () => {
  expect(activeContentWords([])).toBeNull();
  expect(activeContentWords(['not-inspected'])).toContain('a part that could not be looked into');
});

test.each([
  [{ name: 'a.pdf', size: 15 * 1024 * 1024 }, undefined],
  [{ name: 'a.PDF', size: 15 * 1024 * 1024 + 1 }, 'A document has 15 MB at most.'],
  [{ name: 'a.png', size: 0 }, 'This file is empty.'],
  [{ name: 'a.svg', size: 10 }, 'A document is a PDF, a PNG or a JPEG.'],
  [null, 'Choose a file.'],
])('of the file %j is said: %s', (file, words) => {
  expect(fileError(file)).toBe(words);
});
