import { cleanup, render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, expect, test, vi } from 'vitest';
import { ApiProblem } from '../../../shared/api/api-problem';
import { pathWithin } from '../model/path-within';
import { refusalWords } from '../model/refusal-words';
import { DemoPeopleList } from './demo-people-list';
import { SignInForm } from './sign-in-form';

afterEach(cleanup);

const refused = (status: number) =>
  new ApiProblem(status, { title: 'Not signed in', detail: 'Sign in first.' });

function renderForm(onSignIn: (email: string, password: string) => Promise<void>) {
  render(<SignInForm onSignIn={onSignIn} wordsFor={refusalWords} />);
  return {
    user: userEvent.setup(),
    email: screen.getByLabelText<HTMLInputElement>('E-mail address'),
    password: screen.getByLabelText<HTMLInputElement>('Password'),
    send: screen.getByRole('button', { name: 'Sign in' }),
  };
}

test('asks for both fields, at the top and beside each, and sends nothing', async () => {
  const onSignIn = vi.fn(() => Promise.resolve());
  const { user, email, send } = renderForm(onSignIn);
  await user.click(send);
  const summary = screen.getByRole('alert');
  expect(summary.textContent).toContain('Write your e-mail address.');
  expect(summary.textContent).toContain('Write your password.');
  expect(document.activeElement).toBe(summary);
  expect(email.getAttribute('aria-invalid')).toBe('true');
  expect(document.getElementById(email.getAttribute('aria-describedby') ?? '')?.textContent).toBe(
    'Write your e-mail address.',
  );
  expect(onSignIn).not.toHaveBeenCalled();
});

test('a line of the summary leads to its field', async () => {
  const { user, password, send } = renderForm(() => Promise.resolve());
  await user.click(send);
  await user.click(screen.getByRole('link', { name: 'Write your password.' }));
  expect(document.activeElement).toBe(password);
});

test('says what is wrong with half an address', async () => {
  const { user, email, send } = renderForm(() => Promise.resolve());
  await user.type(email, 'engineer');
  await user.click(send);
  expect(screen.getAllByText('Write the whole e-mail address, with its @.')).toHaveLength(2);
});

test('one refusal for a wrong address and a wrong password; nothing typed is lost', async () => {
  const { user, email, password, send } = renderForm(() => Promise.reject(refused(401)));
  await user.type(email, 'engineer@merestone.example');
  await user.type(password, 'wrong');
  await user.click(send);
  expect((await screen.findByRole('alert')).textContent).toContain('do not belong together');
  expect([email.value, password.value]).toEqual(['engineer@merestone.example', 'wrong']);
});

test('the password can be pasted, filled by a manager, and looked at', async () => {
  const onSignIn = vi.fn(() => Promise.resolve());
  const { user, email, password, send } = renderForm(onSignIn);
  expect([email.autocomplete, password.autocomplete]).toEqual(['username', 'current-password']);
  await user.type(email, ' engineer@merestone.example ');
  await user.click(password);
  await user.paste('a pass phrase');
  expect(password.type).toBe('password');
  await user.click(screen.getByLabelText('Show the password'));
  expect(password.type).toBe('text');
  await user.click(send);
  expect(onSignIn).toHaveBeenCalledWith('engineer@merestone.example', 'a pass phrase');
});

test('a person of the demo office is one press away', async () => {
  const onSignIn = vi.fn(() => Promise.resolve());
  const people = [
    { name: 'Ada Quillfeather', email: 'engineer@merestone.example', roles: ['engineer' as const] },
    { name: 'Henrik Stonebridge', email: 'authority@merestone.example', roles: ['authority' as const] },
  ];
  render(
    <DemoPeopleList demo={{ items: people, password: 'demo' }} onSignIn={onSignIn} wordsFor={refusalWords} />,
  );
  expect(screen.getByText(/technical authority/)).toBeTruthy();
  await userEvent.click(screen.getByRole('button', { name: 'Enter as Henrik Stonebridge' }));
  expect(onSignIn).toHaveBeenCalledWith('authority@merestone.example', 'demo');
});

test.each([
  [refused(429), /Wait a few minutes/],
  [
    new ApiProblem(0, { title: 'The server cannot be reached', detail: 'Check the connection.' }),
    /Check the connection/,
  ],
])('other refusals say what to do', (problem, words) => {
  expect(refusalWords(problem)).toMatch(words);
});

test.each([
  ['/geometries/pipe?x=1', '/geometries/pipe?x=1'],
  ['//evil.example', '/'],
  ['/\\evil.example', '/'],
  ['https://evil.example', '/'],
  ['/sign-in?from=/x', '/'],
  [null, '/'],
])('after signing in %s leads to %s', (from, to) => {
  expect(pathWithin(from)).toBe(to);
});
