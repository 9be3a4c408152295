import { cleanup, render, screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { MemoryRouter } from 'react-router-dom';
import { SWRConfig } from 'swr';
import { afterEach, expect, test, vi } from 'vitest';
import type { MailChoices, Notice } from '../../../shared/api/types';
import { countWords } from '../model/count-words';
import { NOTICE_KINDS } from '../model/notice-kinds';
import { pathOfNotice } from '../model/path-of-notice';
import { MailChoicesForm } from './mail-choices-form';
import { NoticesDisclosure } from './notices-disclosure';

afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
});

/** A server that keeps what was read. */
function serveNotices(count: number) {
  const notices: Notice[] = Array.from({ length: count }, (_, i) => ({
    id: count - i,
    kind: 'comment',
    text: `Comment ${count - i}`,
    href: `/register/sheet-${count - i}`,
    at: '2026-12-01T08:00:00Z',
    read: false,
  }));
  vi.stubGlobal('fetch', async (request: Request) => {
    const path = new URL(request.url).pathname;
    const read = /notices\/(\d+)\/reading/.exec(path)?.[1];
    const notice = notices.find(({ id }) => String(id) === read);
    if (notice) notice.read = true;
    return new Response(
      JSON.stringify(
        notice ?? { items: notices, unread: notices.filter((one) => !one.read).length, nextCursor: null },
      ),
      { status: notice ? 201 : 200 },
    );
  });
  return notices;
}

function renderDisclosure() {
  render(
    <SWRConfig value={{ provider: () => new Map() }}>
      <MemoryRouter>
        <NoticesDisclosure />
      </MemoryRouter>
    </SWRConfig>,
  );
  return userEvent.setup();
}

test('the masthead counts in words, shows what waits, and counts down as it is read', async () => {
  const notices = serveNotices(3);
  const user = renderDisclosure();
  const button = await screen.findByRole('button', { name: 'three new notices' });
  expect(button.getAttribute('aria-expanded')).toBe('false');
  await user.click(button);
  const panel = within(screen.getByRole('region', { name: 'Latest notices' }));
  expect(panel.getAllByRole('listitem')).toHaveLength(3);
  expect(panel.getByRole('link', { name: 'Comment 2' }).getAttribute('href')).toBe('/register/sheet-2');
  await user.click(panel.getByRole('button', { name: 'Mark as read: Comment 2' }));
  expect(await screen.findByRole('button', { name: 'two new notices' })).toBeTruthy();
  expect(notices.map(({ read }) => read)).toEqual([false, true, false]);
  await user.click(panel.getByRole('button', { name: 'Mark these as read' }));
  expect(await screen.findByRole('button', { name: 'Notices' })).toBeTruthy();
  expect(panel.getByText(/Nothing new/)).toBeTruthy();
});

test('Escape closes the list and leads back to its button', async () => {
  serveNotices(1);
  const user = renderDisclosure();
  const button = await screen.findByRole('button', { name: 'one new notice' });
  await user.click(button);
  expect(screen.getByRole('region').hidden).toBe(false);
  await user.keyboard('{Escape}');
  expect(button.getAttribute('aria-expanded')).toBe('false');
  expect(document.activeElement).toBe(button);
});

test('following a notice reads it', async () => {
  const notices = serveNotices(1);
  const user = renderDisclosure();
  await user.click(await screen.findByRole('button', { name: 'one new notice' }));
  await user.click(screen.getByRole('link', { name: 'Comment 1' }));
  await waitFor(() => expect(notices[0]?.read).toBe(true));
});

test('each kind can be kept from the mail', async () => {
  const all = Object.fromEntries(NOTICE_KINDS.map(({ kind }) => [kind, true])) as MailChoices;
  const onChoose = vi.fn(() => Promise.resolve());
  render(<MailChoicesForm choices={all} onChoose={onChoose} />);
  const user = userEvent.setup();
  await user.click(screen.getByLabelText(/^Comments/));
  await user.click(screen.getByRole('button', { name: 'Keep the choice' }));
  await waitFor(() => expect(onChoose).toHaveBeenCalledWith({ ...all, comment: false }));
  expect(screen.getByRole('status').textContent).toBe('Your choice is kept.');
});

test.each([
  ['/office/appointments', '/office/appointments'],
  ['//evil.example/x', null],
  ['https://evil.example', null],
  ['', null],
])('a notice to %j leads to %j', (href, to) => {
  expect(pathOfNotice(href)).toBe(to);
});

test.each([
  [0, 'no'],
  [13, 'thirteen'],
  [20, 'twenty'],
  [21, '21'],
])('%i is told as %s', (count, words) => {
  expect(countWords(count)).toBe(words);
});
