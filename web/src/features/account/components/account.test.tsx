import { cleanup, render, screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, expect, test, vi } from 'vitest';
import { agentWords } from '../model/agent-words';
import { PasswordForm } from './password-form';
import { SessionList } from './session-list';

afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
});

function serve(status: number, answer?: unknown) {
  const calls: { method: string; path: string; body: unknown }[] = [];
  vi.stubGlobal('fetch', async (request: Request) => {
    const text = await request.text();
    calls.push({
      method: request.method,
      path: new URL(request.url).pathname,
      body: text ? JSON.parse(text) : null,
    });
    return new Response(answer === undefined ? null : JSON.stringify(answer), { status });
  });
  return calls;
}

test('the rules on passwords are there before one is broken, and the new one is never trimmed', async () => {
  const calls = serve(204);
  const onChanged = vi.fn();
  render(<PasswordForm email="ada@office.example" onChanged={onChanged} />);
  const user = userEvent.setup();
  const next = screen.getByLabelText<HTMLInputElement>('New password');
  const rules = document.getElementById(next.getAttribute('aria-describedby') ?? '');
  expect(rules?.textContent).toMatch(/^8 to 128 characters, 15 or more are better/);
  expect(next.autocomplete).toBe('new-password');

  await user.click(screen.getByRole('button', { name: 'Change the password' }));
  expect(screen.getByRole('alert').textContent).toContain('Write the password you have.');
  expect(calls).toEqual([]);

  await user.type(screen.getByLabelText('Present password'), 'old one');
  await user.click(next);
  await user.paste(' four wet grey stones ');
  await user.click(screen.getByLabelText('Show the new password'));
  expect(next.type).toBe('text');
  await user.click(screen.getByRole('button', { name: 'Change the password' }));
  await waitFor(() => expect(onChanged).toHaveBeenCalled());
  expect(calls).toEqual([
    {
      method: 'PUT',
      path: '/api/session/password',
      body: { current: 'old one', password: ' four wet grey stones ' },
    },
  ]);
  expect(next.value).toBe('');
  expect(screen.getByRole('status').textContent).toContain('Your password is changed.');
});

test('a wrong present password is said beside it, and nothing typed is lost', async () => {
  serve(403, {
    type: 'urn:merestone:problem:password-refused',
    title: 'The password was refused',
    status: 403,
    detail: 'The password is not right; it was not changed.',
    fields: [{ field: 'current', code: 'password-refused', message: 'The password is not right.' }],
  });
  render(<PasswordForm email="ada@office.example" onChanged={() => undefined} />);
  const user = userEvent.setup();
  await user.type(screen.getByLabelText('Present password'), 'wrong');
  await user.type(screen.getByLabelText('New password'), 'four wet grey stones');
  await user.click(screen.getByRole('button', { name: 'Change the password' }));
  await user.click(await screen.findByRole('link', { name: 'The password is not right.' }));
  expect(document.activeElement).toBe(screen.getByLabelText('Present password'));
  expect(screen.getByLabelText<HTMLInputElement>('New password').value).toBe('four wet grey stones');
});

const SESSIONS = [
  {
    id: 'a1',
    agent: 'Mozilla/5.0 (X11; Linux x86_64; rv:128.0) Gecko/20100101 Firefox/128.0',
    current: true,
  },
  { id: 'b2', agent: '', current: false },
].map((session) => ({
  ...session,
  createdAt: '2026-11-30T08:00:00Z',
  lastSeenAt: '2026-12-01T08:00:00Z',
}));

test('every session but the one in use can be ended', async () => {
  const calls = serve(204);
  const refetch = vi.fn(() => Promise.resolve());
  render(<SessionList sessions={SESSIONS} refetch={refetch} />);
  expect(screen.getAllByRole('listitem')[0]?.textContent).toContain('Firefox on Linux, this one');
  const buttons = screen.getAllByRole('button');
  expect(buttons).toHaveLength(1);
  await userEvent.click(buttons[0]!);
  await waitFor(() => expect(refetch).toHaveBeenCalled());
  expect(calls).toEqual([{ method: 'DELETE', path: '/api/session/sessions/b2', body: null }]);
});

test.each([
  [
    'Mozilla/5.0 (Windows NT 10.0; Win64; x64) AppleWebKit/537.36 (KHTML, like Gecko) Chrome/142.0 Safari/537.36 Edg/142.0',
    'Edge on Windows',
  ],
  [
    'Mozilla/5.0 (iPhone; CPU iPhone OS 18_0 like Mac OS X) AppleWebKit/605.1.15 (KHTML, like Gecko) Version/18.0 Mobile/15E148 Safari/604.1',
    'Safari on iOS',
  ],
  ['curl/8.5.0', 'curl'],
  ['  ', 'Something that does not say what it is'],
  ['<b>own tool</b>', '<b>own tool</b>'],
])('%s is told as %s', (agent, words) => {
  expect(agentWords(agent)).toBe(words);
});
