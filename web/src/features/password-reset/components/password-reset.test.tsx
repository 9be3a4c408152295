import { cleanup, render, screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, expect, test, vi } from 'vitest';
import { AskForm } from './ask-form';
import { ChooseForm } from './choose-form';

afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
});

function serve(status: number, answer?: unknown) {
  const bodies: unknown[] = [];
  vi.stubGlobal('fetch', async (request: Request) => {
    bodies.push(JSON.parse(await request.text()));
    return new Response(answer === undefined ? null : JSON.stringify(answer), { status });
  });
  return bodies;
}

test('the answer is what the server says, the same for every address', async () => {
  const bodies = serve(202, { message: 'If somebody here has this address, a letter is on its way there.' });
  render(<AskForm />);
  const user = userEvent.setup();
  await user.click(screen.getByRole('button', { name: 'Send a link' }));
  expect(screen.getByRole('alert').textContent).toContain('Write your e-mail address.');
  await user.type(screen.getByLabelText('E-mail address'), 'nobody@office.example');
  await user.click(screen.getByRole('button', { name: 'Send a link' }));
  expect((await screen.findByText(/a letter is on its way/)).getAttribute('role')).toBe('status');
  expect(bodies).toEqual([{ email: 'nobody@office.example' }]);
});

test('a link that does not hold says so, and the password stays typed', async () => {
  const words = 'This link does not hold, or not any more. Ask for a new one.';
  serve(404, { type: 'urn:merestone:problem:not-found', title: 'Not found', status: 404, detail: words });
  const onChosen = vi.fn();
  render(<ChooseForm token="used-up" onChosen={onChosen} />);
  const user = userEvent.setup();
  await user.type(screen.getByLabelText('New password'), 'four wet grey stones');
  await user.click(screen.getByRole('button', { name: 'Choose this password' }));
  expect((await screen.findByRole('alert')).textContent).toContain(words);
  expect(screen.getByLabelText<HTMLInputElement>('New password').value).toBe('four wet grey stones');
  expect(onChosen).not.toHaveBeenCalled();
});

test('a chosen password is sent as it was typed', async () => {
  const bodies = serve(204);
  const onChosen = vi.fn();
  render(<ChooseForm token="abc" onChosen={onChosen} />);
  const user = userEvent.setup();
  await user.type(screen.getByLabelText('New password'), ' four wet stones ');
  await user.click(screen.getByRole('button', { name: 'Choose this password' }));
  await waitFor(() => expect(onChosen).toHaveBeenCalled());
  expect(bodies).toEqual([{ password: ' four wet stones ' }]);
});
