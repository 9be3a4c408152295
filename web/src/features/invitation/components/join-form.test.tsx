import { cleanup, render, screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, expect, test, vi } from 'vitest';
import { JoinForm } from './join-form';

afterEach(cleanup);

const join = () => screen.getByRole('button', { name: 'Join' });

test('whoever was invited only chooses a password; the address is there for a password manager', async () => {
  const onJoin = vi.fn(() => Promise.resolve());
  render(<JoinForm invitation={{ name: 'Wilma', email: 'wilma@office.example' }} onJoin={onJoin} />);
  const user = userEvent.setup();
  const email = screen.getByLabelText<HTMLInputElement>('E-mail address');
  expect([email.value, email.readOnly, email.autocomplete]).toEqual([
    'wilma@office.example',
    true,
    'username',
  ]);
  expect(screen.queryByLabelText('Name')).toBeNull();
  await user.type(screen.getByLabelText('Password'), 'short');
  await user.click(join());
  expect(screen.getByRole('alert').textContent).toContain('at least 8 characters');
  expect(onJoin).not.toHaveBeenCalled();
  await user.clear(screen.getByLabelText('Password'));
  await user.type(screen.getByLabelText('Password'), ' four wet stones ');
  await user.click(join());
  await waitFor(() => expect(onJoin).toHaveBeenCalledWith({ password: ' four wet stones ' }));
});

test('the first administrator of an office says who they are, too', async () => {
  const onJoin = vi.fn(() => Promise.resolve());
  render(<JoinForm invitation={{ name: null, email: null }} onJoin={onJoin} />);
  const user = userEvent.setup();
  await user.click(join());
  expect(within(screen.getByRole('alert')).getAllByRole('link')).toHaveLength(3);
  await user.type(screen.getByLabelText('Name'), ' Ruben Marlpit ');
  await user.type(screen.getByLabelText('E-mail address'), 'ruben@office.example');
  await user.type(screen.getByLabelText('Password'), 'four wet grey stones');
  await user.click(join());
  await waitFor(() =>
    expect(onJoin).toHaveBeenCalledWith({
      name: 'Ruben Marlpit',
      email: 'ruben@office.example',
      password: 'four wet grey stones',
    }),
  );
});
